import type { Coded } from './coded.ts';
import type { DayTime } from './day-time.ts';
import type { ReadGroup } from './observation.ts';
import type { ReportedWind } from './wind-group.ts';

/** How a part of a forecast holds. */
export type ChangeKind =
  /** FM: replaces all before it, from a moment on */
  | 'from'
  /** BECMG: replaces what it names, at an unknown moment of its time */
  | 'becoming'
  /** TEMPO, INTER: may hold at any moment of its time, and what it is laid over as well */
  | 'temporary'
  /** PROB without TEMPO: holds at any moment of its time, or not at all */
  | 'probable';

/** One part of a forecast after its first. */
export interface ForecastChange {
  readonly kind: ChangeKind;
  /** as written, such as PROB30 TEMPO 0114/0118 */
  readonly heading: string;
  /** characters before it */
  readonly at: number;
  readonly percent?: 30 | 40;
  readonly from: DayTime;
  /** absent of a change that holds until the next of its kind or the end */
  readonly until?: DayTime;
  /** absent where it tells of no wind */
  readonly wind?: ReportedWind;
}

/** A highest or lowest temperature and when it is expected. */
export interface ForecastExtreme {
  readonly kind: 'highest' | 'lowest';
  readonly temperature: Coded;
  readonly at: DayTime;
}

/** A TAF. SI. */
export interface Forecast {
  readonly station: string;
  readonly issued: DayTime;
  readonly corrected: boolean;
  readonly amended: boolean;
  /** there is none */
  readonly nil: boolean;
  /** it no longer holds */
  readonly cancelled: boolean;
  /** absent of a forecast that is nil */
  readonly validity?: { readonly from: DayTime; readonly until: DayTime };
  /** absent where the first part tells of no wind */
  readonly wind?: ReportedWind;
  readonly changes: readonly ForecastChange[];
  readonly extremes: readonly ForecastExtreme[];
  readonly groups: readonly ReadGroup[];
}
