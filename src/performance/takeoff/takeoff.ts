import { steepestFrom } from '../slope-profile.ts';
import { airDistance, neededWithAllEngines } from './air-distance.ts';
import { groundRoll } from './ground-roll.ts';
import type { TakeoffResult, TakeoffRun } from './takeoff-run.ts';

/**
 * The takeoff from brake release to the screen: ground roll, then air path.
 *
 * @param run - everything the integrations need, in SI
 * @param neededClimbGradient - that must be exceeded on the whole air path
 * @returns distances [m], times [s], or the name of why there are none: 'outside-stated-data' where the thrust is not known over
 * the speeds from brake release to the screen, and the outcomes of groundRoll and airDistance
 * @see references.McCormick1995, ch. 7; references.HouseEnergyPath
 */
export function takeoff(run: TakeoffRun, neededClimbGradient = neededWithAllEngines): TakeoffResult {
  const roll = run.headwind >= run.liftOffSpeed ? undefined : outsideData(run);
  if (roll !== undefined) return roll;
  const ground = groundRoll(run);
  if (ground.outcome !== 'lifts-off') return ground;
  const air = airDistance(underPath(run, ground.distance), neededClimbGradient);
  if (air.outcome === 'ground-speed-not-positive') return air;
  if (air.outcome !== 'reaches-screen') {
    const { outcome, leastClimbGradient } = air;
    return {
      outcome,
      groundRoll: ground.distance,
      groundRollTime: ground.time,
      leastClimbGradient,
      neededClimbGradient,
    };
  }
  return {
    outcome: 'reaches-screen',
    groundRoll: ground.distance,
    groundRollTime: ground.time,
    airDistance: air.distance,
    airTime: air.time,
    takeoffDistance: ground.distance + air.distance,
    leastAccelerationRatio: ground.leastAccelerationRatio,
    leastClimbGradient: air.leastClimbGradient,
  };
}

/** The run as its air path sees the ground: on a profile the steepest stretch from lift-off on. */
export function underPath(run: TakeoffRun, groundRoll: number): TakeoffRun {
  return run.profile === undefined ? run : { ...run, slope: steepestFrom(run.profile, groundRoll) };
}

function outsideData(run: TakeoffRun): TakeoffResult | undefined {
  const { domain } = run.thrust;
  if (domain === undefined) return undefined;
  const [lowest, highest] = domain;
  const first = Math.max(0, run.headwind);
  const last = Math.max(run.liftOffSpeed, run.screenSpeed);
  if (first < lowest) return { outcome: 'outside-stated-data', airspeed: first, bound: lowest };
  if (last > highest) return { outcome: 'outside-stated-data', airspeed: last, bound: highest };
  return undefined;
}
