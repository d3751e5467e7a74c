import type { Fault, FaultCode } from '../planning/fault.ts';

/** What is wrong with a report, and where in it. */
export interface ReportFault extends Omit<Fault, 'pointer'> {
  /** characters before it */
  readonly at: number;
  /** the group at fault; '' where one is missing */
  readonly token: string;
  readonly allowed: string;
  /** what may be given instead */
  readonly hint: string;
}

/** A refusal is a value, and names every fault found. */
export interface ReportRefused {
  readonly refused: readonly ReportFault[];
}

export function isReportRefused(read: object): read is ReportRefused {
  return 'refused' in read;
}

export function isReportFault(read: object): read is ReportFault {
  return 'code' in read && 'token' in read;
}

const correctOrGive = 'correct the group, or give the weather member by member in place of the report';

/** The fault of a group that stands in the report; `says` ends the sentence that begins with the group. */
export function groupFault(
  token: { readonly text: string; readonly at: number },
  code: FaultCode,
  says: string,
  allowed: string,
  hint = correctOrGive,
): ReportFault {
  const message = `${token.text} at character ${token.at} ${says}.`;
  return { code, at: token.at, token: token.text, message, received: token.text, allowed, hint };
}

/** The fault of a group that does not stand in the report. */
export function missingGroup(at: number, what: string, allowed: string, hint = correctOrGive): ReportFault {
  return { code: 'missing', at, token: '', message: `The report has no ${what}.`, allowed, hint };
}
