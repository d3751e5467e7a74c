import { standardDensity, standardTemperature } from '../atmosphere.ts';
import { rho0 } from '../constants.ts';
import { humidityPowerTerm } from '../humidity-power-term.ts';
import type { EngineAir } from './engine-air.ts';

/** How a piston engine's full-throttle power falls with altitude, temperature and moisture. */
export interface PistonLapse {
  /** C; 0.1166 is Gagg and Ferrar's */
  readonly altitudeLapseCoefficient: number;
  /** n on T_standard/T at the pressure altitude */
  readonly temperatureExponent: number;
  /** on the loss by moisture; 0 switches it off */
  readonly humidityFactor: number;
  /** pressure altitude up to which a turbocharger holds rated power [m] */
  readonly criticalAltitude?: number;
}

/**
 * Full-throttle power of a piston engine over its rated power.
 *
 * Phi (T_s/T)^n h; Phi = (sigma_s - C)/(1 - C), not below 0, sigma_s and T_s the standard atmosphere's at the pressure altitude;
 * a turbocharged engine has Phi = 1 up to its critical altitude and Phi/Phi(critical) above; h is the humidity term.
 *
 * @param lapse - dimensionless, critical altitude [m]
 * @param air - at the runway
 * @returns ratio, 0 or more; above 1 in cold or dense air
 * @remarks C = 0.116608 is P/P0 = 1.132 sigma - 0.132.
 * @see references.GaggFerrar1934; references.Lowry1995; references.Cfr25s101
 */
export function pistonPowerRatio(lapse: PistonLapse, air: EngineAir): number {
  const { altitudeLapseCoefficient: c, temperatureExponent, humidityFactor, criticalAltitude } = lapse;
  const density =
    criticalAltitude === undefined
      ? densityTerm(air.pressureAltitude, c)
      : air.pressureAltitude <= criticalAltitude
        ? 1
        : densityTerm(air.pressureAltitude, c) / densityTerm(criticalAltitude, c);
  const temperature = (standardTemperature(air.pressureAltitude) / air.temperature) ** temperatureExponent;
  const moisture =
    air.vapourPressure === undefined || humidityFactor === 0
      ? 1
      : humidityPowerTerm(air.pressure, air.vapourPressure, air.pressureAltitude, humidityFactor);
  return density * temperature * moisture;
}

function densityTerm(pressureAltitude: number, c: number): number {
  return Math.max(0, (standardDensity(pressureAltitude) / rho0 - c) / (1 - c));
}
