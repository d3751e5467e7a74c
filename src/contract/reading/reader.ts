import * as z from 'zod';
import type { Fault, Refused } from '../../planning/fault.ts';
import { collectFaults } from './collect-faults.ts';
import { pointerTo } from './json-pointer.ts';

/** Reads one value against a schema: the value in the schema's own order, or every fault in it. */
export type Reader<T> = (value: unknown) => { readonly value: T } | Refused;

/**
 * Compiles a schema into a reader. The compiled schema judges; a refusal is explained by walking the same definitions.
 *
 * Compiling costs some milliseconds, once; a schema that cannot be compiled throws here, at start.
 */
export function reader<S extends z.ZodType>(schema: S): Reader<z.output<S>> {
  const compiled = z.compile(schema, { strict: true });
  return (value) => {
    const judged = compiled.safeParse(value);
    if (judged.success) return { value: judged.data };
    const faults = collectFaults(schema, value);
    return { refused: faults.length > 0 ? faults : judged.error.issues.map(asJudged) };
  };
}

/** What the judge itself says, for a check of its own that the walk does not know. */
function asJudged(issue: z.core.$ZodIssue): Fault {
  const pointer = issue.path.reduce<string>(
    (parent, step) => pointerTo(parent, typeof step === 'number' ? step : String(step)),
    '',
  );
  return { pointer, code: 'implausible', message: issue.message };
}
