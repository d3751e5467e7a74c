/** Members that may be undefined, where the built object leaves an absent member out. */
export type Perhaps<T> = { readonly [K in keyof T]-?: T[K] | undefined };

/**
 * An object without the members that are undefined, in the order given.
 *
 * An absent member stays absent: undefined is neither written to JSON nor taken for a value.
 */
export function present<T extends object>(members: Perhaps<T>): T {
  const object: Record<string, unknown> = {};
  for (const name in members) {
    const member = members[name];
    if (member !== undefined) object[name] = member;
  }
  return object as T;
}

/** The SI value of a quantity that may be absent. */
export function perhaps<A, B>(convert: (given: A) => B, given: A | undefined): B | undefined {
  return given === undefined ? undefined : convert(given);
}

/** An object under construction: its members are assigned in the order of the contract, absent ones not at all. */
export type Draft<T> = { -readonly [K in keyof T]: T[K] };
