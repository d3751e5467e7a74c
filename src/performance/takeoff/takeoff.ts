import { steepestFrom } from '../slope-profile.ts';
import { airDistance, neededWithAllEngines } from './air-distance.ts';
import { groundRoll } from './ground-roll.ts';
import { outsideStatedData } from './outside-stated-data.ts';
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
  if (run.headwind < run.liftOffSpeed) {
    const outside = outsideStatedData(run.thrust, run.headwind, Math.max(run.liftOffSpeed, run.screenSpeed));
    if (outside !== undefined) return outside;
  }
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
