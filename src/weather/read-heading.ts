import { type DayTime, readIssueTime } from './day-time.ts';
import type { ReadAs, ReadGroup } from './observation.ts';
import { groupFault, isReportFault, missingGroup, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

export type ReportKind = 'METAR' | 'SPECI' | 'TAF';

/** What every report begins with. */
export interface Heading {
  /** absent where the report does not begin with its kind */
  readonly kind?: ReportKind;
  readonly station: string;
  readonly time: DayTime;
  readonly marks: ReadonlySet<Mark>;
  readonly groups: readonly ReadGroup[];
  /** of the first group after it */
  readonly next: number;
}

/** What a heading may be marked with. */
export type Mark = 'corrected' | 'amended' | 'automatic' | 'nil' | 'cancelled';

const kindForm = /^(?:METAR|SPECI|TAF)$/;
const stationForm = /^[A-Z][A-Z0-9]{3}$/;
const marks: ReadonlyMap<string, Mark> = new Map([
  ['COR', 'corrected'],
  ['AMD', 'amended'],
  ['AUTO', 'automatic'],
  ['NIL', 'nil'],
  ['CNL', 'cancelled'],
]);
/** Corrections numbered by a letter. */
const lettered = /^CC[A-Z]$/;

/** Kind, marks, station, time and marks again; or every fault in them. */
export function readHeading(tokens: readonly Token[]): Heading | readonly ReportFault[] {
  const groups: ReadGroup[] = [];
  const faults: ReportFault[] = [];
  const found = new Set<Mark>();
  let next = 0;
  const take = (as: ReadAs): Token => {
    const token = tokens[next++] as Token;
    groups.push({ at: token.at, token: token.text, as });
    return token;
  };
  const takeMarks = () => {
    for (let mark = markOf(tokens[next]); mark !== undefined; mark = markOf(tokens[next])) {
      found.add(mark);
      take(mark);
    }
  };

  const kind = kindForm.test(tokens[0]?.text ?? '') ? (take('kind').text as ReportKind) : undefined;
  takeMarks();
  const station = tokens[next];
  if (station === undefined)
    faults.push(missingGroup(endOf(tokens), 'station', 'four letters or figures, such as ZZZZ'));
  else if (stationForm.test(station.text)) take('station');
  else
    faults.push(
      groupFault(station, 'unreadable', 'is not a station', 'four letters or figures, a letter first, such as ZZZZ'),
    );

  const issued = faults.length === 0 ? tokens[next] : undefined;
  const time = issued === undefined ? undefined : readIssueTime(issued);
  if (time === undefined) {
    if (faults.length === 0)
      faults.push(missingGroup(issued?.at ?? endOf(tokens), 'day and time', 'a group such as 011250Z'));
  } else if (isReportFault(time)) faults.push(time);
  if (faults.length > 0 || time === undefined || isReportFault(time)) return faults;
  take('time');
  takeMarks();
  return {
    ...(kind === undefined ? {} : { kind }),
    station: station?.text as string,
    time,
    marks: found,
    groups,
    next,
  };
}

/** Characters up to the end of the last group. */
export function endOf(tokens: readonly Token[]): number {
  const last = tokens.at(-1);
  return last === undefined ? 0 : last.at + last.text.length;
}

function markOf(token: Token | undefined): Mark | undefined {
  if (token === undefined) return undefined;
  return lettered.test(token.text) ? 'corrected' : marks.get(token.text);
}
