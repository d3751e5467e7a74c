import { scales } from '../units/units.ts';

/** A takeoff, rejected or not, has its wheels turning; a landing spins them up on the water. */
export type RollPhase = 'takeoff' | 'landing';

/** Knots over the square root of psi: rolling wheels from Horne & Dreher, spinning up from recall. */
const knotsByRootPsi: Readonly<Record<RollPhase, number>> = { takeoff: 9, landing: 7.7 };

/**
 * Ground speed at which a tyre is lifted off the runway by the water under it.
 *
 * V_P [kt] = 9 sqrt(p [psi]) for a wheel that rolls, 7.7 sqrt(p [psi]) for one that spins up at touchdown.
 *
 * @param tyrePressure - p [Pa], above 0
 * @param phase - a rejected takeoff counts as takeoff
 * @returns V_P [m/s]
 * @remarks Dynamic hydroplaning on flooded pavement; not divided by the root of the fluid's relative density, which would put the
 * speed for slush and snow higher. A smooth tyre on a smooth wet runway may slide below it.
 * @see references.HorneDreher1963; references.Ac25s31, note 2 of table 2; references.HorneSpinUp for 7.7
 */
export function hydroplaningSpeed(tyrePressure: number, phase: RollPhase): number {
  if (!(tyrePressure > 0)) throw new RangeError(`tyrePressure must be above 0: ${tyrePressure}`);
  return knotsByRootPsi[phase] * scales.speed.kt * Math.sqrt(tyrePressure / scales.pressure.psi);
}
