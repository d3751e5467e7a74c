import {
  g0,
  gamma,
  lapseRate,
  p0,
  pressureExponent,
  R,
  rho0,
  T0,
  tropopause,
  tropopauseTemperature,
} from './constants.ts';

/** Geopotential altitudes [m] between which the standard atmosphere is stated here. @see references.Iso2533Add2 */
export const lowestAltitude = -5_000;
export const highestAltitude = 20_000;

const tropopausePressureRatio = (tropopauseTemperature / T0) ** pressureExponent;
/** R T11/g0 [m]: the height over which pressure falls by e in the lower stratosphere. @see references.Iso2533 */
export const scaleHeight = (R * tropopauseTemperature) / g0;

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
  return altitude <= tropopause ? T0 - lapseRate * altitude : tropopauseTemperature;
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
 * An altitude if the standard atmosphere reaches it; the ends count as inside to a micrometre, so that round trips return.
 *
 * @param altitude - geopotential [m]
 * @returns the altitude, or 'outside-standard-atmosphere' below -5000 or above 20 000 m
 * @see references.Iso2533Add2
 */
export function withinStandardAtmosphere(altitude: number): number | 'outside-standard-atmosphere' {
  if (altitude >= lowestAltitude && altitude <= highestAltitude) return altitude;
  const held = altitude < lowestAltitude ? lowestAltitude : highestAltitude;
  return Math.abs(held - altitude) <= 1e-6 ? held : 'outside-standard-atmosphere';
}

function requireAltitude(altitude: number): void {
  if (!(altitude >= lowestAltitude && altitude <= highestAltitude)) {
    throw new RangeError(`altitude must lie between ${lowestAltitude} and ${highestAltitude} m: ${altitude}`);
  }
}
