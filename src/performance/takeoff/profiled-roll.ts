import type { SlopeProfile } from '../slope-profile.ts';
import { type StretchedPath, stretchedPath } from '../stretched-path.ts';
import { rollBetween } from './roll-between.ts';
import { type RollForces, sloped } from './roll-forces.ts';

/**
 * The roll over stretches of different slope, from one airspeed to a higher one. The last slope holds beyond the profile.
 *
 * @param forces - of the level roll
 * @param profile - from the start point on
 * @param headwind - w [m/s]
 * @param from - airspeed [m/s], at or above w
 * @param to - airspeed to reach [m/s]
 * @param begin - where the roll begins on the profile [m]
 * @returns the whole roll, and the forces on the stretch on which it ends
 */
export function profiledRoll(
  forces: RollForces,
  profile: SlopeProfile,
  headwind: number,
  from: number,
  to: number,
  begin = 0,
): StretchedPath & { readonly forces: RollForces } {
  const here = profile.slopes.map((slope) => sloped(forces, slope));
  const path = stretchedPath(profile.ends, begin, from, to, (stretch, entered, left) =>
    rollBetween(here[stretch] as RollForces, headwind, entered, left),
  );
  return { ...path, forces: here[path.stretch] as RollForces };
}
