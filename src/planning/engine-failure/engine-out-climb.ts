import type { Configuration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { oneEngineClimb } from '../../performance/engine-failure/one-engine-climb.ts';
import { propulsionAtSetting } from '../../performance/power-setting.ts';
import { propulsionThrust } from '../../performance/propulsion.ts';
import { tasFromEas } from '../../physics/airspeed.ts';
import { inducedDragFactor } from '../../physics/drag.ts';
import { airAloft } from '../air-aloft.ts';
import type { Climbed } from '../climb-checks.ts';
import type { Question } from '../question.ts';

/** A climb on the engines that remain, at one height above the runway. */
export interface ClimbingOneOut {
  readonly configuration: Configuration;
  /** zero-lift drag increment of flap and gear as they are before anything comes up */
  readonly airDragIncrement: number;
  /** what the dead engine and the rudder add */
  readonly dragIncrementCoefficient: number;
  /** at the runway */
  readonly air: Air;
  readonly thrustFactor: number;
  /** of full power */
  readonly powerRatio: number;
  /** equivalent airspeed held [m/s] */
  readonly eas: number;
  /** [m] */
  readonly height: number;
}

/**
 * Gradient and rate of climb with one engine out, wings level, out of ground effect, in the air at that height.
 *
 * Gear and flap are as the configuration says they come up; where it says nothing they stay, and the gradient is the least it can be.
 *
 * @returns the climb, or why there is none
 * @see references.AndersonPerformance, ch. 5
 */
export function engineOutClimb(
  { aeroplane, mass }: Pick<Question, 'aeroplane' | 'mass'>,
  climb: ClimbingOneOut,
): Climbed {
  const { wing, drag, propulsion, engines } = aeroplane;
  const { configuration, height } = climb;
  const air = height === 0 ? climb.air : airAloft(climb.air, height);
  const airspeed = tasFromEas(climb.eas, air.density);
  const atSetting = propulsionAtSetting(propulsion, climb.powerRatio);
  const thrust = propulsionThrust(atSetting, engines - 1, air, climb.thrustFactor);
  const { climbOut = [] } = configuration;
  const stage = climbOut.findLast(({ from }) => from <= height);
  const increment = stage?.airDragIncrementCoefficient ?? climb.airDragIncrement;
  const found = oneEngineClimb({
    mass,
    wingArea: wing.area,
    zeroLiftDragCoefficient: drag.zeroLiftCoefficient + increment,
    dragIncrementCoefficient: climb.dragIncrementCoefficient,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    density: air.density,
    airspeed,
    remainingThrust: thrust,
  });
  if (found.outcome !== 'climb') return { why: 'thrust is not known at the airspeed of the climb' };
  const { gradient, rate } = found;
  const isLeast = height > 0 && climbOut.length === 0;
  if (!isLeast) return { gradient, rate };
  return { gradient, rate, atLeastBecause: 'nothing is stated of how gear and flap come up after the screen' };
}
