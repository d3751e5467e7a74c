import type { Refused } from '../planning/fault.ts';
import type { Coded } from '../weather/coded.ts';
import { reportAge } from '../weather/day-time.ts';
import type { Forecast } from '../weather/forecast.ts';
import { readInstant } from '../weather/instant.ts';
import { notUnderstood, type Observation, type ReadGroup } from '../weather/observation.ts';
import { readForecast } from '../weather/read-forecast.ts';
import { readObservation } from '../weather/read-observation.ts';
import { isReportRefused } from '../weather/report-fault.ts';
import { windOf } from '../weather/reported-weather.ts';
import { presentationOf } from './assumed-presentation.ts';
import { atText } from './at-text.ts';
import type { DecodeRequest, DecodeResponse } from './decode.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import { toAdvisory } from './to-advisory.ts';
import { type Stamp, toSources } from './to-basis.ts';
import { toWindOnWire } from './to-known-weather.ts';

/** A report read group by group, from gate to gate. */
export function answerDecode(request: DecodeRequest, stamp: Stamp): DecodeResponse | Refused {
  const { reference, asOf, report } = request;
  const isForecast = /^TAF\b/.test(report);
  const read = isForecast ? readForecast(report) : readObservation(report);
  if (isReportRefused(read)) {
    return { refused: read.refused.map((fault) => atText(fault, '/report')) };
  }
  const how = presentationOf(request);
  const near = asOf === undefined ? undefined : readInstant(asOf);
  const missed = notUnderstood(read.groups);
  const sentence = `${isForecast ? 'TAF' : (read as Observation).kind} of ${read.station}: ${read.groups.length} groups, ${missed.length === 0 ? 'all of them understood' : `${missed.length} not understood (${missed.map(({ token }) => token).join(' ')})`}.`;
  return {
    outcome: 'read',
    advisory: toAdvisory(how, sentence, []),
    ...('changes' in read
      ? { forecast: toForecast(how, read, near) }
      : { observation: toObservation(how, read, near) }),
    basis: { sources: toSources(['Wmo306', 'Afman15s111']), modelVersion: stamp.modelVersion },
    question: {
      ...(reference === undefined ? {} : { reference }),
      ...(asOf === undefined ? {} : { asOf }),
      report,
      ...how,
    },
  };
}

type Shown = Required<DecodeResponse>;

function toObservation(how: Presentation, read: Observation, near: number | undefined): Shown['observation'] {
  const { kind, station, time, corrected, automatic, temperature, dewPoint, qnh } = read;
  return {
    kind,
    station,
    time,
    ...ageOf(time, near),
    corrected,
    automatic,
    ...windShown(read),
    ...(temperature === undefined ? {} : { temperature: rounded(how, 'temperature', temperature) }),
    ...(dewPoint === undefined ? {} : { dewPoint: rounded(how, 'temperature', dewPoint) }),
    ...(qnh === undefined ? {} : { qnh: rounded(how, 'pressure', qnh) }),
    ...groupsOf(read.groups),
  };
}

function toForecast(how: Presentation, read: Forecast, near: number | undefined): Shown['forecast'] {
  const { station, issued, corrected, amended, cancelled, validity, changes, extremes } = read;
  return {
    station,
    time: issued,
    ...ageOf(issued, near),
    corrected,
    amended,
    cancelled,
    ...validity,
    ...windShown(read),
    changes: changes.map(({ heading, kind, percent, from, until, wind }) => ({
      heading,
      kind,
      ...(percent === undefined ? {} : { percent }),
      from,
      ...(until === undefined ? {} : { until }),
      ...windShown({ ...(wind === undefined ? {} : { wind }) }),
    })),
    extremes: extremes.map(({ kind, temperature, at }) => ({
      kind,
      temperature: shownQuantity(how, 'temperature', temperature.value),
      at,
    })),
    ...groupsOf(read.groups),
  };
}

function ageOf(time: Observation['time'], near: number | undefined): { age?: number } {
  return near === undefined ? {} : { age: Math.round(reportAge(time, near) / 60) };
}

function windShown({ wind }: Pick<Observation, 'wind'>): Pick<Shown['observation'], 'wind'> | object {
  const found = windOf(wind);
  return typeof found === 'string' ? {} : { wind: toWindOnWire(found) };
}

function rounded(how: Presentation, kind: 'temperature' | 'pressure', { value, low, high }: Coded) {
  return {
    written: shownQuantity(how, kind, value),
    low: shownQuantity(how, kind, low),
    high: shownQuantity(how, kind, high),
  };
}

function groupsOf(groups: readonly ReadGroup[]) {
  const shown = ({ at, token, as }: ReadGroup) => ({ at, text: token, readAs: as });
  return { groups: groups.map(shown), notUnderstood: notUnderstood(groups).map(shown) };
}
