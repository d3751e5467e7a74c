import { brent } from '../numerics/brent.ts';
import { type AddPiece, addSettled, newPathIntegral, type PathIntegral } from './path-integral.ts';

/** Distance and time at the ends of the pieces of a path, in the path's own variable. */
export interface PathTable {
  readonly ends: readonly number[];
  readonly distances: readonly number[];
  readonly times: readonly number[];
  /** integrates a piece */
  readonly add: AddPiece;
  /** taken off the distance for each second [m/s] */
  readonly headwind: number;
}

/** Into how many parts each smooth piece of a path is cut, to find places on it fast. */
const parts = 12;
/** How often a part that cannot be integrated is halved, to come near to where the path ends. */
const halvings = 30;

/**
 * A path integrated piece by piece, so that any place on it can be found.
 *
 * @param ends - of its smooth pieces, rising
 * @param add - integrates a piece: distance over the ground, or through the air where a headwind is given [m], time [s]
 * @param length - beyond this distance the path is not followed [m]
 * @returns undefined where the path ends before its last piece and before that distance
 */
export function pathTable(
  ends: readonly number[],
  add: AddPiece,
  length = Number.POSITIVE_INFINITY,
  headwind = 0,
): PathTable | undefined {
  const table = { ends: [ends[0] as number], distances: [0], times: [0] };
  const sum = newPathIntegral();
  const step = (low: number, high: number): boolean => {
    const before = { ...sum };
    if (!addSettled(add, low, high, sum)) {
      Object.assign(sum, before);
      return false;
    }
    table.ends.push(high);
    table.distances.push(sum.distance - headwind * sum.time);
    table.times.push(sum.time);
    return true;
  };
  for (let i = 1; i < ends.length; i++) {
    const from = ends[i - 1] as number;
    const whole = (ends[i] as number) - from;
    for (let part = 1; part <= parts; part++) {
      const high = part === parts ? (ends[i] as number) : from + (whole * part) / parts;
      let low = table.ends.at(-1) as number;
      let share = high - low;
      for (let tries = 0; high > low && share > 0; ) {
        if (step(low, Math.min(high, low + share))) low = table.ends.at(-1) as number;
        else if (++tries > halvings) return undefined;
        else share /= 2;
        if ((table.distances.at(-1) as number) >= length) return { ...table, add, headwind };
      }
    }
  }
  return { ...table, add, headwind };
}

/**
 * Where on a path a distance has been covered, in the path's own variable, and when.
 *
 * @param distance - [m], from the start; beyond the end the end is given
 */
export function pointOnPath(
  { ends, distances, times, add, headwind }: PathTable,
  distance: number,
): { readonly at: number; readonly time: number } {
  let i = 1;
  while (i < ends.length - 1 && (distances[i] as number) < distance) i++;
  const low = ends[i - 1] as number;
  const high = ends[i] ?? low;
  const missing = distance - (distances[i - 1] as number);
  const from = (at: number): PathIntegral => {
    const piece = newPathIntegral();
    if (at > low) add(low, at, piece);
    return piece;
  };
  const excess = (at: number) => {
    const piece = from(at);
    return piece.distance - headwind * piece.time - missing;
  };
  const found = brent(excess, low, high, 1e-12 * Math.max(Math.abs(low), Math.abs(high), 1));
  if (found.outcome === 'root') return { at: found.root, time: (times[i - 1] as number) + from(found.root).time };
  return missing <= 0
    ? { at: low, time: times[i - 1] as number }
    : { at: high, time: times[i] ?? (times[i - 1] as number) };
}
