import { toSi } from '../units/units.ts';

/** A figure as a report rounds it: what it says, and the true values that are written so, low <= true < high, all in SI. */
export interface Coded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** The units a report may give its wind in, by the letters of the group. */
export const windUnits = { KT: 'kt', MPS: 'm/s', KMH: 'km/h' } as const;
export type WindUnit = keyof typeof windUnits;

/** What is below these is written as calm: 1 kt, 0.5 m/s, 2 km/h. @see references.Wmo306, reg. 15.5 */
const calmBelow = { KT: 1, MPS: 0.5, KMH: 2 } as const;

/**
 * A temperature in whole degrees Celsius [K]: a half goes up to the warmer degree, so -0.5 is M00. M stands for below zero, so
 * that M00 is never 0 or above.
 *
 * @param degrees - without the sign [degC]
 * @param minus - whether M stands before it
 * @see references.Wmo306, reg. 15.11
 */
export function codedTemperature(degrees: number, minus: boolean): Coded {
  const value = minus ? 0 - degrees : degrees;
  return temperature(value, value - 0.5, minus && degrees === 0 ? 0 : value + 0.5);
}

/** A temperature in tenths of a degree Celsius [K], a half going up. */
export function codedTenths(tenths: number): Coded {
  return temperature(tenths / 10, (tenths - 0.5) / 10, (tenths + 0.5) / 10);
}

/** A direction in tens of degrees [rad]: 1 to 4 go down, 5 to 9 up. @see references.Wmo306, reg. 15.5 */
export function codedDirection(degrees: number): Coded {
  return scaled('angle', degrees, degrees - 5, degrees + 5, 'deg');
}

/** A wind speed in whole units [m/s]. */
export function codedSpeed(speed: number, unit: WindUnit): Coded {
  return scaled('speed', speed, speed - 0.5, speed + 0.5, windUnits[unit]);
}

/** The speed of a calm [m/s]. */
export function codedCalm(unit: WindUnit): Coded {
  return scaled('speed', 0, 0, calmBelow[unit], windUnits[unit]);
}

/** A QNH in whole hectopascals [Pa], rounded down: the true one is 0 to just under 1 hPa higher. @see references.Wmo306, reg. 15.12 */
export function codedQnh(hectopascals: number): Coded {
  return scaled('pressure', hectopascals, hectopascals, hectopascals + 1, 'hPa');
}

/** An altimeter setting in hundredths of an inch of mercury [Pa], cut off, not rounded. @see references.Afman15s111, 3.10.2 */
export function codedAltimeter(hundredths: number): Coded {
  return scaled('pressure', hundredths / 100, hundredths / 100, (hundredths + 1) / 100, 'inHg');
}

/** Whether one true value can have been written both ways. */
export function agree(one: Coded, other: Coded): boolean {
  return one.low <= other.high && other.low <= one.high;
}

function temperature(value: number, low: number, high: number): Coded {
  return {
    value: toSi('temperature', value, 'degC'),
    low: toSi('temperature', low, 'degC'),
    high: toSi('temperature', high, 'degC'),
  };
}

function scaled<Q extends 'angle' | 'speed' | 'pressure'>(
  quantity: Q,
  value: number,
  low: number,
  high: number,
  unit: Parameters<typeof toSi<Q>>[2],
): Coded {
  return { value: toSi(quantity, value, unit), low: toSi(quantity, low, unit), high: toSi(quantity, high, unit) };
}
