/**
 * A copy of a JSON value whose members stand in the order of their names at every level, for values that no schema orders: the
 * same question gives the same bytes, however its members are sorted.
 */
export function orderOfMembers<T>(value: T): T {
  if (Array.isArray(value)) return value.map(orderOfMembers) as T;
  if (typeof value !== 'object' || value === null) return value;
  const names = Object.keys(value).sort();
  return Object.fromEntries(names.map((name) => [name, orderOfMembers(value[name as keyof typeof value])])) as T;
}
