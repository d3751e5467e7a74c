import { isPlainObject } from './reading/object-faults.ts';

/**
 * A JSON value with a merge patch applied: objects merge member by member, null takes a member out, all else replaces.
 *
 * @param target - left as it is
 * @param patch - without members that reach for a prototype, as strict reading leaves it
 * @see references.Rfc7396, sec. 2
 */
export function mergePatch(target: unknown, patch: unknown): unknown {
  if (!isPlainObject(patch)) return patch;
  const merged: Record<string, unknown> = isPlainObject(target) ? { ...target } : {};
  for (const [name, change] of Object.entries(patch)) {
    if (change === null) delete merged[name];
    else merged[name] = mergePatch(Object.hasOwn(merged, name) ? merged[name] : undefined, change);
  }
  return merged;
}
