import { interpolateHeld } from '../numerics/interpolate.ts';

/** Pressure altitudes [m] and vapour pressures [Pa] of the certification day, 80 % humidity at standard temperature. */
const feet = [0, 1000, 2000, 3000, 4000, 5000, 6000, 7000, 8000, 9000, 10_000, 15_000, 20_000, 25_000];
const inchesOfMercury = [
  0.403, 0.354, 0.311, 0.272, 0.238, 0.207, 0.1805, 0.1566, 0.1356, 0.1172, 0.101, 0.0463, 0.01978, 0.00778,
];
const altitudes = feet.map((altitude) => altitude * 0.3048);
const vapourPressures = inchesOfMercury.map((pressure) => pressure * 3386.389);

/**
 * Vapour pressure of the air for which piston power is certified.
 *
 * @param pressureAltitude - [m]; below 0 and above 25 000 ft the end row is held
 * @returns [Pa]
 * @see references.Cfr25s101, table of (b)(2)
 */
export function certificationVapourPressure(pressureAltitude: number): number {
  return interpolateHeld(altitudes, vapourPressures, pressureAltitude);
}

/**
 * What moisture leaves of a piston engine's power, over the power of the certification day.
 *
 * min(1, 1 - k (1 - (p - e)/(p - e_ref))): power follows the pressure of the dry air, mixture enrichment makes k exceed 1,
 * and air drier than the certification day gets no credit.
 *
 * @param pressure - [Pa]
 * @param vapourPressure - e [Pa], below the pressure
 * @param pressureAltitude - [m], chooses e_ref
 * @param humidityFactor - k, 0 to 2; 0 switches the term off
 * @returns ratio, 0 to 1
 * @see references.Cfr25s101, (b)(2)
 */
export function humidityPowerTerm(
  pressure: number,
  vapourPressure: number,
  pressureAltitude: number,
  humidityFactor: number,
): number {
  if (!(vapourPressure >= 0 && vapourPressure < pressure)) {
    throw new RangeError(`vapourPressure must be at least 0 and below the pressure: ${vapourPressure}, ${pressure}`);
  }
  if (!(humidityFactor >= 0)) throw new RangeError(`humidityFactor must be 0 or more: ${humidityFactor}`);
  const reference = certificationVapourPressure(pressureAltitude);
  const loss = 1 - (pressure - vapourPressure) / (pressure - reference);
  return Math.max(0, Math.min(1, 1 - humidityFactor * loss));
}
