import { brent } from '../../numerics/brent.ts';
import { newPathIntegral, type PathIntegral } from '../path-integral.ts';
import type { SlopeProfile } from '../slope-profile.ts';
import { type RollBetween, rollBetween } from './roll-between.ts';
import { type RollForces, sloped } from './roll-forces.ts';

/** On the airspeed at which a stretch is left [m/s]: a micrometre of runway. */
const speedTolerance = 1e-9;

/**
 * The roll over stretches of different slope, from one airspeed to a higher one.
 *
 * Each stretch is the roll under its own steady forces; it is left at the airspeed at which its length is used up, found as a
 * bracketed root. The last slope holds beyond the profile.
 *
 * @param forces - of the level roll
 * @param profile - from the start point on
 * @param headwind - w [m/s]
 * @param to - airspeed to reach [m/s]
 * @returns the whole roll; without gain of speed where the acceleration is gone on any stretch before it is left: an aeroplane that
 * would slow down on a hump is taken as not getting off
 */
export function profiledRoll(
  forces: RollForces,
  profile: SlopeProfile,
  headwind: number,
  to: number,
): RollBetween & { readonly forces: RollForces } {
  const whole = newPathIntegral();
  let from = headwind;
  let begin = 0;
  const last = profile.slopes.length - 1;
  for (let i = 0; ; i++) {
    const here = sloped(forces, profile.slopes[i] as number);
    const length = (profile.ends[i] as number) - begin;
    const rest = rollBetween(here, headwind, from, to);
    if (i === last || (rest.gainsSpeed && rest.sum.distance <= length)) {
      add(whole, rest.sum);
      return { gainsSpeed: rest.gainsSpeed, sum: whole, forces: here };
    }
    const leave = leavingSpeed(here, headwind, from, rest.gainsSpeed ? to : rest.sum.leastAt, length);
    if (leave === undefined) {
      add(whole, rest.sum);
      return { gainsSpeed: false, sum: whole, forces: here };
    }
    add(whole, rollBetween(here, headwind, from, leave).sum);
    from = leave;
    begin = profile.ends[i] as number;
  }
}

/** Airspeed at which a stretch of this length is used up; undefined where the acceleration is gone before. */
function leavingSpeed(
  forces: RollForces,
  headwind: number,
  from: number,
  upTo: number,
  length: number,
): number | undefined {
  const over = (airspeed: number) => {
    if (airspeed <= from) return -length;
    const roll = rollBetween(forces, headwind, from, airspeed);
    // where no speed is gained the length would never be used up: beyond the root
    return roll.gainsSpeed ? roll.sum.distance - length : length;
  };
  const found = brent(over, from, upTo, speedTolerance);
  if (found.outcome !== 'root') return undefined;
  return found.root > from && rollBetween(forces, headwind, from, found.root).gainsSpeed ? found.root : undefined;
}

function add(whole: PathIntegral, part: PathIntegral): void {
  whole.distance += part.distance;
  whole.time += part.time;
  if (part.least < whole.least) {
    whole.least = part.least;
    whole.leastAt = part.leastAt;
  }
  whole.most = Math.max(whole.most, part.most);
}
