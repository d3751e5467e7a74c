import { g0 } from '../../physics/constants.ts';
import { airDistance } from '../takeoff/air-distance.ts';
import { outsideStatedData } from '../takeoff/outside-stated-data.ts';
import { underPath } from '../takeoff/takeoff.ts';
import type { AccelerateGo, EngineFailureRun } from './engine-failure-run.ts';
import { type Failure, type FailureRolls, failureOf, failureRolls } from './failure-speed.ts';

/** Climb gradient that must be exceeded on the whole path with one engine out. @see references.HouseEnergyPath */
const neededWithOneOut = 0;

/**
 * The continued takeoff: distance from brake release to the screen when an engine fails so that V1 is the pilot's first action.
 *
 * All engines to V_EF, one out to V_LOF, the rotation's time at V_R on top, then the energy path to the screen with the thrust that
 * remains and the drag that the dead engine adds.
 *
 * @param run - speeds and screen of the continued takeoff
 * @param decisionSpeed - V1, true airspeed [m/s], at or above the headwind and not above the lift-off speed
 * @returns distances [m] and time [s]; 'single-engine-cannot-continue' where the roll stops gaining speed before lift-off or the path
 * does not climb throughout, with the least acceleration over g or the least gradient
 * @see references.Cfr25s111; references.Cfr25s113; references.HouseEnergyPath
 */
export function accelerateGo(run: EngineFailureRun, decisionSpeed: number): AccelerateGo {
  const { headwind } = run.allEngines;
  const { liftOffSpeed } = run;
  if (headwind >= liftOffSpeed) return { outcome: 'ground-speed-not-positive', headwind, speed: liftOffSpeed };
  const rolls = failureRolls(run);
  return goAfter(rolls, failureOf(rolls, decisionSpeed), decisionSpeed);
}

/** The same with the failure already found, the lift-off speed above the headwind. */
export function goAfter(rolls: FailureRolls, failure: Failure, decisionSpeed: number): AccelerateGo {
  if (failure.outcome === 'outside-stated-data') return failure;
  const { run, oneOutRun, oneOut } = rolls;
  const { headwind, rotationTime } = run.allEngines;
  const { liftOffSpeed, rotationSpeed } = run;
  if (!(decisionSpeed <= liftOffSpeed)) {
    throw new RangeError(`decisionSpeed must not be above the lift-off speed ${liftOffSpeed}: ${decisionSpeed}`);
  }
  const outside = outsideStatedData(run.remainingThrust, headwind, Math.max(liftOffSpeed, run.screenSpeed));
  if (outside !== undefined) return outside;
  if (failure.outcome !== 'fails') return cannotContinue('roll', oneOut(headwind, liftOffSpeed, 0).sum.least / g0);
  const { reaches, sum } = oneOut(failure.speed, liftOffSpeed, failure.distance);
  if (!reaches) return cannotContinue('roll', sum.least / g0);

  const groundRoll = failure.distance + sum.distance + Math.max(0, rotationSpeed - headwind) * rotationTime;
  const air = airDistance(underPath(oneOutRun, groundRoll), neededWithOneOut);
  if (air.outcome === 'never-reaches-screen-height') return cannotContinue('climb', air.leastClimbGradient);
  if (air.outcome !== 'reaches-screen') return { outcome: air.outcome, headwind, speed: air.climbSpeed };
  return {
    outcome: 'reaches-screen',
    distance: groundRoll + air.distance,
    time: failure.time + sum.time + rotationTime + air.time,
    failureSpeed: failure.speed,
    groundRoll,
    airDistance: air.distance,
    leastClimbGradient: air.leastClimbGradient,
  };
}

function cannotContinue(because: 'roll' | 'climb', least: number): AccelerateGo {
  return { outcome: 'single-engine-cannot-continue', because, least };
}
