import { steadyClimb } from '../performance/steady-climb.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { BalkedLanding } from './answer.ts';
import { climbByManual } from './manual/climb-by-manual.ts';
import type { PreparedLanding } from './prepare-landing.ts';
import type { LandingQuestion } from './question.ts';

/**
 * The climb after a balked landing by the flight manual, else by physics: all engines at full power, landing flap, gear down, at the landing reference speed, out of
 * ground effect.
 *
 * @see references.Cfr23s77
 */
export function balkedLandingClimb(
  question: LandingQuestion,
  { conditions, thrust, resolved: { airDragIncrement }, landingSpeeds }: PreparedLanding,
): BalkedLanding {
  const {
    aeroplane: { wing, drag },
    mass,
  } = question;
  const airspeed = landingSpeeds.speeds.landingReference.tas;
  const byManual = climbByManual(question, conditions, airspeed);
  if (byManual !== undefined) return { outcome: 'computed', ...byManual };
  const [lowest, highest] = thrust.domain ?? [0, airspeed];
  if (airspeed < lowest || airspeed > highest) {
    return { outcome: 'outside-stated-data', airspeed, bound: airspeed < lowest ? lowest : highest };
  }
  const climb = steadyClimb({
    mass,
    wingArea: wing.area,
    zeroLiftDragCoefficient: drag.zeroLiftCoefficient + airDragIncrement,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    density: conditions.air.density,
    airspeed,
    thrust: thrust.at(airspeed),
  });
  return { outcome: 'computed', ...climb, method: conditions.chosen.physics };
}
