import type { Thrust } from '../../physics/thrust/thrust.ts';
import { type Climb, steadyClimb } from '../steady-climb.ts';
import { type OutsideStatedData, outsideStatedData } from '../takeoff/outside-stated-data.ts';
import type { EngineFailureRun } from './engine-failure-run.ts';

/** A steady climb on the engines that remain, in SI. */
export interface ClimbOnRemaining extends Omit<Climb, 'thrust'> {
  readonly remainingThrust: Thrust;
  /** that the dead engine and the rudder add to the zero-lift drag, which is of flap and gear as they are */
  readonly dragIncrementCoefficient: number;
}

/** Dimensionless, [m/s]: below 0 where the aeroplane sinks. */
export type OneEngineClimb =
  | { readonly outcome: 'climb'; readonly gradient: number; readonly rate: number }
  | OutsideStatedData;

/**
 * Gradient and rate of climb with one engine out at a constant true airspeed, out of ground effect, wings level, through still air.
 *
 * @param climb - in any configuration: after takeoff, in the approach, balked
 * @returns 'outside-stated-data' where the thrust is not known at the airspeed
 * @see references.Cfr25s121; references.AndersonPerformance, ch. 5
 */
export function oneEngineClimb({
  remainingThrust,
  dragIncrementCoefficient,
  ...climb
}: ClimbOnRemaining): OneEngineClimb {
  const { airspeed } = climb;
  const outside = outsideStatedData(remainingThrust, airspeed, airspeed);
  if (outside !== undefined) return outside;
  const zeroLiftDragCoefficient = climb.zeroLiftDragCoefficient + dragIncrementCoefficient;
  return {
    outcome: 'climb',
    ...steadyClimb({ ...climb, zeroLiftDragCoefficient, thrust: remainingThrust.at(airspeed) }),
  };
}

/**
 * The climb after the continued takeoff of a run: its mass, air and thrust.
 *
 * @param airspeed - true [m/s]; absent: the screen speed
 * @param zeroLiftDragCoefficient - flap and gear as they are; absent: as in the takeoff
 */
export function oneEngineClimbAfterTakeoff(
  run: EngineFailureRun,
  airspeed = run.screenSpeed,
  zeroLiftDragCoefficient = run.allEngines.airDragCoefficient,
): OneEngineClimb {
  const { mass, wingArea, inducedDragFactor, density } = run.allEngines;
  const { remainingThrust, dragIncrementCoefficient } = run;
  const figures = { mass, wingArea, inducedDragFactor, density, remainingThrust, dragIncrementCoefficient };
  return oneEngineClimb({ ...figures, airspeed, zeroLiftDragCoefficient });
}
