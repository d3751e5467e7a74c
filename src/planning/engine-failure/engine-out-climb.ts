import type { Configuration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { propulsionAtSetting } from '../../performance/power-setting.ts';
import { propulsionThrust } from '../../performance/propulsion.ts';
import { steadyClimb } from '../../performance/steady-climb.ts';
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
  const [lowest, highest] = thrust.domain ?? [0, airspeed];
  if (airspeed < lowest || airspeed > highest) return { why: 'thrust is not known at the airspeed of the climb' };
  const { climbOut = [] } = configuration;
  const stage = climbOut.findLast(({ from }) => from <= height);
  const increment = stage?.airDragIncrementCoefficient ?? climb.airDragIncrement;
  const found = steadyClimb({
    mass,
    wingArea: wing.area,
    zeroLiftDragCoefficient: drag.zeroLiftCoefficient + increment + climb.dragIncrementCoefficient,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    density: air.density,
    airspeed,
    thrust: thrust.at(airspeed),
  });
  const isLeast = height > 0 && climbOut.length === 0;
  return isLeast
    ? { ...found, atLeastBecause: 'nothing is stated of how gear and flap come up after the screen' }
    : found;
}
