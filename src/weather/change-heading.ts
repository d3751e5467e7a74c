import { checkedDayTime, type DayTime } from './day-time.ts';
import type { ChangeKind, ForecastChange } from './forecast.ts';
import { groupFault, isReportFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

const spanForm = /^(\d{2})(\d{2})\/(\d{2})(\d{2})$/;
const fromForm = /^FM(\d{2})(\d{2})(\d{2})$/;
const percentForm = /^PROB(30|40)$/;
const meantAsChange = /^(?:FM\d*|PROB\d*|BECMG|TEMPO|INTER)$/;

/** How a part of a forecast begins, and of how many groups that is. */
export interface ChangeHeading extends Omit<ForecastChange, 'wind'> {
  readonly length: number;
}

/** The change that begins with a group; undefined where none does. @see references.Wmo306, FM 51 TAF */
export function readChangeHeading(tokens: readonly Token[], first: number): ChangeHeading | ReportFault | undefined {
  const token = tokens[first] as Token;
  if (!meantAsChange.test(token.text)) return undefined;
  const from = fromForm.exec(token.text);
  if (from !== null) {
    const at = checkedDayTime(token, Number(from[1]), Number(from[2]), Number(from[3]));
    return isReportFault(at) ? at : { kind: 'from', heading: token.text, at: token.at, from: at, length: 1 };
  }
  const percent = percentForm.exec(token.text)?.[1];
  const laidOver = percent === undefined ? token : tokens[first + 1];
  const kind = kinds[laidOver?.text ?? ''];
  const words = percent === undefined || kind !== 'temporary' ? 1 : 2;
  if (percent === undefined && kind === undefined) {
    return groupFault(
      token,
      'unreadable',
      'cannot be read as a change',
      'FM with day, hour and minute, or PROB30 or PROB40',
    );
  }
  const span = readSpan(tokens[first + words], token);
  if (isReportFault(span)) return span;
  return {
    kind: percent !== undefined && words === 1 ? 'probable' : (kind as ChangeKind),
    heading: tokens
      .slice(first, first + words + 1)
      .map(({ text }) => text)
      .join(' '),
    at: token.at,
    ...(percent === undefined ? {} : { percent: percent === '30' ? 30 : 40 }),
    ...span,
    length: words + 1,
  };
}

const kinds: Readonly<Record<string, ChangeKind>> = { BECMG: 'becoming', TEMPO: 'temporary', INTER: 'temporary' };

/** The days and hours of a group such as 0112/0218; the end may be hour 24. */
export function readSpan(
  token: Token | undefined,
  before: Token,
): { readonly from: DayTime; readonly until: DayTime } | ReportFault {
  const allowed = 'days and hours from and until, such as 0112/0218';
  const found = token === undefined ? null : spanForm.exec(token.text);
  if (token === undefined || found === null) {
    return groupFault(token ?? before, 'unreadable', 'stands where a time from and until is needed', allowed);
  }
  const from = checkedDayTime(token, Number(found[1]), Number(found[2]), 0);
  if (isReportFault(from)) return from;
  const until = checkedDayTime(token, Number(found[3]), Number(found[4]), 0);
  return isReportFault(until) ? until : { from, until };
}
