import { instantFrom, instantNear } from './day-time.ts';
import type { Forecast, ForecastChange } from './forecast.ts';
import type { MomentOfExtreme } from './forecast-temperature.ts';
import type { HourWind } from './hours.ts';
import { day, type Instant } from './instant.ts';
import type { ReadGroup } from './observation.ts';
import { groupFault, type ReportFault, type ReportRefused } from './report-fault.ts';
import type { ReportedWind } from './wind-group.ts';

/** A forecast covers up to 30 hours; two days are beyond any. @see references.Wmo306, FM 51 TAF */
const longest = 2 * day;

/** A wind with the time in which it can hold: from <= moment < until. */
export interface TimedWind extends Omit<HourWind, 'wind' | 'reported'> {
  readonly reported: ReportedWind | undefined;
  readonly prevails: boolean;
  readonly from: Instant;
  until: Instant;
}

/** A forecast at its moments. */
export interface ForecastCalendar {
  readonly winds: readonly TimedWind[];
  readonly extremes: readonly MomentOfExtreme[];
  readonly from: Instant;
  readonly until: Instant;
}

/** The forecast's parts at their moments: its issue is the one nearest to asOf, all else follows from there. */
export function forecastCalendar(forecast: Forecast, asOf: Instant): ForecastCalendar | ReportRefused {
  const { issued, validity, cancelled } = forecast;
  if (validity === undefined || cancelled) return { winds: [], extremes: [], from: asOf, until: asOf };
  const from = instantNear(validity.from, instantNear(issued, asOf));
  const until = instantFrom(validity.until, from);
  if (until === from || until - from > longest) return { refused: [tooLong(forecast)] };
  const changes = forecast.changes
    .map((change) => {
      const begins = instantFrom(change.from, from);
      return { ...change, begins, ends: change.until === undefined ? until : instantFrom(change.until, begins) };
    })
    .sort((one, other) => one.begins - other.begins);
  const outside = changes.filter(({ begins, ends }) => begins >= until || ends > until || ends === begins);
  if (outside.length > 0) return { refused: outside.map(outsideForecast) };
  return {
    winds: timedWinds(forecast.wind, changes, from, until),
    extremes: forecast.extremes.map((one) => ({ ...one, at: instantNear(one.at, (from + until) / 2) })),
    from,
    until,
  };
}

interface TimedChange extends ForecastChange {
  readonly begins: Instant;
  readonly ends: Instant;
}

function timedWinds(
  base: ReportedWind | undefined,
  changes: readonly TimedChange[],
  from: Instant,
  until: Instant,
): readonly TimedWind[] {
  const prevailing: TimedWind[] = [{ reported: base, prevails: true, because: 'base', from, until }];
  const overlays: TimedWind[] = [];
  for (const { kind, heading, percent, wind: reported, begins, ends } of changes) {
    const told = { reported, because: kind, heading, ...(percent === undefined ? {} : { percent }), from: begins };
    if (kind === 'temporary' || kind === 'probable') {
      if (reported !== undefined) overlays.push({ ...told, prevails: false, until: ends });
      continue;
    }
    // a BECMG without a wind leaves it as it is; an FM without one leaves it unknown
    if (kind === 'becoming' && reported === undefined) continue;
    const over = kind === 'from' ? begins : ends;
    for (const before of prevailing) before.until = Math.min(before.until, over);
    prevailing.push({ ...told, prevails: true, until });
  }
  return [...prevailing, ...overlays];
}

function tooLong({ groups }: Forecast): ReportFault {
  const { at, token } = groups.find(({ as }) => as === 'validity') as ReadGroup;
  return groupFault({ at, text: token }, 'out-of-range', 'is not a time of a forecast', 'up to 48 hours');
}

function outsideForecast({ heading, at }: TimedChange): ReportFault {
  return groupFault(
    { text: heading, at },
    'contradiction',
    'does not lie within the time of the forecast',
    'times within those of the forecast',
    'give the hours as a list in place of the forecast',
  );
}
