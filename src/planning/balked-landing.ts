import { steadyClimb } from '../performance/steady-climb.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { BalkedLanding } from './answer.ts';
import type { LandingQuestion } from './question.ts';

/**
 * The climb after a balked landing: all engines at full power, landing flap, gear down, at the landing reference speed, out of
 * ground effect.
 *
 * @param thrust - of all engines at full power in this air
 * @param airDragIncrement - of flap and gear
 * @param density - [kg/m3]
 * @param airspeed - the landing reference speed, true [m/s]
 * @see references.Cfr23s77
 */
export function balkedLandingClimb(
  { aeroplane: { wing, drag }, mass }: Pick<LandingQuestion, 'aeroplane' | 'mass'>,
  thrust: Thrust,
  airDragIncrement: number,
  density: number,
  airspeed: number,
): BalkedLanding {
  const [lowest, highest] = thrust.domain ?? [0, airspeed];
  if (airspeed < lowest || airspeed > highest) {
    return { outcome: 'outside-stated-data', airspeed, bound: airspeed < lowest ? lowest : highest };
  }
  const climb = steadyClimb({
    mass,
    wingArea: wing.area,
    zeroLiftDragCoefficient: drag.zeroLiftCoefficient + airDragIncrement,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    density,
    airspeed,
    thrust: thrust.at(airspeed),
  });
  return { outcome: 'computed', ...climb };
}
