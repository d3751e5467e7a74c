import { pointerTo } from './reading/json-pointer.ts';
import { isPlainObject } from './reading/object-faults.ts';
import { written } from './written.ts';

/** One member that a merge patch touches: where, what stood there, what the patch puts there (null: taken out). */
export interface ChangedMember {
  /** RFC 6901 pointer into the target */
  readonly at: string;
  readonly before: unknown;
  readonly change: unknown;
  readonly after: unknown;
}

/**
 * The members that a merge patch touches, a quantity as a whole, in the order of the patch.
 *
 * @param before - the target
 * @param patch - of it
 * @param after - the target with the patch merged in
 * @see references.Rfc7396
 */
export function changedMembers(before: unknown, patch: unknown, after: unknown, at = ''): ChangedMember[] {
  if (!isPlainObject(patch) || !isPlainObject(before) || Object.hasOwn(before, 'unit')) {
    return [{ at, before, change: patch, after }];
  }
  return Object.entries(patch).flatMap(([name, change]) =>
    changedMembers(memberOf(before, name), change, memberOf(after, name), pointerTo(at, name)),
  );
}

function memberOf(value: unknown, name: string): unknown {
  return isPlainObject(value) && Object.hasOwn(value, name) ? value[name] : undefined;
}

/** A change in words: 'wing/area 13.4 m2 in place of 12.9 m2', 'limitations added', 'brakes taken out'. */
export function changeText({ at, before, after }: ChangedMember): string {
  const name = at.slice(1);
  if (after === undefined) return `${name} taken out`;
  const [to, from] = [valueText(after), valueText(before)];
  if (before === undefined) return to === undefined ? `${name} added` : `${name} ${to} added`;
  return to === undefined || from === undefined ? `${name} replaced` : `${name} ${to} in place of ${from}`;
}

/** A value in words; structures have none. */
function valueText(value: unknown): string | undefined {
  if (typeof value === 'string' || typeof value === 'number') return String(value);
  if (!isPlainObject(value)) return undefined;
  const { value: number, unit, ...rest } = value;
  const quantity = typeof number === 'number' && typeof unit === 'string' && Object.keys(rest).length === 0;
  return quantity ? written({ value: number, unit }) : undefined;
}
