import type * as z from 'zod';

/** A schema as its definition shows it, told apart by `_zod.def.type`. */
export type Form = z.core.$ZodTypes;
export type ObjectForm = z.core.$ZodObject;
export type UnionForm = z.core.$ZodUnion;
type Schema = z.core.$ZodType;

/** The schema inside optional, lazy, read-only and similar wrappers. */
export function formOf(schema: Schema): Form {
  const form = schema as Form;
  switch (form._zod.def.type) {
    case 'optional':
    case 'nonoptional':
    case 'default':
    case 'prefault':
    case 'readonly':
    case 'catch':
      return formOf((form._zod.def as { innerType: Schema }).innerType);
    case 'lazy':
      return formOf((form._zod.def as z.core.$ZodLazyDef).getter());
    case 'pipe':
      return formOf((form._zod.def as z.core.$ZodPipeDef).in);
    default:
      return form;
  }
}

export function isOptional(schema: Schema): boolean {
  return schema._zod.optin === 'optional';
}

export function isObject(form: Form): form is ObjectForm {
  return form._zod.def.type === 'object';
}

/** The member whose value tells the branches of a union apart, where it has one. */
export function discriminatorOf(form: UnionForm): string | undefined {
  return (form._zod.def as Partial<z.core.$ZodDiscriminatedUnionDef>).discriminator;
}

/** A union's branches, those of plain unions inside it included. */
export function branchesOf(form: UnionForm): Form[] {
  return form._zod.def.options.flatMap((option) => {
    const inner = formOf(option);
    return inner._zod.def.type === 'union' && discriminatorOf(inner as UnionForm) === undefined
      ? branchesOf(inner as UnionForm)
      : [inner];
  });
}

/** The members an object or a discriminated union of objects may have. */
export function membersOf(form: Form): string[] {
  if (isObject(form)) return Object.keys(form._zod.def.shape);
  if (form._zod.def.type !== 'union') return [];
  return [...new Set(branchesOf(form as UnionForm).flatMap(membersOf))];
}
