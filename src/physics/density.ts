import { R, vapourDeficit } from './constants.ts';

/**
 * Density of moist air as an ideal mixture.
 *
 * rho = (p - 0.378 e)/(R T)
 *
 * @param pressure - [Pa], above 0
 * @param temperature - [K], above 0
 * @param vapourPressure - [Pa], 0 for dry air, below the pressure
 * @returns [kg/m3]
 * @remarks 3e-4 to 4e-4 below the metrologists' formula, which also counts compressibility.
 * @see references.Iso2533, formula (3) for dry air; references.Wmo8, Annex 4.A for the virtual temperature
 */
export function airDensity(pressure: number, temperature: number, vapourPressure = 0): number {
  if (!(temperature > 0)) throw new RangeError(`temperature must be above 0 K: ${temperature}`);
  if (!(vapourPressure >= 0 && vapourPressure < pressure)) {
    throw new RangeError(`vapourPressure must be at least 0 and below the pressure: ${vapourPressure}, ${pressure}`);
  }
  return (pressure - vapourDeficit * vapourPressure) / (R * temperature);
}
