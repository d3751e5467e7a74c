import { nearestNames } from './nearest-name.ts';

/** Spellings met in practice, in lower case, with the units of our closed lists that they may stand for. */
const spellings: ReadonlyMap<string, readonly string[]> = new Map(
  Object.entries({
    meter: ['m'],
    metre: ['m'],
    feet: ['ft'],
    foot: ['ft'],
    "'": ['ft'],
    inch: ['in'],
    knot: ['kt'],
    kn: ['kt'],
    mps: ['m/s'],
    kmh: ['km/h'],
    kph: ['km/h'],
    fpm: ['ft/min'],
    kilo: ['kg'],
    kilogram: ['kg'],
    tonne: ['t'],
    pound: ['lb'],
    c: ['degC', 'deltaC'],
    '°c': ['degC', 'deltaC'],
    celsius: ['degC', 'deltaC'],
    f: ['degF', 'deltaF'],
    '°f': ['degF', 'deltaF'],
    fahrenheit: ['degF', 'deltaF'],
    kelvin: ['K'],
    mb: ['hPa'],
    mbar: ['hPa'],
    millibar: ['hPa'],
    '%': ['percent'],
    '°': ['deg'],
    degree: ['deg'],
    sec: ['s'],
    second: ['s'],
    minute: ['min'],
    hour: ['h'],
  }),
);

/** The one unit of a closed list that a spelling stands for, if there is one. */
export function unitMeant(given: string, units: readonly string[]): string | undefined {
  const lower = given.trim().toLowerCase();
  const stands =
    spellings.get(lower) ?? spellings.get(lower.replace(/e?s$/, '')) ?? spellings.get(lower.replace(/s$/, ''));
  return stands?.find((unit) => units.includes(unit)) ?? nearestNames(given, units, 1)[0];
}
