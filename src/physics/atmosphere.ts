import { g0, gamma, lapseRate, p0, pressureExponent, R, rho0, T0, tropopause } from './constants.ts';

/** Geopotential altitudes [m] between which the standard atmosphere is stated here. @see references.Iso2533Add2 */
export const lowestAltitude = -5_000;
export const highestAltitude = 20_000;

const stratosphereTemperature = T0 - lapseRate * tropopause;
const tropopausePressureRatio = (stratosphereTemperature / T0) ** pressureExponent;
const scaleHeight = (R * stratosphereTemperature) / g0;

/**
 * Temperature of the standard atmosphere.
 *
 * T = T0 - L H up to 11 000 m, 216.65 K from there to 20 000 m.
 *
 * @param altitude - geopotential [m], -5000 to 20 000
 * @returns [K]
 * @see references.Iso2533, formula (11) and table 4; references.Iso2533Add2 below -2000 m
 */
export function standardTemperature(altitude: number): number {
  requireAltitude(altitude);
  return altitude <= tropopause ? T0 - lapseRate * altitude : stratosphereTemperature;
}

/**
 * Pressure of the standard atmosphere.
 *
 * p = p0 (T/T0)^(g0/(R L)) up to 11 000 m; p = p11 exp(-g0 (H - 11 000)/(R T11)) above.
 *
 * @param altitude - geopotential [m], -5000 to 20 000
 * @returns [Pa]
 * @see references.Iso2533, formulas (12) and (13)
 */
export function standardPressure(altitude: number): number {
  requireAltitude(altitude);
  return altitude <= tropopause
    ? p0 * (1 - (lapseRate * altitude) / T0) ** pressureExponent
    : p0 * tropopausePressureRatio * Math.exp((tropopause - altitude) / scaleHeight);
}

/**
 * Density of the standard atmosphere, rho0 delta/theta: 1.225 exactly at sea level.
 *
 * p/(R T) with the standard's printed R is 1.5e-8 larger.
 *
 * @param altitude - geopotential [m], -5000 to 20 000
 * @returns [kg/m3]
 * @see references.Iso2533, formula (14)
 */
export function standardDensity(altitude: number): number {
  return (rho0 * (standardPressure(altitude) / p0) * T0) / standardTemperature(altitude);
}

/**
 * Speed of sound in dry air.
 *
 * a = sqrt(gamma R T)
 *
 * @param temperature - [K], above 0
 * @returns [m/s]
 * @see references.Iso2533, formula (21)
 */
export function speedOfSound(temperature: number): number {
  if (!(temperature > 0)) throw new RangeError(`temperature must be above 0 K: ${temperature}`);
  return Math.sqrt(gamma * R * temperature);
}

/**
 * Altitude of the standard atmosphere with this pressure: the pressure altitude.
 *
 * @param pressure - [Pa], above 0
 * @returns geopotential [m], or 'outside-standard-atmosphere' below -5000 or above 20 000 m
 * @see references.Iso2533, formulas (12) and (13) solved for H
 */
export function altitudeOfPressure(pressure: number): number | 'outside-standard-atmosphere' {
  if (!(pressure > 0)) throw new RangeError(`pressure must be above 0 Pa: ${pressure}`);
  const ratio = pressure / p0;
  const altitude =
    ratio >= tropopausePressureRatio
      ? (T0 / lapseRate) * (1 - ratio ** (1 / pressureExponent))
      : tropopause + scaleHeight * Math.log(tropopausePressureRatio / ratio);
  return inside(altitude);
}

/**
 * Altitude of the standard atmosphere with this density: the density altitude.
 *
 * H = (T0/L) (1 - sigma^(1/(g0/(R L) - 1))) up to 11 000 m.
 *
 * @param density - [kg/m3], above 0
 * @returns geopotential [m], or 'outside-standard-atmosphere' below -5000 or above 20 000 m
 * @see references.Iso2533, formula (14) solved for H
 */
export function altitudeOfDensity(density: number): number | 'outside-standard-atmosphere' {
  if (!(density > 0)) throw new RangeError(`density must be above 0 kg/m3: ${density}`);
  const ratio = density / rho0;
  const atTropopause = (tropopausePressureRatio * T0) / stratosphereTemperature;
  const altitude =
    ratio >= atTropopause
      ? (T0 / lapseRate) * (1 - ratio ** (1 / (pressureExponent - 1)))
      : tropopause + scaleHeight * Math.log(atTropopause / ratio);
  return inside(altitude);
}

/** The ends count as inside to a micrometre, so that a round trip from an end comes back. */
function inside(altitude: number): number | 'outside-standard-atmosphere' {
  const held = Math.min(highestAltitude, Math.max(lowestAltitude, altitude));
  return Math.abs(held - altitude) <= 1e-6 ? held : 'outside-standard-atmosphere';
}

function requireAltitude(altitude: number): void {
  if (!(altitude >= lowestAltitude && altitude <= highestAltitude)) {
    throw new RangeError(`altitude must lie between ${lowestAltitude} and ${highestAltitude} m: ${altitude}`);
  }
}
