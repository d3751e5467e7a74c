import type { BrakedRun } from '../landing/landing-run.ts';
import type { AccelerateStop, EngineFailureRun } from './engine-failure-run.ts';
import { type Failure, type FailureRolls, failureOf, failureRolls, neverReaches } from './failure-speed.ts';
import { type FirstAction, stopFrom } from './stop-from.ts';

/**
 * The rejected takeoff: distance from brake release to the stop when the pilot's first action is at V1.
 *
 * Two stops, the longer counts. Engine failure: all engines to V_EF, one out to V1; then the times of the timeline, the brakes and
 * the idle thrust of the engines that run. No failure: all engines to V1, the same times, the idle thrust of all. The drag of the
 * dead engine acts from V_EF to the stop.
 *
 * @param run - ground, wind and timeline; the ground of its stop is measured from brake release
 * @param decisionSpeed - V1, true airspeed [m/s], at or above the headwind
 * @returns distance [m], time [s], brake energy [J], or the name of why there are none
 * @remarks Where the engines that remain do not accelerate the aeroplane at V1 it is taken to hold V1 while the failure is
 * recognised: the longer way.
 * @see references.Cfr25s109a; references.Cfr23s55
 */
export function accelerateStop(run: EngineFailureRun, decisionSpeed: number): AccelerateStop {
  const rolls = failureRolls(run);
  return stopAfter(rolls, failureOf(rolls, decisionSpeed), decisionSpeed);
}

/** The same with the failure already found. */
export function stopAfter(rolls: FailureRolls, failure: Failure, decisionSpeed: number): AccelerateStop {
  if (failure.outcome !== 'fails') return failure;
  const { run, allEngines } = rolls;
  const { reaches, sum } = allEngines(run.allEngines.headwind, decisionSpeed, 0);
  if (!reaches) return neverReaches(run.allEngines, decisionSpeed, sum);
  const action = firstAction(rolls, failure, decisionSpeed);
  const failed = stopFrom(rolls.oneOutRun, rolls.oneOut, action, run.timeline, failedStop(run));
  if (failed.outcome !== 'stops') return failed;
  const without = { speed: decisionSpeed, distance: sum.distance, time: sum.time };
  const all = stopFrom(run.allEngines, allEngines, without, run.timeline, allEnginesStop(run));
  if (all.outcome !== 'stops') return all;
  const longer = failed.distance >= all.distance ? failed : all;
  return {
    outcome: 'stops',
    distance: longer.distance,
    time: longer.time,
    failureSpeed: failure.speed,
    brakingSpeed: longer.brakingSpeed,
    longer: longer === failed ? 'engine-failure' : 'all-engines',
    engineFailureDistance: failed.distance,
    allEnginesDistance: all.distance,
    brakeEnergy: Math.max(failed.brakeEnergy, all.brakeEnergy),
  };
}

/** V1 after a failure: what its recognition leaves of its time when V1 is reached is spent at V1. */
function firstAction(
  { run, oneOut }: FailureRolls,
  failure: Extract<Failure, { outcome: 'fails' }>,
  decisionSpeed: number,
): FirstAction {
  const { sum } = oneOut(failure.speed, decisionSpeed, failure.distance);
  const held = Math.max(0, run.timeline.recognitionTime - sum.time);
  return {
    speed: decisionSpeed,
    distance: failure.distance + sum.distance + held * (decisionSpeed - run.allEngines.headwind),
    time: failure.time + sum.time + held,
  };
}

function failedStop({ stop, dragIncrementCoefficient }: EngineFailureRun): BrakedRun {
  return { ...stop, groundDragCoefficient: stop.groundDragCoefficient + dragIncrementCoefficient };
}

function allEnginesStop({ stop, idleThrustAllEngines, reverseThrustAllEngines }: EngineFailureRun): BrakedRun {
  const { reverseThrust: reverse } = stop;
  const reverseThrust = reverse && { ...reverse, thrust: reverseThrustAllEngines ?? reverse.thrust };
  return { ...stop, idleThrust: idleThrustAllEngines, reverseThrust };
}
