import type { EngineFailureRun } from '../../performance/engine-failure/engine-failure-run.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import type { BrakingFriction } from '../../physics/braking-friction.ts';
import type { StoppingDrag } from '../../physics/stopping-drag.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import { timelineOf } from '../rules/certification/stop-rule.ts';
import type { ResolvedEngineOut } from './resolve-engine-out.ts';
import { brakedRun, type ResolvedStop } from './resolve-stop.ts';

/** What lies under the wheels of a rejected and of a continued takeoff. */
export interface FailureGround {
  readonly braking: BrakingFriction;
  readonly contaminantDrag?: StoppingDrag | undefined;
  /** of the continued takeoff [m] */
  readonly screenHeight: number;
}

/**
 * A takeoff with an engine failure: all that its integrations need.
 *
 * @param run - with all engines, on the ground and in the wind that are asked about
 * @param remainingThrust - of the engines that still run
 * @param engines - how many there are
 */
export function failureRun(
  run: TakeoffRun,
  remainingThrust: Thrust,
  engines: number,
  stop: ResolvedStop,
  out: ResolvedEngineOut,
  ground: FailureGround,
): EngineFailureRun {
  return {
    allEngines: run,
    remainingThrust,
    dragIncrementCoefficient: out.dragIncrementCoefficient,
    // of one speed in two kinds the last bits may fall otherwise
    rotationSpeed: Math.min(run.rotationSpeed, out.liftOff.tas),
    liftOffSpeed: out.liftOff.tas,
    screenSpeed: out.screen.tas,
    screenHeight: ground.screenHeight,
    stop: brakedRun(run, stop, ground, (stop.idleThrust * (engines - 1)) / engines),
    idleThrustAllEngines: stop.idleThrust,
    timeline: timelineOf(stop.rule),
  };
}
