import { maximumLiftCoefficientFromStallSpeed } from '../../physics/stall-speed.ts';
import type { MaximumLift } from '../aeroplane.ts';

/** Minimum speed in the stalling manoeuvre over the 1-g stall speed. @see references.Amendment25n108 */
export const minimumToOneG = 0.94;

/**
 * Greatest lift coefficient of a configuration, as stated or from its stated stall speed.
 *
 * A stated calibrated speed is the equivalent one at sea level, where it is defined; a minimum speed is divided by 0.94.
 *
 * @param maximumLift - coefficient, or stall speed CAS [m/s] at a mass [kg]
 * @param wingArea - [m2]
 * @returns dimensionless, referred to the wing area
 * @see references.Cfr25s103
 */
export function maximumLiftCoefficient(maximumLift: MaximumLift, wingArea: number): number {
  if (maximumLift.kind === 'coefficient') return maximumLift.coefficient;
  const oneG = maximumLift.definition === 'minimum' ? maximumLift.cas / minimumToOneG : maximumLift.cas;
  return maximumLiftCoefficientFromStallSpeed(oneG, maximumLift.mass, wingArea);
}
