import type { Fault } from '../planning/fault.ts';
import type { ReportRead, Weather, Wind } from '../planning/question.ts';
import { fromSi, type Quantity, type UnitOf } from '../units/units.ts';
import { reportAge } from '../weather/day-time.ts';
import { type Instant, readInstant } from '../weather/instant.ts';
import { notUnderstood, type Observation, textOf } from '../weather/observation.ts';
import { readObservation } from '../weather/read-observation.ts';
import { isReportRefused, type ReportFault } from '../weather/report-fault.ts';
import { type GivenBeside, reportedWeather } from '../weather/reported-weather.ts';
import type { Draft } from './present.ts';
import type { Q } from './quantity.ts';
import { toGivenWeather } from './to-weather.ts';
import type { PressureOnWire, WeatherByReport, WeatherChoice, WeatherOnWire, WindOnWire } from './weather.ts';
import { written } from './written.ts';

/** The weather of a question, whole, and what was read of a report. */
export interface KnownWeather {
  readonly weather: WeatherOnWire;
  readonly report?: ReportRead;
}

/**
 * The weather of a question, whole: as it is given, or as a report has it with what the question puts in its place.
 *
 * @param asOf - the time of the question, for the age of the report
 * @returns the weather as it can be asked without the report, or every fault of the report with its place in it
 */
export function toKnownWeather(given: WeatherChoice, asOf: string | undefined): KnownWeather | Fault[] {
  if (!('report' in given)) return { weather: given };
  const observation = readObservation(given.report);
  if (isReportRefused(observation)) return observation.refused.map(atReport);
  const beside = toGivenWeather(given);
  const read = reportedWeather(observation, beside);
  if (isReportRefused(read)) return read.refused.map(atReport);
  return {
    weather: {
      temperature: given.temperature ?? inUnit('temperature', read.temperature, 'degC'),
      ...dewPointOf(given, read),
      pressure: given.pressure ?? toPressureOnWire(read.pressure),
      wind: given.wind ?? toWindOnWire(read.wind),
    },
    report: toReportRead(observation, given, beside, asOf === undefined ? undefined : readInstant(asOf)),
  };
}

/** A fault of a report where the question has the report; its message tells the place in it. */
export function atReport({ at: _, token: __, ...fault }: ReportFault): Fault {
  return { ...fault, pointer: '/weather/report' };
}

function dewPointOf({ dewPoint }: WeatherByReport, read: Weather): Pick<WeatherOnWire, 'dewPoint'> {
  if (dewPoint !== undefined) return { dewPoint };
  return read.dewPoint === undefined ? {} : { dewPoint: inUnit('temperature', read.dewPoint, 'degC') };
}

function toPressureOnWire({ value }: Weather['pressure']): PressureOnWire {
  return { qnh: inUnit('pressure', value, 'hPa') };
}

/** A wind as a question has it, in the units of reports. */
export function toWindOnWire(wind: Wind): WindOnWire {
  if (wind.kind === 'calm') return 'calm';
  if (wind.kind === 'components') throw new RangeError('wind of a report has no components');
  const gust = wind.gust === undefined ? {} : { gust: inUnit('speed', wind.gust, 'kt') };
  const speed = inUnit('speed', wind.speed, 'kt');
  if (wind.kind === 'variable') return { from: 'variable', speed, ...gust };
  const { variable } = wind;
  return {
    from: inUnit('angle', wind.from, 'deg'),
    fromReference: wind.fromReference,
    speed,
    ...gust,
    ...(variable === undefined
      ? {}
      : { variable: { from: inUnit('angle', variable.from, 'deg'), to: inUnit('angle', variable.to, 'deg') } }),
  };
}

/** A number of SI in a unit, without the last bits that the change of unit leaves. */
function inUnit<K extends Quantity, U extends UnitOf<K>>(kind: K, si: number, unit: U): Q<U> {
  return { value: Number(fromSi(kind, si, unit).toPrecision(12)), unit };
}

function toReportRead(
  observation: Observation,
  given: WeatherByReport,
  beside: GivenBeside,
  asOf: Instant | undefined,
): ReportRead {
  const { temperature, dewPoint, qnh, wind, runwayStates, groups } = observation;
  const read: Draft<ReportRead> = {
    station: observation.station,
    replaced: replacedBy(observation, given, beside),
    notUnderstood: notUnderstood(groups).map(({ token }) => token),
    rounding: {
      ...(beside.temperature !== undefined || temperature === undefined
        ? {}
        : { temperature: (temperature.high - temperature.low) / 2 }),
      ...(beside.pressure !== undefined || qnh === undefined ? {} : { pressure: qnh.high - qnh.low }),
      ...(beside.wind !== undefined || wind?.kind !== 'from'
        ? {}
        : { direction: (wind.from.high - wind.from.low) / 2, speed: (wind.speed.high - wind.speed.low) / 2 }),
    },
  };
  if (asOf !== undefined) read.age = reportAge(observation.time, asOf);
  const states = textOf(groups, 'runway-state');
  if (states !== undefined && runwayStates.length > 0) read.runwayState = states;
  return read;

  function replacedBy({ wind: reported }: Observation, by: WeatherByReport, si: GivenBeside): string[] {
    const alone = reportedWeather(observation);
    const has = isReportRefused(alone) ? undefined : alone;
    const texts: string[] = [];
    if (by.temperature !== undefined && temperature !== undefined && !same(si.temperature, temperature.value)) {
      texts.push(`temperature ${written(by.temperature)} in place of ${degrees(temperature.value)}`);
    }
    if (by.dewPoint !== undefined && dewPoint !== undefined && !same(si.dewPoint, dewPoint.value)) {
      texts.push(`dew point ${written(by.dewPoint)} in place of ${degrees(dewPoint.value)}`);
    }
    if (by.pressure !== undefined && qnh !== undefined && !samePressure(si.pressure, qnh.value)) {
      texts.push(`another pressure in place of QNH ${written(inUnit('pressure', qnh.value, 'hPa'))}`);
    }
    if (by.wind !== undefined && reported !== undefined && !sameWind(si.wind, has?.wind)) {
      texts.push(`another wind in place of ${textOf(groups, 'wind')}`);
    }
    return texts;
  }
}

function degrees(kelvin: number): string {
  return written(inUnit('temperature', kelvin, 'degC'));
}

function same(one: number | undefined, other: number): boolean {
  return one !== undefined && Math.abs(one - other) <= 1e-6;
}

function samePressure(one: Weather['pressure'] | undefined, qnh: number): boolean {
  return one?.kind === 'qnh' && Math.abs(one.value - qnh) <= 1e-3;
}

function sameWind(one: Wind | undefined, other: Wind | undefined): boolean {
  return one !== undefined && other !== undefined && JSON.stringify(onScale(one)) === JSON.stringify(onScale(other));
}

/** A wind without the last bits of its figures. */
function onScale(wind: Wind): unknown {
  return JSON.parse(JSON.stringify(wind), (_, value) =>
    typeof value === 'number' ? Number(value.toPrecision(9)) : value,
  );
}
