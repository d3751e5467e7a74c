import { lapseRate, p0, pressureExponent, T0 } from './constants.ts';

const inverse = 1 / pressureExponent;
const height = T0 / lapseRate;

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

function requirePressure(name: string, pressure: number): void {
  if (!(pressure > 0)) throw new RangeError(`${name} must be above 0 Pa: ${pressure}`);
}
