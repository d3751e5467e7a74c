import { p0, rho0, T0 } from '../physics/constants.ts';
import type { Propulsion } from './aeroplane.ts';
import { propulsionThrust } from './propulsion.ts';
import { propulsionDefault } from './propulsion-defaults.ts';

/** The factor on an aeroplane's thrust, and how it compares with the published mean. */
export interface ThrustFactor {
  readonly value: number;
  readonly from: 'definition' | 'default' | 'lowered';
  /** thrust at 0.707 of the lift-off speed over Torenbeek's mean, before lowering; absent where not compared */
  readonly ratioToMean?: number;
}

const standardDay = { pressureAltitude: 0, pressure: p0, temperature: T0, density: rho0 };
/** Excess over the published mean that is let stand. @see references.HouseThrustFactor */
const letStand = 1.1;

/**
 * Mean takeoff thrust of governed propellers, at 0.707 of the lift-off speed.
 *
 * T = 0.687 P^(2/3) (sigma N D^2)^(1/3); 5.75 P (sigma N D^2/P)^(1/3) in lbf, hp, ft.
 *
 * @param power - of all engines together [W]
 * @param propellers - N
 * @param diameter - D [m]
 * @param densityRatio - sigma
 * @returns of all propellers [N]
 * @see references.Torenbeek1982, sec. 5.4
 */
export function meanPropellerThrust(power: number, propellers: number, diameter: number, densityRatio: number): number {
  return 0.687 * power ** (2 / 3) * Math.cbrt(densityRatio * propellers * diameter * diameter);
}

/**
 * The thrust factor of a definition: as stated; else the kind's default, lowered where the thrust of governed propellers
 * exceeds the published mean by more than 10 %, so that it agrees; never raised.
 *
 * @param propulsion - figures of one engine
 * @param engines - all of them
 * @param liftOffSpeed - at maximum mass, sea level, standard day [m/s]
 * @see references.Torenbeek1982, sec. 5.4; references.HouseThrustFactor
 */
export function propulsionThrustFactor(propulsion: Propulsion, engines: number, liftOffSpeed: number): ThrustFactor {
  const stated = propulsion.thrustFactor;
  if (stated !== undefined) return { value: stated, from: 'definition' };
  const value = propulsionDefault(propulsion.kind, 'thrustFactor');
  if (propulsion.kind === 'fixed-pitch' || propulsion.kind === 'jet' || propulsion.kind === 'measured') {
    return { value, from: 'default' };
  }
  const thrust = propulsionThrust(propulsion, engines, standardDay, value).at(Math.SQRT1_2 * liftOffSpeed);
  const mean = meanPropellerThrust(engines * propulsion.power, engines, propulsion.propellerDiameter, 1);
  const ratioToMean = thrust / mean;
  return ratioToMean > letStand
    ? { value: value / ratioToMean, from: 'lowered', ratioToMean }
    : { value, from: 'default', ratioToMean };
}
