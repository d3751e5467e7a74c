import type { Forecast } from '../../src/weather/forecast.ts';
import type { Observation } from '../../src/weather/observation.ts';
import { readForecast } from '../../src/weather/read-forecast.ts';
import { readObservation } from '../../src/weather/read-observation.ts';
import { isReportRefused, type ReportRefused } from '../../src/weather/report-fault.ts';

/** An observation that was read. */
export function observed(report: string): Observation {
  return unrefused(readObservation(report));
}

/** A forecast that was read. */
export function forecastOf(report: string): Forecast {
  return unrefused(readForecast(report));
}

/** What was not refused, or the first message. */
export function unrefused<T extends object>(read: T | ReportRefused): T {
  if (isReportRefused(read)) throw new Error(read.refused.map(({ message }) => message).join(' '));
  return read;
}
