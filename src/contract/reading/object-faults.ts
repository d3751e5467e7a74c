import type * as z from 'zod';
import type { Fault } from '../../planning/fault.ts';
import { allowedBy, list } from './allowed.ts';
import type { Collection } from './collect-faults.ts';
import { pointerTo } from './json-pointer.ts';
import { nearestNames } from './nearest-name.ts';
import { shortened, wrongType } from './scalar-faults.ts';
import { isOptional, type ObjectForm } from './schema-form.ts';

export type Shape = Readonly<Record<string, z.core.$ZodType>>;

/** Faults of an object. */
export function objectFaults(form: ObjectForm, value: unknown, pointer: string, collection: Collection): void {
  if (isPlainObject(value)) memberFaults(form._zod.def.shape, value, pointer, collection);
  else collection.faults.push(wrongType(pointer, value, allowedBy(form)));
}

/** Faults of an object's members: unknown, misspelt and missing ones, and those inside each known one. */
export function memberFaults(
  shape: Shape,
  value: Record<string, unknown>,
  pointer: string,
  { faults, collect }: Collection,
): void {
  const absent = new Set(Object.keys(shape).filter((name) => !Object.hasOwn(value, name)));
  for (const [name, inner] of Object.entries(value)) {
    const at = pointerTo(pointer, shortened(name));
    if (Object.hasOwn(shape, name)) {
      collect(shape[name] as z.core.$ZodType, inner, at);
      continue;
    }
    const [meant] = nearestNames(name, absent, 1);
    faults.push(unknownMember(at, name, Object.keys(shape), meant));
    if (meant === undefined) continue;
    absent.delete(meant);
    collect(shape[meant] as z.core.$ZodType, inner, at);
  }
  for (const name of absent) {
    const schema = shape[name] as z.core.$ZodType;
    if (!isOptional(schema)) faults.push(missing(pointerTo(pointer, name), name, allowedBy(schema)));
  }
}

export function isPlainObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

export function missing(pointer: string, name: string, allowed: string): Fault {
  return { pointer, code: 'missing', message: `The member ${name} is missing.`, allowed };
}

export function unknownMember(pointer: string, name: string, known: readonly string[], meant?: string): Fault {
  return {
    pointer,
    code: 'unknown-member',
    message: `There is no member ${shortened(name)} here.`,
    allowed: list(known, 'and'),
    ...(meant === undefined ? {} : { hint: `Perhaps ${meant}.` }),
  };
}
