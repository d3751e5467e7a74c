import type { Propulsion } from './aeroplane.ts';

/** The factor on an aeroplane's thrust, and how it compares with the published mean. */
export interface ThrustFactor {
  readonly value: number;
  readonly from: 'definition' | 'default' | 'lowered';
  /** thrust at 0.707 of the lift-off speed over Torenbeek's mean, before lowering; absent where not compared */
  readonly ratioToMean?: number;
}

/**
 * The thrust factor of a definition: as stated; else the kind's default, lowered where the thrust exceeds Torenbeek's mean by
 * more than 10 %.
 *
 * @param propulsion - figures of one engine
 * @param engines - all of them
 * @param liftOffSpeed - at maximum mass, sea level, standard day [m/s]
 */
export function propulsionThrustFactor(propulsion: Propulsion, engines: number, liftOffSpeed: number): ThrustFactor {
  throw new Error(`not built: ${propulsion.kind} ${engines} ${liftOffSpeed}`);
}
