import type { AirReport } from '../performance/air.ts';
import type { Forecast } from './forecast.ts';
import { forecastCalendar, type TimedWind } from './forecast-calendar.ts';
import { forecastTemperature } from './forecast-temperature.ts';
import type { Hour, HourTemperature, HourWind } from './hours.ts';
import { day, type Instant } from './instant.ts';
import type { ReportRefused } from './report-fault.ts';
import { windOf } from './reported-weather.ts';

/** A figure of one hour of a list given beside a forecast. SI. */
export interface ListedFigure<T> {
  readonly at: Instant;
  readonly value: T;
}

/** Between which moments hours are asked, and what is given beside the forecast. */
export interface HoursAsked {
  /** a moment that the days of the forecast are nearest to */
  readonly asOf: Instant;
  /** the first hour begins here */
  readonly from: Instant;
  /** the last hour begins here or before */
  readonly to: Instant;
  /** of the hours named; in place of the forecast's extremes */
  readonly temperatures?: readonly ListedFigure<number>[];
  readonly pressures?: readonly ListedFigure<AirReport['pressure']>[];
  /** of every hour without a listed one, such as a METAR's QNH */
  readonly pressure?: AirReport['pressure'];
}

const hour = 3600;

/**
 * The hours of a forecast, each with every wind that can hold in it.
 *
 * What prevails is the first part until a change; FM replaces it at its moment, BECMG at an unknown moment of its time, so that
 * within that time both the old and the new can hold. TEMPO and PROB stand beside what prevails. An hour not wholly within the
 * forecast, or with a wind that cannot be told, has its wind missing. A change that lies outside the forecast's time is refused, since
 * nobody can say what it was to change.
 */
export function forecastHours(forecast: Forecast, asked: HoursAsked): readonly Hour[] | ReportRefused {
  if (!(asked.to >= asked.from)) throw new RangeError(`to must not be before from: ${asked.to}`);
  if (asked.to - asked.from > 31 * day) throw new RangeError(`to must be within 31 days of from: ${asked.to}`);
  const calendar = forecastCalendar(forecast, asked.asOf);
  if ('refused' in calendar) return calendar;
  const { winds, extremes, from, until } = calendar;
  const hours: Hour[] = [];
  for (let at = asked.from; at <= asked.to; at += hour) {
    const within = at >= from && at + hour <= until;
    const held = within ? winds.filter((one) => one.from < at + hour && one.until > at) : [];
    const usable = held.flatMap(toHourWind);
    const windKnown = usable.length === held.length && held.some(({ prevails }) => prevails);
    const temperature = listed(asked.temperatures, at) ?? forecastTemperature(extremes, at);
    const pressure = asked.pressures?.find((one) => one.at === at)?.value ?? asked.pressure;
    hours.push({
      at,
      winds: windKnown ? usable : [],
      ...(temperature === undefined ? {} : { temperature }),
      ...(pressure === undefined ? {} : { pressure }),
      missing: [
        ...(windKnown ? [] : (['wind'] as const)),
        ...(temperature === undefined ? (['temperature'] as const) : []),
        ...(pressure === undefined ? (['pressure'] as const) : []),
      ],
    });
  }
  return hours;
}

function toHourWind({ reported, because, heading, percent }: TimedWind): readonly HourWind[] {
  const wind = windOf(reported);
  if (typeof wind === 'string' || reported === undefined) return [];
  return [
    {
      wind,
      because,
      ...(heading === undefined ? {} : { heading }),
      ...(percent === undefined ? {} : { percent }),
      reported,
    },
  ];
}

function listed(list: readonly ListedFigure<number>[] | undefined, at: Instant): HourTemperature | undefined {
  const found = list?.find((one) => one.at === at);
  return found === undefined ? undefined : { value: found.value, because: 'given' };
}
