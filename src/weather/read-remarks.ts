import { agree, type Coded } from './coded.ts';
import { narrowed, readQnh } from './pressure-group.ts';
import { groupFault, isReportFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';
import { type ReportedTemperatures, readTenths } from './temperature-group.ts';

/** The figures of a report's body that remarks may narrow. */
export interface BodyFigures extends ReportedTemperatures {
  readonly qnh?: Coded;
}

/**
 * The body's figures, narrowed by what the remarks say more exactly: temperatures in tenths (T01230045) and a second altimeter
 * setting (A2992 beside Q1013).
 *
 * A remark counts where it is the only one of its kind and can be of the same true value as the body's group; where it cannot, the
 * report contradicts itself. What the body does not report is not taken from remarks. SLP is the pressure reduced to sea level by
 * the day's temperature, not a QNH, and is never taken for one.
 */
export function narrowedByRemarks(
  body: BodyFigures,
  remarks: readonly Token[],
): { readonly figures: BodyFigures; readonly faults: readonly ReportFault[] } {
  const faults: ReportFault[] = [];
  let figures = body;
  const [tenths, moreTenths] = remarks.filter(({ text }) => /^T[01]\d{3}(?:[01]\d{3})?$/.test(text));
  if (tenths !== undefined && moreTenths === undefined) {
    const read = readTenths(tenths);
    if (read !== undefined && isReportFault(read)) faults.push(read);
    else if (read !== undefined) figures = { ...figures, ...temperaturesOf(tenths, body, read, faults) };
  }
  const [setting, moreSettings] = remarks.filter(({ text }) => /^[QA]\d{4}$/.test(text));
  if (setting !== undefined && moreSettings === undefined && body.qnh !== undefined) {
    const read = readQnh(setting);
    if (read !== undefined && isReportFault(read)) faults.push(read);
    else if (read?.kind === 'qnh') {
      const qnh = narrowed(body.qnh, read.qnh);
      if (qnh === undefined) faults.push(contradicts(setting, 'altimeter setting'));
      else figures = { ...figures, qnh };
    }
  }
  return { figures, faults };
}

function temperaturesOf(
  token: Token,
  body: BodyFigures,
  tenths: ReportedTemperatures,
  faults: ReportFault[],
): ReportedTemperatures {
  const finer: { temperature?: Coded; dewPoint?: Coded } = {};
  for (const [name, word] of [
    ['temperature', 'temperature'],
    ['dewPoint', 'dew point'],
  ] as const) {
    const [coarse, fine] = [body[name], tenths[name]];
    if (coarse === undefined || fine === undefined) continue;
    if (agree(coarse, fine)) finer[name] = fine;
    else faults.push(contradicts(token, word));
  }
  return finer;
}

function contradicts(token: Token, word: string): ReportFault {
  return groupFault(token, 'contradiction', `contradicts the ${word} of the report's body`, `the same ${word} in both`);
}
