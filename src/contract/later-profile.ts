import type { ProfileOnWire } from './slope.ts';

/**
 * A ground line taken from a later beginning on, in its own units.
 *
 * @param from - where it begins now, in the unit of its distances, between its first and last point
 */
export function laterProfile({ units, points }: ProfileOnWire, from: number): ProfileOnWire {
  const next = points.findIndex(([distance]) => distance > from);
  if (next < 1) throw new RangeError(`from must lie on the profile: ${from}`);
  const [before, height] = points[next - 1] as readonly [number, number];
  const [after, later] = points[next] as readonly [number, number];
  const here = height + ((later - height) * (from - before)) / (after - before);
  const rest = points.slice(next).map(([distance, up]): [number, number] => [rounded(distance - from), up]);
  return { units, points: [[0, rounded(here)], ...rest] };
}

/** To a millionth of its own unit: less than a survey knows. */
function rounded(value: number): number {
  return Number(value.toFixed(6)) + 0;
}
