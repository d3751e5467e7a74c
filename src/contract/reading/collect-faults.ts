import type * as z from 'zod';
import type { Fault } from '../../planning/fault.ts';
import { allowedBy } from './allowed.ts';
import { pointerTo } from './json-pointer.ts';
import { listFaults } from './list-faults.ts';
import { objectFaults } from './object-faults.ts';
import { numberFault, shortened, textFault, wordFault, wrongType } from './scalar-faults.ts';
import { type Form, formOf, type ObjectForm, type UnionForm } from './schema-form.ts';
import { unionFaults } from './union-faults.ts';

/** Where faults gather, and the walk that finds more of them in an inner value. */
export interface Collection {
  readonly faults: Fault[];
  readonly collect: (schema: z.core.$ZodType, value: unknown, pointer: string) => void;
}

/** A body with more faults than these is not explained further. */
export const mostFaults = 100;

/**
 * Every fault of a value that a schema refused: one a slip, found by walking the schema's own definitions.
 *
 * The compiled schema stays the judge; this only explains. It takes a union's branch by the members that only that branch
 * has, checks a misspelt member as if rightly spelt, and stops inside a quantity at a wrong unit, so that one slip is told
 * once.
 */
export function collectFaults(schema: z.core.$ZodType, value: unknown): Fault[] {
  const faults: Fault[] = [];
  const collection: Collection = {
    faults,
    collect(inner, received, pointer) {
      if (faults.length < mostFaults) visit(formOf(inner), received, pointer, collection);
    },
  };
  collection.collect(schema, value, '');
  return faults.slice(0, mostFaults);
}

function visit(form: Form, value: unknown, pointer: string, collection: Collection): void {
  const { def } = form._zod;
  switch (def.type) {
    case 'object':
      objectFaults(form as ObjectForm, value, pointer, collection);
      break;
    case 'union':
      unionFaults(form as UnionForm, value, pointer, collection);
      break;
    case 'array':
    case 'tuple':
      listFaults(form, value, pointer, collection);
      break;
    case 'record':
      recordFaults(form as z.core.$ZodRecord, value, pointer, collection);
      break;
    case 'nullable':
      if (value !== null) collection.collect(def.innerType, value, pointer);
      break;
    default:
      collection.faults.push(...scalarFaults(form, value, pointer));
  }
}

function scalarFaults(form: Form, value: unknown, pointer: string): Fault[] {
  const { type } = form._zod.def;
  if (type === 'number') return numberFault(form, value, pointer);
  if (type === 'string') return textFault(form, value, pointer);
  if (type === 'literal' || type === 'enum') return wordFault(form, value, pointer);
  const fits = type === 'boolean' ? typeof value === 'boolean' : type === 'null' ? value === null : type !== 'never';
  return fits ? [] : [wrongType(pointer, value, allowedBy(form))];
}

/** A member's name is at fault, not its value: another code than the value's, so that both can be told. */
function oddName(pointer: string, name: string, keyType: z.core.$ZodType): Fault {
  return {
    pointer,
    code: 'unknown-member',
    message: `A member here cannot be named ${shortened(name)}.`,
    allowed: `as its name, ${allowedBy(keyType)}`,
  };
}

function recordFaults(form: z.core.$ZodRecord, value: unknown, pointer: string, collection: Collection): void {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    collection.faults.push(wrongType(pointer, value, allowedBy(form)));
    return;
  }
  const { keyType, valueType } = form._zod.def;
  for (const [name, inner] of Object.entries(value)) {
    const at = pointerTo(pointer, shortened(name));
    if (scalarFaults(formOf(keyType), name, at).length > 0) collection.faults.push(oddName(at, name, keyType));
    collection.collect(valueType, inner, at);
  }
}
