import type * as z from 'zod';
import type { Refused } from '../../planning/fault.ts';

/** Reads one value against a schema: the value in the schema's own order, or every fault in it. */
export type Reader<T> = (value: unknown) => { readonly value: T } | Refused;

export function reader<S extends z.ZodType>(schema: S): Reader<z.output<S>> {
  throw new RangeError(`not built yet: ${schema.type}`);
}
