import { g0 } from '../../physics/constants.ts';
import { brakedRoll } from '../landing/braked-roll.ts';
import type { BrakedRun } from '../landing/landing-run.ts';
import type { OutsideStatedData } from '../takeoff/outside-stated-data.ts';
import type { RollAlong } from '../takeoff/roll-along.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import type { StopTimeline } from './engine-failure-run.ts';
import { speedAtTime } from './speed-at-time.ts';

/** Where the pilot acts: how far from brake release [m], how long after it [s], and how fast, true [m/s]. */
export interface FirstAction {
  readonly speed: number;
  readonly distance: number;
  readonly time: number;
}

/** The rest of a rejected takeoff, brake release included. */
export type StopFrom =
  | {
      readonly outcome: 'stops';
      readonly distance: number;
      readonly time: number;
      readonly brakingSpeed: number;
      readonly brakeEnergy: number;
    }
  | { readonly outcome: 'never-stops'; readonly atGroundSpeed: number; readonly leastDecelerationRatio: number }
  | OutsideStatedData;

/** More than an aeroplane gains in a second [m/s2]: the search for the speed after some seconds ends there. */
export const fastest = 3 * g0;
const standing = { outcome: 'stops', distance: 0, time: 0, brakeEnergy: 0 } as const;

/**
 * The stop from the pilot's first action on: the distance of some seconds at V1, the acceleration that goes on after it, the
 * transition at the speed then reached, the braked roll.
 *
 * @param run - as it accelerates when the pilot acts, with its roll along the ground
 * @param action - V1 and where it is reached
 * @param timeline - its times after V1
 * @param stop - its ground measured from brake release
 * @remarks An aeroplane that would not gain speed while it should is taken to hold it: the longer way.
 * @see references.Cfr25s109a
 */
export function stopFrom(
  run: TakeoffRun,
  roll: RollAlong,
  action: FirstAction,
  timeline: Omit<StopTimeline, 'recognitionTime'>,
  stop: BrakedRun,
): StopFrom {
  const { headwind, thrust } = run;
  const { timeAtDecisionSpeed, continuedAccelerationTime, transitionTime } = timeline;
  const after = action.distance + (action.speed - headwind) * timeAtDecisionSpeed;
  const furthest = Math.min(action.speed + fastest * continuedAccelerationTime, thrust.domain?.[1] ?? Infinity);
  const { airspeed, change } = speedAtTime(
    (to) => roll(action.speed, to, after),
    action.speed,
    furthest,
    continuedAccelerationTime,
  );
  const rest = continuedAccelerationTime - change.sum.time;
  if (airspeed === furthest && rest > 0) return { outcome: 'outside-stated-data', airspeed, bound: furthest };
  const begin = after + change.sum.distance + (airspeed - headwind) * (rest + transitionTime);
  const braked = airspeed > headwind ? brakedRoll(stop, airspeed, begin) : standing;
  if (braked.outcome !== 'stops') return braked;
  return {
    outcome: 'stops',
    distance: begin + braked.distance,
    time: action.time + timeAtDecisionSpeed + continuedAccelerationTime + transitionTime + braked.time,
    brakingSpeed: airspeed,
    brakeEnergy: braked.brakeEnergy,
  };
}
