import type { Fault } from '../planning/fault.ts';
import type { ReportRead, Weather, Wind } from '../planning/question.ts';
import { fromSi, type Quantity, type UnitOf } from '../units/units.ts';
import { reportAge } from '../weather/day-time.ts';
import { type Instant, readInstant } from '../weather/instant.ts';
import { notUnderstood, type Observation, textOf } from '../weather/observation.ts';
import { readObservation } from '../weather/read-observation.ts';
import { isReportRefused, type ReportFault } from '../weather/report-fault.ts';
import { type GivenBeside, reportedWeather, windOf } from '../weather/reported-weather.ts';
import type { ReportedWind } from '../weather/wind-group.ts';
import { atText } from './at-text.ts';
import type { Draft } from './present.ts';
import type { Q } from './quantity.ts';
import { toGivenWeather } from './to-weather.ts';
import type {
  PressureOnWire,
  StillWeatherChoice,
  StillWeatherOnWire,
  WeatherByReport,
  WeatherChoice,
  WeatherOnWire,
  WindOnWire,
} from './weather.ts';
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

const atReport = (fault: ReportFault) => atText(fault, '/weather/report');

/**
 * The air of a question without a wind, whole: as it is given, or as a report has it with what the question puts in its place.
 *
 * @returns the air as it can be asked without the report, or every fault of the report
 */
export function toKnownStillWeather(given: StillWeatherChoice): StillWeatherOnWire | Fault[] {
  if (!('report' in given)) return given;
  const known = toKnownWeather({ ...given, wind: 'calm' }, undefined);
  if (Array.isArray(known)) return known;
  const { wind: _, ...air } = known.weather;
  return air;
}

/** The air as a question understands it: beside its report, where it has one. */
export function stillAsUnderstood(given: StillWeatherChoice, air: StillWeatherOnWire): StillWeatherChoice {
  return 'report' in given ? { report: given.report, ...air } : air;
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
  const { station, time, temperature, dewPoint, qnh, wind, runwayStates, groups } = observation;
  const as = sameAs(observation, beside);
  const replaced: string[] = [];
  if (given.temperature !== undefined && temperature !== undefined && !as.temperature) {
    replaced.push(`temperature ${written(given.temperature)} in place of ${degrees(temperature.value)}`);
  }
  if (given.dewPoint !== undefined && dewPoint !== undefined && !as.dewPoint) {
    replaced.push(`dew point ${written(given.dewPoint)} in place of ${degrees(dewPoint.value)}`);
  }
  if (given.pressure !== undefined && qnh !== undefined && !as.pressure) {
    replaced.push(`another pressure in place of QNH ${written(inUnit('pressure', qnh.value, 'hPa'))}`);
  }
  if (given.wind !== undefined && wind !== undefined && !as.wind) {
    replaced.push(`another wind in place of ${textOf(groups, 'wind')}`);
  }
  const read: Draft<ReportRead> = {
    station,
    replaced,
    notUnderstood: notUnderstood(groups).map(({ token }) => token),
    rounding: as.wind && wind?.kind === 'from' ? windRounding(wind) : {},
  };
  if (asOf !== undefined) read.age = reportAge(time, asOf);
  const states = textOf(groups, 'runway-state');
  if (states !== undefined && runwayStates.length > 0) read.runwayState = states;
  return read;
}

/** Which members given beside a report say the same as it, or are not given. */
function sameAs(observation: Observation, { temperature, dewPoint, pressure, wind }: GivenBeside) {
  const reported = windOf(observation.wind);
  const { qnh } = observation;
  return {
    temperature: temperature === undefined || same(temperature, observation.temperature?.value),
    dewPoint: dewPoint === undefined || same(dewPoint, observation.dewPoint?.value),
    pressure: pressure === undefined || (pressure.kind === 'qnh' && same(pressure.value, qnh?.value)),
    wind: wind === undefined || (typeof reported !== 'string' && sameWind(wind, reported)),
  };
}

function windRounding({ from, speed }: Extract<ReportedWind, { kind: 'from' }>): ReportRead['rounding'] {
  return { direction: (from.high - from.low) / 2, speed: (speed.high - speed.low) / 2 };
}

function degrees(kelvin: number): string {
  return written(inUnit('temperature', kelvin, 'degC'));
}

/** Whether two figures are one but for the last bits that a change of unit leaves. */
function same(one: number, other: number | undefined): boolean {
  return other !== undefined && Math.abs(one - other) <= 1e-9 * Math.abs(other) + 1e-9;
}

function sameWind(one: Wind, other: Wind): boolean {
  return JSON.stringify(onScale(one)) === JSON.stringify(onScale(other));
}

/** A wind without the last bits of its figures. */
function onScale(wind: Wind): unknown {
  return JSON.parse(JSON.stringify(wind), (_, value) =>
    typeof value === 'number' ? Number(value.toPrecision(9)) : value,
  );
}
