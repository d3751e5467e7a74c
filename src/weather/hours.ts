import type { AirReport } from '../performance/air.ts';
import type { Wind } from '../planning/question.ts';
import type { ChangeKind } from './forecast.ts';
import type { Instant } from './instant.ts';
import type { ReportedWind } from './wind-group.ts';

/** A wind that can hold in an hour. */
export interface HourWind {
  readonly wind: Wind;
  /** where it comes from: the first part of a forecast, a change, or the question's own list */
  readonly because: 'base' | ChangeKind | 'given';
  /** the change as written; absent without one */
  readonly heading?: string;
  readonly percent?: 30 | 40;
  /** as reported, with what the report rounds */
  readonly reported?: ReportedWind;
}

/** A temperature of an hour [K], with the bounds it is known to where it was worked out. */
export interface HourTemperature {
  readonly value: number;
  readonly low?: number;
  readonly high?: number;
  readonly because: 'given' | 'between-extremes';
}

/** The weather of the hour that begins at a moment: every wind that can hold in it, of which the worst counts. */
export interface Hour {
  readonly at: Instant;
  readonly winds: readonly HourWind[];
  readonly temperature?: HourTemperature;
  readonly dewPoint?: number;
  readonly pressure?: AirReport['pressure'];
  /** what nobody gave for this hour: it has no answer */
  readonly missing: readonly ('wind' | 'temperature' | 'pressure')[];
}

/** An hour of a list, as given: SI. */
export interface GivenHour {
  readonly at: Instant;
  readonly wind: Wind;
  readonly temperature: number;
  readonly dewPoint?: number;
  readonly pressure: AirReport['pressure'];
}

/** Hours from a list; nothing is missing in it. */
export function givenHours(list: readonly GivenHour[]): readonly Hour[] {
  return list.map(({ at, wind, temperature, dewPoint, pressure }) => ({
    at,
    winds: [{ wind, because: 'given' }],
    temperature: { value: temperature, because: 'given' },
    ...(dewPoint === undefined ? {} : { dewPoint }),
    pressure,
    missing: [],
  }));
}
