import { scaleHeight, standardPressure, withinStandardAtmosphere } from './atmosphere.ts';
import { lapseRate, p0, pressureExponent, T0, tropopause } from './constants.ts';

const inverse = 1 / pressureExponent;
const height = T0 / lapseRate;
const tropopausePressure = standardPressure(tropopause);

/**
 * Pressure altitude of a place from its elevation and the altimeter setting.
 *
 * PA = h + (T0/L) (1 - (QNH/p0)^(R L/g0)): the correction does not depend on the elevation.
 *
 * @param elevation - above mean sea level [m], taken as geopotential (0.03 % apart at 2000 m)
 * @param qnh - [Pa], above 0
 * @returns [m]
 * @remarks Valid in the troposphere, where altimeters are set to a QNH.
 * @see references.Iso2533, formula (12): the altimeter's law
 */
export function pressureAltitude(elevation: number, qnh: number): number {
  requirePressure('qnh', qnh);
  return elevation + height * (1 - (qnh / p0) ** inverse);
}

/**
 * Pressure at a place from its elevation and the altimeter setting.
 *
 * p = p0 ((QNH/p0)^n - L h/T0)^(1/n), n = R L/g0
 *
 * @param elevation - [m], below the height at which the setting's atmosphere ends
 * @param qnh - [Pa], above 0
 * @returns [Pa]
 * @see references.Iso2533, formula (12)
 */
export function stationPressure(elevation: number, qnh: number): number {
  requirePressure('qnh', qnh);
  const base = (qnh / p0) ** inverse - elevation / height;
  if (!(base > 0)) throw new RangeError(`elevation must lie in the troposphere: ${elevation}`);
  return p0 * base ** pressureExponent;
}

/**
 * Altimeter setting that makes an altimeter show the elevation: the inverse of stationPressure.
 *
 * QNH = p0 ((p/p0)^n + L h/T0)^(1/n), n = R L/g0
 *
 * @param elevation - [m]
 * @param pressure - at the place [Pa], above 0
 * @returns [Pa]
 * @see references.Iso2533, formula (12)
 */
export function qnh(elevation: number, pressure: number): number {
  requirePressure('pressure', pressure);
  const base = (pressure / p0) ** inverse + elevation / height;
  if (!(base > 0)) throw new RangeError(`elevation is too low for this pressure: ${elevation}`);
  return p0 * base ** pressureExponent;
}

/**
 * Pressure altitude of a pressure: what an altimeter set to 1013.25 hPa shows. The way back is standardPressure.
 *
 * PA = (T0/L) (1 - (p/p0)^(R L/g0)) up to 11 000 m; 11 000 + (R T11/g0) ln(p11/p) above.
 *
 * @param pressure - [Pa], above 0
 * @returns [m], or 'outside-standard-atmosphere' below -5000 or above 20 000 m
 * @see references.Iso2533, formulas (12) and (13) solved for H
 */
export function pressureAltitudeOfPressure(pressure: number): number | 'outside-standard-atmosphere' {
  requirePressure('pressure', pressure);
  return withinStandardAtmosphere(
    pressure >= tropopausePressure
      ? height * (1 - (pressure / p0) ** inverse)
      : tropopause + scaleHeight * Math.log(tropopausePressure / pressure),
  );
}

function requirePressure(name: string, pressure: number): void {
  if (!(pressure > 0)) throw new RangeError(`${name} must be above 0 Pa: ${pressure}`);
}
