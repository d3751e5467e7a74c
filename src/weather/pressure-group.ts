import { agree, type Coded, codedAltimeter, codedQnh } from './coded.ts';
import { groupFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

/** An altimeter setting as reported: a QNH [Pa], or a group that gives none. */
export type ReportedQnh = { readonly kind: 'qnh'; readonly qnh: Coded } | { readonly kind: 'not-reported' };

const form = /^([QA])(\d{4}|\/{4})$/;
const meant = /^(?:Q|A|QNH)[\d/][\d.,O/]*(?:HPA|INS|IN)?$/;

/** Bounds of a QNH [Pa]; beyond them it is a slip of a digit or of the unit. @see references.Judgement */
const [lowest, highest] = [87_000, 108_500];

/**
 * The altimeter setting of a group such as Q1013 [hPa] or A2992 [hundredths of an inch of mercury]; undefined where the group is
 * not one.
 *
 * @see references.Wmo306, reg. 15.12; references.Afman15s111, 3.10
 */
export function readQnh(token: Token): ReportedQnh | ReportFault | undefined {
  const found = form.exec(token.text);
  if (found === null) {
    return meant.test(token.text)
      ? groupFault(token, 'unreadable', 'cannot be read as an altimeter setting', 'a group such as Q1013 or A2992')
      : undefined;
  }
  if (found[2] === '////') return { kind: 'not-reported' };
  const figures = Number(found[2]);
  const qnh = found[1] === 'Q' ? codedQnh(figures) : codedAltimeter(figures);
  if (qnh.value >= lowest && qnh.value <= highest) return { kind: 'qnh', qnh };
  return groupFault(
    token,
    'out-of-range',
    found[1] === 'Q' ? `has a QNH of ${figures} hPa` : `has an altimeter setting of ${figures / 100} inHg`,
    'Q0870 to Q1085 in hPa, A2570 to A3204 in hundredths of an inch',
  );
}

/**
 * Two settings of one report: the second narrows the first where a true setting can have been written both ways; undefined where
 * none can.
 *
 * A hundredth of an inch is finer than a hectopascal, so that the figure and its bounds come from the finer of the two.
 */
export function narrowed(first: Coded, second: Coded): Coded | undefined {
  if (!agree(first, second)) return undefined;
  const low = Math.max(first.low, second.low);
  return { value: low, low, high: Math.min(first.high, second.high) };
}
