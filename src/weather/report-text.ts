import { groupFault, missingGroup, type ReportFault, type ReportRefused } from './report-fault.ts';

/** A group of a report: what stands between two spaces. */
export interface Token {
  readonly text: string;
  /** characters before it */
  readonly at: number;
}

export const longestReport = 512;

const giveMembers = 'give the weather member by member in place of the report';

const notPrintable = /[^ -~]/;
const small = /[a-z]/;
const opening = /^(?:METAR|SPECI|TAF)$/;

/**
 * The groups of one report, with their places; the closing = is left off.
 *
 * A report is at most 512 bytes of printable ASCII in capitals. Every other text is refused before any group is looked at.
 */
export function tokensOf(report: string): readonly Token[] | ReportRefused {
  const refused = textFault(report) ?? severalReports(report);
  if (refused !== undefined) return { refused: [refused] };
  const tokens = split(report.replace('=', ' '));
  if (tokens.length === 0) {
    return { refused: [missingGroup(0, 'group at all', 'one METAR, SPECI or TAF', giveMembers)] };
  }
  const again = tokens.find(({ text }, place) => place > 0 && opening.test(text));
  return again === undefined ? tokens : { refused: [several(again)] };
}

/** A day and time: outside remarks a second one is that of a second report. */
export const issueTime = /^\d{6}Z$/;

/** The fault of a second report in the same text. */
export function several(token: Token): ReportFault {
  return groupFault(
    token,
    'exactly-one-of',
    'begins a second report',
    'one report in a text',
    'keep the one that is meant',
  );
}

function textFault(report: string): ReportFault | undefined {
  // a character is at least a byte, and text with longer ones is refused below
  if (report.length > longestReport) {
    return {
      code: 'out-of-range',
      at: longestReport,
      token: '',
      message: `The report is longer than ${longestReport} bytes.`,
      received: report.length,
      allowed: `at most ${longestReport} bytes`,
      hint: `leave off the remarks, or ${giveMembers}`,
    };
  }
  const odd = report.search(notPrintable);
  if (odd >= 0) {
    return {
      code: 'unreadable',
      at: odd,
      token: '',
      message: `The character at ${odd} is not a printable character of ASCII.`,
      received: `U+${(report.codePointAt(odd) as number).toString(16).toUpperCase().padStart(4, '0')}`,
      allowed: 'printable ASCII on one line',
      hint: 'put a space in place of a line break or tabulator',
    };
  }
  const lower = report.search(small);
  if (lower < 0) return undefined;
  return {
    code: 'unreadable',
    at: lower,
    token: '',
    message: `The letter at character ${lower} is a small one; reports are written in capitals.`,
    received: report[lower] as string,
    allowed: 'capital letters',
    hint: 'paste the report as it was issued',
  };
}

function severalReports(report: string): ReportFault | undefined {
  const end = report.indexOf('=');
  if (end < 0) return undefined;
  const [next] = split(report.slice(end + 1));
  return next === undefined ? undefined : several({ text: next.text, at: next.at + end + 1 });
}

function split(report: string): readonly Token[] {
  const tokens: Token[] = [];
  let at = 0;
  for (const text of report.split(' ')) {
    if (text !== '') tokens.push({ text, at });
    at += text.length + 1;
  }
  return tokens;
}
