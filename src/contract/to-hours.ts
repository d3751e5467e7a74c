import type { AirReport } from '../performance/air.ts';
import type { Fault } from '../planning/fault.ts';
import { forecastHours, type ListedFigure } from '../weather/forecast-hours.ts';
import { givenHours, type Hour } from '../weather/hours.ts';
import { type Instant, readInstant } from '../weather/instant.ts';
import { readForecast } from '../weather/read-forecast.ts';
import { isReportRefused } from '../weather/report-fault.ts';
import { atText } from './at-text.ts';
import { type HoursOnWire, mostHours } from './hours.ts';
import { si } from './quantity.ts';
import { checkAir } from './question-checks/check-air.ts';
import { checkWind } from './question-checks/check-wind.ts';
import type { RunwayOnWire } from './runway.ts';
import { toWeather } from './to-weather.ts';
import type { WeatherOnWire } from './weather.ts';

/**
 * The hours of a question in SI, each with every wind that can hold in it.
 *
 * @param runway - against which the air and the wind of listed hours are checked
 * @param weather - of the question, whose pressure stands for hours without one
 * @returns the hours, or every fault in them
 */
export function toHours(given: HoursOnWire, weather: WeatherOnWire, runway: RunwayOnWire): readonly Hour[] | Fault[] {
  if (Array.isArray(given)) {
    const faults = given.flatMap((listed, index) => listedFaults(listed, runway, index));
    if (faults.length > 0) return faults;
    return givenHours(given.map(({ at, ...listed }) => ({ at: momentOf(at), ...toWeather(listed) })));
  }
  const { forecast: text, from, to, temperatures = [], pressures = [] } = given;
  const [first, last] = [momentOf(from), momentOf(to)];
  const faults = spanFaults(first, last, to);
  const forecast = readForecast(text);
  if (isReportRefused(forecast))
    return [...faults, ...forecast.refused.map((fault) => atText(fault, '/hours/forecast'))];
  if (faults.length > 0) return faults;
  const hours = forecastHours(forecast, {
    asOf: first,
    from: first,
    to: last,
    temperatures: temperatures.map(({ at, temperature }) => ({
      at: momentOf(at),
      value: si('temperature', temperature),
    })),
    pressures: pressures.map(
      ({ at, pressure }): ListedFigure<AirReport['pressure']> => ({
        at: momentOf(at),
        value: toWeather({ ...weather, pressure }).pressure,
      }),
    ),
    pressure: toWeather(weather).pressure,
  });
  return isReportRefused(hours) ? hours.refused.map((fault) => atText(fault, '/hours/forecast')) : hours;
}

function listedFaults(listed: WeatherOnWire, runway: RunwayOnWire, index: number): Fault[] {
  return [...checkAir(listed, runway.elevation), ...checkWind(listed.wind, runway)].map((fault) => ({
    ...fault,
    pointer: fault.pointer.replace(/^\/weather/, `/hours/${index}`),
  }));
}

/** Whether hours came to faults. */
export function isFaults(found: readonly Hour[] | Fault[]): found is Fault[] {
  return found.length > 0 && 'pointer' in (found[0] as object);
}

function spanFaults(from: Instant, to: Instant, received: string): Fault[] {
  const hours = Math.floor((to - from) / 3600) + 1;
  if (hours >= 1 && hours <= mostHours) return [];
  return [
    {
      pointer: '/hours/to',
      code: 'contradiction',
      message: hours < 1 ? 'The last hour begins before the first.' : `That is ${hours} hours.`,
      received,
      allowed: `1 to ${mostHours} hours from /hours/from on`,
    },
  ];
}

/** A moment that the schema has let pass. */
function momentOf(text: string): Instant {
  const moment = readInstant(text);
  if (moment === undefined) throw new RangeError(`${text} is no moment`);
  return moment;
}
