import type { Coded } from './coded.ts';
import type { DayTime } from './day-time.ts';
import type { KeptAs } from './kept-group.ts';
import type { RunwayState } from './runway-state-group.ts';
import type { ReportedWind } from './wind-group.ts';

/** What a group of a report was read as. */
export type ReadAs =
  | 'kind'
  | 'station'
  | 'time'
  | 'corrected'
  | 'amended'
  | 'automatic'
  | 'nil'
  | 'cancelled'
  | 'validity'
  | 'wind'
  | 'wind-sector'
  | KeptAs
  | 'temperature'
  | 'pressure'
  | 'runway-state'
  | 'change'
  | 'trend'
  | 'remark'
  | 'not-understood';

/** A group with its place and what it was read as: together they are the whole report. */
export interface ReadGroup {
  readonly at: number;
  readonly token: string;
  readonly as: ReadAs;
}

/** A METAR or SPECI. What is not reported is absent, or named so; nothing is filled in. SI. */
export interface Observation {
  readonly kind: 'METAR' | 'SPECI';
  readonly station: string;
  readonly time: DayTime;
  readonly corrected: boolean;
  readonly automatic: boolean;
  /** nothing was observed */
  readonly nil: boolean;
  readonly wind?: ReportedWind;
  readonly temperature?: Coded;
  readonly dewPoint?: Coded;
  readonly qnh?: Coded;
  readonly runwayStates: readonly RunwayState[];
  readonly groups: readonly ReadGroup[];
}

/** The groups of a report that were read as one thing, as text; undefined where there are none. */
export function textOf(groups: readonly ReadGroup[], as: ReadAs): string | undefined {
  const found = groups.filter((group) => group.as === as);
  return found.length === 0 ? undefined : found.map(({ token }) => token).join(' ');
}

/** What was not understood, each with its place. */
export function notUnderstood(groups: readonly ReadGroup[]): readonly ReadGroup[] {
  return groups.filter(({ as }) => as === 'not-understood');
}
