import { scaleHeight, standardDensity, withinStandardAtmosphere } from './atmosphere.ts';
import { lapseRate, pressureExponent, rho0, T0, tropopause } from './constants.ts';

const exponent = 1 / (pressureExponent - 1);
const tropopauseDensity = standardDensity(tropopause);

/**
 * Altitude of the standard atmosphere that has this density.
 *
 * H = (T0/L) (1 - (rho/rho0)^(1/(g0/(R L) - 1))) up to 11 000 m; 11 000 + (R T11/g0) ln(rho11/rho) above.
 *
 * @param density - of the air as it is, moisture included [kg/m3], above 0
 * @returns geopotential [m], or 'outside-standard-atmosphere' below -5000 or above 20 000 m
 * @remarks The way back is standardDensity. Printed charts leave moisture out; moist air stands higher.
 * @see references.Iso2533, formula (14) solved for H
 */
export function densityAltitude(density: number): number | 'outside-standard-atmosphere' {
  if (!(density > 0)) throw new RangeError(`density must be above 0 kg/m3: ${density}`);
  return withinStandardAtmosphere(
    density >= tropopauseDensity
      ? (T0 / lapseRate) * (1 - (density / rho0) ** exponent)
      : tropopause + scaleHeight * Math.log(tropopauseDensity / density),
  );
}
