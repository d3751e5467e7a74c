import type { Observation, ReadGroup } from './observation.ts';
import { readBody } from './read-body.ts';
import { readHeading } from './read-heading.ts';
import { narrowedByRemarks } from './read-remarks.ts';
import { groupFault, type ReportRefused } from './report-fault.ts';
import { issueTime, several, type Token, tokensOf } from './report-text.ts';

/**
 * A METAR or SPECI as an observation.
 *
 * Strict: the groups in their order, each by one anchored pattern, figures only from the groups that stand for them. What is not
 * understood is listed and nothing is taken from it; what stands for a wind, temperature or pressure but cannot be read, or cannot
 * be, refuses the report. Trend and remarks stay text, apart from the two that narrowedByRemarks takes.
 *
 * @see references.Wmo306
 */
export function readObservation(report: string): Observation | ReportRefused {
  const tokens = tokensOf(report);
  if ('refused' in tokens) return tokens;
  const heading = readHeading(tokens);
  if (!('groups' in heading)) return { refused: heading };
  const { kind = 'METAR', station, time, marks } = heading;
  if (kind === 'TAF') {
    return {
      refused: [
        groupFault(tokens[0] as Token, 'unreadable', 'begins a forecast', 'METAR or SPECI', 'give a forecast as hours'),
      ],
    };
  }
  const body = readBody(tokens, heading.next);
  const { trend, remarks } = trendAndRemarks(tokens.slice(body.next));
  const { figures, faults } = narrowedByRemarks(body.figures, remarks);
  const second = trend.filter(({ text }) => issueTime.test(text)).map(several);
  const refused = [...body.faults, ...second, ...faults];
  if (refused.length > 0) return { refused };
  return {
    kind,
    station,
    time,
    corrected: marks.has('corrected'),
    automatic: marks.has('automatic'),
    nil: marks.has('nil'),
    ...(body.wind === undefined ? {} : { wind: body.wind }),
    ...figures,
    runwayStates: body.runwayStates,
    groups: [...heading.groups, ...body.groups, ...readAs(trend, 'trend'), ...readAs(remarks, 'remark')],
  };
}

function trendAndRemarks(rest: readonly Token[]): {
  readonly trend: readonly Token[];
  readonly remarks: readonly Token[];
} {
  const from = rest.findIndex(({ text }) => text === 'RMK');
  return from < 0 ? { trend: rest, remarks: [] } : { trend: rest.slice(0, from), remarks: rest.slice(from) };
}

function readAs(tokens: readonly Token[], as: 'trend' | 'remark'): readonly ReadGroup[] {
  return tokens.map(({ at, text }) => ({ at, token: text, as }));
}
