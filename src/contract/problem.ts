import { z } from 'zod';
import type { Fault, faultCodes, Refused } from '../planning/fault.ts';

interface Form {
  readonly status: number;
  readonly title: string;
}

/**
 * Every problem the service can answer with, by its stable code: the HTTP status and a title that never changes.
 *
 * @see references.Rfc9457, sec. 3; references.Rfc9110, sec. 15.5 and 15.6
 */
export const problemForms = {
  unreadable: { status: 400, title: 'The request cannot be read' },
  'duplicate-member': { status: 400, title: 'A member appears twice in one object' },
  'too-deep': { status: 400, title: 'The body is nested too deeply' },
  'repeated-parameter': { status: 400, title: 'A query parameter is repeated' },
  'unknown-parameter': { status: 400, title: 'There is no such query parameter' },
  'too-many-tokens': { status: 422, title: 'The body holds too many values and names' },
  'unknown-member': { status: 422, title: 'There is no such member' },
  'wrong-type': { status: 422, title: 'A value of another type belongs here' },
  'not-finite': { status: 422, title: 'A number is not finite' },
  'out-of-range': { status: 422, title: 'A value is outside its range' },
  'unknown-unit': { status: 422, title: 'The unit is not one of this quantity' },
  'unknown-id': { status: 422, title: 'The word is not in its list' },
  missing: { status: 422, title: 'A member is missing' },
  'exactly-one-of': { status: 422, title: 'Exactly one of several members belongs here' },
  contradiction: { status: 422, title: 'Two statements contradict each other' },
  implausible: { status: 422, title: 'The value is implausible' },
  'not-authorised': { status: 401, title: 'The request carries no accepted credentials' },
  'not-found': { status: 404, title: 'There is nothing at this path' },
  'method-not-allowed': { status: 405, title: 'The path does not take this method' },
  'not-acceptable': { status: 406, title: 'The answer does not exist in an accepted media type' },
  'too-slow': { status: 408, title: 'The request took too long to arrive' },
  'too-large': { status: 413, title: 'The body is too large' },
  'too-long': { status: 414, title: 'The request target is too long' },
  'unsupported-media': { status: 415, title: 'The body is of another media type or coding' },
  'expectation-failed': { status: 417, title: 'The expectation cannot be met' },
  'too-many-requests': { status: 429, title: 'There are too many requests' },
  'headers-too-large': { status: 431, title: 'The header fields are too large or too many' },
  'our-fault': { status: 500, title: 'The service failed' },
  'not-implemented': { status: 501, title: 'The service does not know this method or coding' },
  busy: { status: 503, title: 'The service cannot answer now' },
} as const satisfies Record<string, Form> & Record<(typeof faultCodes)[number], Form>;

export type ProblemCode = keyof typeof problemForms;
const problemCodes = Object.keys(problemForms) as [ProblemCode, ...ProblemCode[]];

const received = z
  .union([z.string().max(100), z.number(), z.boolean()])
  .meta({ description: 'What was received, where it is a single value; long text is cut.' });

const problemError = z
  .strictObject({
    pointer: z.string().meta({ description: 'RFC 6901 pointer into the body; empty for the whole.' }),
    code: z.enum(problemCodes).meta({ description: 'Stable code of this fault.' }),
    message: z.string().meta({ description: 'What is wrong, in a sentence.' }),
    received: received.exactOptional(),
    allowed: z.string().meta({ description: 'What belongs here.' }).exactOptional(),
    hint: z.string().meta({ description: 'What was probably meant.' }).exactOptional(),
  })
  .meta({ id: 'Fault', description: 'One fault of a request.' });

/** The body of every answer that is not the answer: application/problem+json. */
export const problem = z
  .strictObject({
    type: z.string().meta({ description: 'Reference that names the kind of problem: /problems/ and the code.' }),
    title: z.string().meta({ description: 'The kind of problem in words, always the same for a code.' }),
    status: z.int().min(400).max(599).meta({ description: 'The HTTP status, repeated.' }),
    detail: z.string().meta({ description: 'This problem in a sentence.' }),
    code: z
      .enum(problemCodes)
      .meta({ description: 'Stable code of the problem; of the first fault where there are more.' }),
    errors: z.array(problemError).max(100).meta({ description: 'Every fault of the request, at most 100.' }),
  })
  .meta({ id: 'Problem', description: 'A problem as RFC 9457 writes it.' });

export type Problem = z.infer<typeof problem>;

/** A problem of HTTP itself, or one without faults in the body. */
export function problemOf(code: ProblemCode, detail: string, errors: Problem['errors'] = []): Problem {
  const { status, title } = problemForms[code];
  return { type: `/problems/${code}`, title, status, detail, code, errors };
}

/** A refused question as a problem: the code of its first fault, every fault listed. */
export function toProblem({ refused }: Refused): Problem {
  const [first] = refused as readonly [Fault, ...Fault[]];
  const place = first.pointer === '' ? '' : ` (at ${first.pointer})`;
  const detail =
    refused.length === 1 ? `${first.message}${place}` : `${refused.length} faults; the first: ${first.message}${place}`;
  return problemOf(first.code, detail, refused.slice(0, 100));
}
