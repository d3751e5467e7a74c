import { readChangeHeading, readSpan } from './change-heading.ts';
import { readExtreme } from './extreme-group.ts';
import type { Forecast, ForecastChange, ForecastExtreme } from './forecast.ts';
import { keptAs } from './kept-group.ts';
import type { ReadAs, ReadGroup } from './observation.ts';
import { endOf, type Heading, readHeading } from './read-heading.ts';
import { groupFault, isReportFault, missingGroup, type ReportFault, type ReportRefused } from './report-fault.ts';
import { issueTime, several, type Token, tokensOf } from './report-text.ts';
import { type ReportedWind, readSector, readWind } from './wind-group.ts';

/**
 * A TAF as a forecast: its first part, its changes in the order written, and its extremes of temperature.
 *
 * The wind of a part is its first group, where it has one; all that tells of no wind and no temperature is kept as text.
 *
 * @see references.Wmo306, FM 51 TAF
 */
export function readForecast(report: string): Forecast | ReportRefused {
  const tokens = tokensOf(report);
  if ('refused' in tokens) return tokens;
  const heading = readHeading(tokens);
  if (!('groups' in heading)) return { refused: heading };
  if (heading.kind !== 'TAF') {
    const first = tokens[0] as Token;
    return {
      refused: [groupFault(first, 'unreadable', 'does not begin a forecast', 'TAF', 'give an observation as report')],
    };
  }
  if (heading.marks.has('nil')) return withoutParts(heading, tokens);
  const span = tokens[heading.next];
  if (span === undefined) {
    return { refused: [missingGroup(endOf(tokens), 'time from and until', 'a group such as 0112/0218')] };
  }
  const validity = readSpan(span, span);
  if (isReportFault(validity)) return { refused: [validity] };
  const groups: ReadGroup[] = [...heading.groups, { at: span.at, token: span.text, as: 'validity' }];
  const parts = readParts(tokens, heading.next + 1);
  if (parts.faults.length > 0) return { refused: parts.faults };
  return {
    ...marked(heading, parts.cancelled),
    validity,
    ...(parts.wind === undefined ? {} : { wind: parts.wind }),
    changes: parts.changes,
    extremes: parts.extremes,
    groups: [...groups, ...parts.groups],
  };
}

interface Parts {
  wind?: ReportedWind;
  cancelled: boolean;
  readonly changes: ForecastChange[];
  readonly extremes: ForecastExtreme[];
  readonly groups: ReadGroup[];
  readonly faults: ReportFault[];
}

function readParts(tokens: readonly Token[], first: number): Parts {
  const parts: Parts = { cancelled: false, changes: [], extremes: [], groups: [], faults: [] };
  const read = ({ at, text }: Token, as: ReadAs) => parts.groups.push({ at, token: text, as });
  let next = first;
  while (next < tokens.length) {
    const token = tokens[next] as Token;
    if (token.text === 'RMK') {
      for (const remark of tokens.slice(next)) read(remark, 'remark');
      break;
    }
    const change = readChangeHeading(tokens, next);
    if (change === undefined) {
      const as = readMember(token, tokens[next + 1], parts);
      if (typeof as === 'string') read(token, as);
      else parts.faults.push(as);
      next++;
    } else if (isReportFault(change)) {
      parts.faults.push(change);
      next++;
    } else {
      const { length, ...told } = change;
      for (const word of tokens.slice(next, next + length)) read(word, 'change');
      parts.changes.push(told);
      next += length;
    }
  }
  return parts;
}

/** One group of the part that was begun last. */
function readMember(token: Token, following: Token | undefined, parts: Parts): ReadAs | ReportFault {
  if (token.text === 'CNL') {
    parts.cancelled = true;
    return 'cancelled';
  }
  if (issueTime.test(token.text)) return several(token);
  const kept = keptAs(token.text, following?.text);
  if (kept !== undefined) return kept;
  const extreme = readExtreme(token);
  if (extreme !== undefined) {
    if (isReportFault(extreme)) return extreme;
    parts.extremes.push(extreme);
    return 'temperature';
  }
  const part = parts.changes.at(-1);
  const before = part === undefined ? parts.wind : part.wind;
  const wind = readWind(token);
  if (wind !== undefined) {
    if (isReportFault(wind)) return wind;
    if (before !== undefined) return groupFault(token, 'contradiction', 'gives a second wind', 'one wind in each part');
    tell(parts, wind);
    return 'wind';
  }
  const sector = readSector(token);
  if (sector === undefined) return 'not-understood';
  if (isReportFault(sector)) return sector;
  if (before?.kind !== 'from' && before?.kind !== 'variable') return 'not-understood';
  tell(parts, { ...before, sector });
  return 'wind-sector';
}

function tell(parts: Parts, wind: ReportedWind): void {
  const part = parts.changes.pop();
  if (part === undefined) parts.wind = wind;
  else parts.changes.push({ ...part, wind });
}

function marked({ station, time, marks }: Heading, cancelled: boolean) {
  return {
    station,
    issued: time,
    corrected: marks.has('corrected'),
    amended: marks.has('amended'),
    nil: marks.has('nil'),
    cancelled: cancelled || marks.has('cancelled'),
  };
}

function withoutParts(heading: Heading, tokens: readonly Token[]): Forecast {
  const rest = tokens.slice(heading.next).map(({ at, text }) => ({ at, token: text, as: 'not-understood' as const }));
  return { ...marked(heading, false), changes: [], extremes: [], groups: [...heading.groups, ...rest] };
}
