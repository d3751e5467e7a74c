import type { Thrust } from '../../physics/thrust/thrust.ts';

/** A thrust asked for where it is not known: the true airspeed and the bound of its data [m/s]. */
export interface OutsideStatedData {
  readonly outcome: 'outside-stated-data';
  readonly airspeed: number;
  readonly bound: number;
}

/**
 * Whether a thrust is known between two airspeeds.
 *
 * @param thrust - measured or modelled
 * @param first - true [m/s]; below 0 it counts as 0, as in the thrust itself
 * @param last - true [m/s], above first
 * @returns undefined where it is
 */
export function outsideStatedData({ domain }: Thrust, first: number, last: number): OutsideStatedData | undefined {
  if (domain === undefined) return undefined;
  const [lowest, highest] = domain;
  const from = Math.max(0, first);
  if (from < lowest) return { outcome: 'outside-stated-data', airspeed: from, bound: lowest };
  if (last > highest) return { outcome: 'outside-stated-data', airspeed: last, bound: highest };
  return undefined;
}
