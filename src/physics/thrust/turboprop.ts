import { p0, T0 } from '../constants.ts';
import { type ActuatorDisc, actuatorDiscThrust } from './actuator-disc.ts';
import type { EngineAir } from './engine-air.ts';
import type { Thrust } from './thrust.ts';

/** A turbine with a governed propeller. */
export interface TurbopropEngine extends ActuatorDisc {
  /** flat-rated, of one engine [W] */
  readonly power: number;
  /** from the standard day at sea level up to which the flat rating holds [K] */
  readonly flatRating: number;
  /** n of the thermodynamic power's fall with temperature, 1.5 to 2.5 */
  readonly lapseExponent: number;
}

/**
 * Power of one turboprop engine.
 *
 * P = min(P_flat, P_th0 delta theta^-n), P_th0 = P_flat ((288.15 + dT)/288.15)^n: the corner moves to lower temperatures the
 * higher the field.
 *
 * @param engine - power [W], flat rating [K] at sea level
 * @param air - pressure and temperature
 * @returns [W]
 * @see references.Torenbeek1982, ch. 4, gas turbine lapse; the form and its exponent are a judgement
 */
export function turbopropPower(
  engine: Pick<TurbopropEngine, 'power' | 'flatRating' | 'lapseExponent'>,
  air: Pick<EngineAir, 'pressure' | 'temperature'>,
): number {
  const thermodynamic = (air.pressure / p0) * ((T0 + engine.flatRating) / air.temperature) ** engine.lapseExponent;
  return engine.power * Math.min(1, thermodynamic);
}

/**
 * Thrust of turboprops: the actuator disc at the power of turbopropPower; no residual jet thrust.
 *
 * @param engine - figures of one engine
 * @param engines - those that run
 * @param air - at the runway
 * @see references.McCormick1995, ch. 6
 */
export function turbopropThrust(engine: TurbopropEngine, engines: number, air: EngineAir): Thrust {
  return actuatorDiscThrust(engine, engines, turbopropPower(engine, air), engine.power, air.density);
}
