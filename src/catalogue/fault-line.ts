import type { Fault } from '../planning/fault.ts';

/** The faults of a file in one line: the first in full, the others counted. */
export function faultLine(faults: readonly Fault[]): string {
  const [first, ...others] = faults as readonly [Fault, ...Fault[]];
  const more = others.length === 0 ? '' : ` (and ${others.length} more)`;
  return `${faultText(first)}${more}`;
}

/** One fault in one line: where, what, and what would do. */
export function faultText({ pointer, message, allowed, hint }: Fault): string {
  const place = pointer === '' ? '' : `${pointer}: `;
  return `${place}${message}${allowed === undefined ? '' : ` Allowed: ${allowed}.`}${hint === undefined ? '' : ` ${hint}`}`;
}
