import { manualClimb } from '../../performance/flight-manual/manual-climb.ts';
import type { ClimbFigures } from '../answer.ts';
import type { Conditions } from '../conditions.ts';
import { isPhysicsByName } from '../method.ts';
import type { Question } from '../question.ts';
import { manualAsked } from './manual-asked.ts';

/**
 * The climb that the flight manual prints for the configuration, all engines at full power.
 *
 * A rate that it does not print follows from the gradient at the airspeed of the climb: V sin gamma.
 *
 * @param airspeed - true [m/s]
 * @returns undefined where the manual prints no gradient there, or the aeroplane is no longer the one it is of
 */
export function climbByManual(
  question: Question,
  { configuration, air }: Pick<Conditions, 'configuration' | 'air'>,
  airspeed: number,
): ClimbFigures | undefined {
  const { aeroplane, changes } = question;
  const manual = aeroplane.flightManual;
  if (manual === undefined || isPhysicsByName(question) || changes?.flewAs !== undefined) return undefined;
  const found = manualClimb(manual, manualAsked(question, configuration, air));
  if (found === undefined || found.outcome !== 'climb' || found.gradient === undefined) return undefined;
  const { gradient, rate = (airspeed * gradient) / Math.hypot(1, gradient) } = found;
  return { gradient, rate, method: 'flight-manual' };
}
