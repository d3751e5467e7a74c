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
 * @param to - airspeed to reach [m/s]
 * @returns the whole roll, and the forces on the stretch on which it ends
 */
export function profiledRoll(
  forces: RollForces,
  profile: SlopeProfile,
  headwind: number,
  to: number,
): StretchedPath & { readonly forces: RollForces } {
  const here = profile.slopes.map((slope) => sloped(forces, slope));
  const path = stretchedPath(profile.ends, 0, headwind, to, (stretch, from, upTo) =>
    rollBetween(here[stretch] as RollForces, headwind, from, upTo),
  );
  return { ...path, forces: here[path.stretch] as RollForces };
}
