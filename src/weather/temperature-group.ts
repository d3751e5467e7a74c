import { type Coded, codedTemperature, codedTenths } from './coded.ts';
import { groupFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

/** Temperature and dew point [K]; one that is not reported is absent. */
export interface ReportedTemperatures {
  readonly temperature?: Coded;
  readonly dewPoint?: Coded;
}

const form = /^(M?\d{2}|\/\/|XX)\/(M?\d{2}|\/\/|XX)?$/;
const meant = /^[M+-]?[\dO]{1,3}(?:[.,]\d)?\/[M+-]?[\dO.,/]{0,4}$/;
const tenthsForm = /^T([01])(\d{3})(?:([01])(\d{3}))?$/;
/** Temperatures that are read [degC]; beyond them is a slip. @see references.Judgement */
const [coldest, warmest] = [-60, 60];

/**
 * Temperature and dew point of a group such as 18/M02; undefined where the group is not one.
 *
 * @see references.Wmo306, reg. 15.11
 */
export function readTemperatures(token: Token): ReportedTemperatures | ReportFault | undefined {
  const found = form.exec(token.text);
  if (found === null) {
    return meant.test(token.text)
      ? groupFault(
          token,
          'unreadable',
          'cannot be read as temperature and dew point',
          'a group such as 18/09 or M02/M05',
        )
      : undefined;
  }
  return checked(token, whole(found[1]), whole(found[2]));
}

/** The tenths of the remarks, such as T01230045: 1 stands for below zero. @see references.FaaJo7900 */
export function readTenths(token: Token): ReportedTemperatures | ReportFault | undefined {
  const found = tenthsForm.exec(token.text);
  if (found === null) return undefined;
  return checked(token, tenth(found[1], found[2]), tenth(found[3], found[4]));
}

/** The fault of a temperature [degC] beyond those that are read; undefined where there is none. */
export function temperatureFault(token: Token, degrees: number): ReportFault | undefined {
  if (degrees >= coldest && degrees <= warmest) return undefined;
  return groupFault(token, 'out-of-range', `has ${degrees} degC`, `${coldest} to ${warmest} degC`);
}

interface Reading {
  readonly degrees: number;
  readonly coded: Coded;
}

function checked(
  token: Token,
  temperature: Reading | undefined,
  dewPoint: Reading | undefined,
): ReportedTemperatures | ReportFault {
  for (const reading of [temperature, dewPoint]) {
    const fault = reading === undefined ? undefined : temperatureFault(token, reading.degrees);
    if (fault !== undefined) return fault;
  }
  if (temperature !== undefined && dewPoint !== undefined && dewPoint.degrees > temperature.degrees) {
    return groupFault(
      token,
      'implausible',
      'has a dew point above the temperature',
      'a dew point up to the temperature',
    );
  }
  return {
    ...(temperature === undefined ? {} : { temperature: temperature.coded }),
    ...(dewPoint === undefined ? {} : { dewPoint: dewPoint.coded }),
  };
}

function whole(figures: string | undefined): Reading | undefined {
  if (figures === undefined || figures === '//' || figures === 'XX') return undefined;
  const minus = figures.startsWith('M');
  const degrees = Number(minus ? figures.slice(1) : figures);
  return { degrees: minus ? 0 - degrees : degrees, coded: codedTemperature(degrees, minus) };
}

function tenth(sign: string | undefined, figures: string | undefined): Reading | undefined {
  if (figures === undefined) return undefined;
  const tenths = sign === '1' ? 0 - Number(figures) : Number(figures);
  return { degrees: tenths / 10, coded: codedTenths(tenths) };
}
