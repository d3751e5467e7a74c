import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import type { EngineFailureRun } from './engine-failure-run.ts';

/**
 * The continued takeoff from the failure on as a run: the thrust that remains, the drag that the dead engine and the rudder add, the
 * speeds and the screen of the continued takeoff.
 */
export function oneOutRun(run: EngineFailureRun): TakeoffRun {
  const { allEngines, dragIncrementCoefficient } = run;
  return {
    ...allEngines,
    thrust: run.remainingThrust,
    groundDragCoefficient: allEngines.groundDragCoefficient + dragIncrementCoefficient,
    airDragCoefficient: allEngines.airDragCoefficient + dragIncrementCoefficient,
    rotationSpeed: run.rotationSpeed,
    liftOffSpeed: run.liftOffSpeed,
    screenSpeed: run.screenSpeed,
    screenHeight: run.screenHeight,
  };
}
