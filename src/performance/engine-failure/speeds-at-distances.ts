import { type OutsideStatedData, outsideStatedData } from '../takeoff/outside-stated-data.ts';
import { rollLegs } from '../takeoff/roll-legs.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import { pointAlong, type TrajectoryPoint } from '../trajectory.ts';

/** What to expect at distances from brake release, in their order, or the name of why it cannot be told. */
export type SpeedsAtDistances =
  | { readonly outcome: 'speeds'; readonly points: readonly (TrajectoryPoint | 'beyond-lift-off')[] }
  | { readonly outcome: 'never-reaches-lift-off-speed' }
  | OutsideStatedData;

/**
 * Airspeed and ground speed to expect at distances from brake release: the roll inverted by a bracketed root.
 *
 * @param run - all engines
 * @param distances - from brake release [m], 0 or more
 * @returns true airspeed and ground speed at each, rising with it and the same while rotating; 'beyond-lift-off' from lift-off on
 * @see references.McCormick1995, sec. 7.2
 */
export function speedsAtDistances(run: TakeoffRun, distances: readonly number[]): SpeedsAtDistances {
  for (const distance of distances) {
    if (!(distance >= 0)) throw new RangeError(`distances must be 0 or more: ${distance}`);
  }
  const outside = outsideStatedData(run.thrust, run.headwind, run.liftOffSpeed);
  if (outside !== undefined) return outside;
  const legs = rollLegs(run);
  if (legs === undefined) return { outcome: 'never-reaches-lift-off-speed' };
  return { outcome: 'speeds', points: distances.map((distance) => pointAlong(legs, distance) ?? 'beyond-lift-off') };
}
