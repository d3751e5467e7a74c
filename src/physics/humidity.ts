import { vapourMassRatio } from './constants.ts';

const freezing = 273.15;

/**
 * Saturation vapour pressure over water, Magnus form.
 *
 * e_w = 611.2 exp(17.62 t/(243.12 + t)) with t in degC
 *
 * @param temperature - [K], 228.15 to 333.15 (-45 to +60 degC) as published
 * @returns [Pa]
 * @remarks Of a dew point it is the vapour pressure of the air. Other published curves lie within 0.25 %.
 * @see references.Wmo8, Annex 4.B
 */
export function saturationVapourPressure(temperature: number): number {
  const celsius = temperature - freezing;
  if (!(celsius > -243.12)) throw new RangeError(`temperature must be above 30.03 K: ${temperature}`);
  return 611.2 * Math.exp((17.62 * celsius) / (243.12 + celsius));
}

/**
 * Dew point of a vapour pressure: the inverse of saturationVapourPressure.
 *
 * t = 243.12 x/(17.62 - x), x = ln(e/611.2)
 *
 * @param vapourPressure - [Pa], above 0
 * @returns [K]
 * @see references.Wmo8, Annex 4.B
 */
export function dewPoint(vapourPressure: number): number {
  if (!(vapourPressure > 0)) throw new RangeError(`vapourPressure must be above 0 Pa: ${vapourPressure}`);
  const x = Math.log(vapourPressure / 611.2);
  return freezing + (243.12 * x) / (17.62 - x);
}

/**
 * Relative humidity over water: vapour pressure over saturation vapour pressure.
 *
 * @param temperature - [K]
 * @param dewPointTemperature - [K]
 * @returns ratio, 1 at saturation
 * @see references.Wmo8, Annex 4.A
 */
export function relativeHumidity(temperature: number, dewPointTemperature: number): number {
  return saturationVapourPressure(dewPointTemperature) / saturationVapourPressure(temperature);
}

/**
 * Mass of water vapour for each mass of dry air.
 *
 * w = 0.622 e/(p - e)
 *
 * @param pressure - of the moist air [Pa], above the vapour pressure
 * @param vapourPressure - [Pa], 0 or more
 * @returns ratio
 * @see references.Wmo8, Annex 4.A
 */
export function mixingRatio(pressure: number, vapourPressure: number): number {
  if (!(vapourPressure >= 0 && vapourPressure < pressure)) {
    throw new RangeError(`vapourPressure must be at least 0 and below the pressure: ${vapourPressure}, ${pressure}`);
  }
  return (vapourMassRatio * vapourPressure) / (pressure - vapourPressure);
}
