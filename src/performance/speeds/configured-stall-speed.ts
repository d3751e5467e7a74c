import { stallSpeed } from '../../physics/stall-speed.ts';
import type { MaximumLift } from '../aeroplane.ts';
import { maximumLiftCoefficient } from './maximum-lift-coefficient.ts';

/**
 * 1-g stall speed of a configuration at a mass: EAS, the same at every altitude.
 *
 * @param maximumLift - of the configuration
 * @param wingArea - [m2]
 * @param mass - [kg]
 * @param loadFactor - 1 in level flight
 * @returns EAS [m/s]
 * @see references.Cfr25s103
 */
export function configuredStallSpeed(maximumLift: MaximumLift, wingArea: number, mass: number, loadFactor = 1): number {
  return stallSpeed(mass, wingArea, maximumLiftCoefficient(maximumLift, wingArea), loadFactor);
}
