import type * as z from 'zod';
import { type Bounds, boundsOf } from './bounds.ts';
import { branchesOf, discriminatorOf, type Form, formOf, membersOf, type UnionForm } from './schema-form.ts';

/** Says in words what a schema takes: the `allowed` of a fault. */
export function allowedBy(schema: z.core.$ZodType): string {
  const form = formOf(schema);
  const { def } = form._zod;
  switch (def.type) {
    case 'number':
      return allowedNumber(form);
    case 'string':
      return allowedText(form);
    case 'boolean':
      return 'true or false';
    case 'null':
      return 'null';
    case 'literal':
      return oneOf(def.values.map(quoted));
    case 'enum':
      return oneOf(Object.values(def.entries).map(quoted));
    case 'nullable':
      return `${allowedBy(def.innerType)} or null`;
    case 'array':
      return `a list of ${range(boundsOf(form), 'items') ?? 'items'}`;
    case 'tuple':
      return `a list of ${def.items.length} items`;
    case 'object':
      return `an object with ${list(membersOf(form), 'and')}`;
    case 'record':
      return 'an object';
    case 'union':
      return allowedUnion(form as UnionForm);
    default:
      return 'another value';
  }
}

/** The values that a branch's discriminator may have, in their order. */
export function discriminatorValues(form: UnionForm, discriminator: string): string[] {
  return branchesOf(form).flatMap((branch) => [...(branch._zod.propValues?.[discriminator] ?? [])].map(String));
}

/** `a number from 0 to 5`, `a whole number of at least 1`. */
export function allowedNumber(form: Form): string {
  const bounds = boundsOf(form);
  const span = range(bounds);
  return `a ${bounds.whole ? 'whole ' : ''}number${span === undefined ? '' : ` ${span}`}`;
}

function allowedText(form: Form): string {
  const bounds = boundsOf(form);
  const length = range(bounds, 'characters');
  const written =
    bounds.format === 'datetime'
      ? 'an RFC 3339 date and time with its offset from UTC'
      : bounds.format === undefined || bounds.format === 'regex'
        ? 'text'
        : `text in the form ${bounds.format}`;
  const pattern = bounds.format === 'regex' ? ` matching ${bounds.pattern?.source}` : '';
  return `${written}${length === undefined ? '' : ` of ${length}`}${pattern}`;
}

function allowedUnion(form: UnionForm): string {
  const discriminator = discriminatorOf(form);
  if (discriminator === 'unit') {
    return `{"value": number, "unit": ${discriminatorValues(form, 'unit').map(quoted).join(' | ')}}`;
  }
  if (discriminator !== undefined) {
    return `an object whose ${discriminator} is ${oneOf(discriminatorValues(form, discriminator).map(quoted))}`;
  }
  return [...new Set(branchesOf(form).map(allowedBy))].join(', or ');
}

function range(bounds: Bounds, what?: string): string | undefined {
  const unit = what === undefined ? '' : ` ${what}`;
  const { least, most } = bounds;
  if (least && most && !least.open && !most.open) {
    if (least.value === most.value) return `${least.value}${unit}`;
    return what === undefined ? `from ${least.value} to ${most.value}` : `${least.value} to ${most.value}${unit}`;
  }
  const parts = [
    least && `${least.open ? 'more than' : 'at least'} ${least.value}`,
    most && `${most.open ? 'less than' : 'at most'} ${most.value}`,
  ].filter((part) => part !== undefined);
  return parts.length === 0 ? undefined : `${what === undefined ? 'of ' : ''}${parts.join(' and ')}${unit}`;
}

export function quoted(value: unknown): string {
  return typeof value === 'string' ? `"${value}"` : String(value);
}

export function oneOf(words: readonly string[]): string {
  return words.length === 1 ? (words[0] as string) : `one of ${words.join(', ')}`;
}

export function list(words: readonly string[], last: 'and' | 'or'): string {
  return words.length < 2 ? (words[0] ?? 'no members') : `${words.slice(0, -1).join(', ')} ${last} ${words.at(-1)}`;
}
