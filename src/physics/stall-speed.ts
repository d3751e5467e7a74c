import { g0, rho0 } from './constants.ts';

/**
 * Equivalent airspeed at which lift at the greatest lift coefficient carries n times the weight.
 *
 * V_S = sqrt(2 n m g/(rho0 S CLmax)); independent of the air's density.
 *
 * @param mass - [kg], above 0
 * @param wingArea - [m2], above 0
 * @param maximumLiftCoefficient - trimmed, idle power, above 0
 * @param loadFactor - n, above 0; 1 in steady level flight
 * @returns EAS [m/s]
 * @see references.Cfr25s103; references.AndersonIntroduction, ch. 5
 */
export function stallSpeed(mass: number, wingArea: number, maximumLiftCoefficient: number, loadFactor = 1): number {
  requirePositive('mass', mass);
  requirePositive('wingArea', wingArea);
  requirePositive('maximumLiftCoefficient', maximumLiftCoefficient);
  requirePositive('loadFactor', loadFactor);
  return Math.sqrt((2 * loadFactor * mass * g0) / (rho0 * wingArea * maximumLiftCoefficient));
}

/**
 * Greatest lift coefficient behind a 1-g stall speed: the inverse of stallSpeed.
 *
 * CLmax = 2 m g/(rho0 S V_S^2)
 *
 * @param stallSpeed - 1-g, EAS [m/s], above 0
 * @param mass - at which it was found [kg]
 * @param wingArea - [m2]
 * @returns dimensionless
 * @see references.Cfr25s103
 */
export function maximumLiftCoefficientFromStallSpeed(stallSpeed: number, mass: number, wingArea: number): number {
  requirePositive('stallSpeed', stallSpeed);
  requirePositive('mass', mass);
  requirePositive('wingArea', wingArea);
  return (2 * mass * g0) / (rho0 * wingArea * stallSpeed * stallSpeed);
}

/**
 * Load factor of a coordinated level turn, n = 1/cos(bank).
 *
 * @param bank - [rad], between -pi/2 and pi/2
 * @returns dimensionless, 1 or more
 * @see references.Phak, load factors in steep turns
 */
export function turnLoadFactor(bank: number): number {
  if (!(Math.abs(bank) < Math.PI / 2)) throw new RangeError(`bank must be below a right angle: ${bank}`);
  return 1 / Math.cos(bank);
}

function requirePositive(name: string, value: number): void {
  if (!(value > 0)) throw new RangeError(`${name} must be above 0: ${value}`);
}
