import type { ConditionsContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Groups of a report from which nothing was taken. */
export const reportNotUnderstood: CautionTest<ConditionsContext> = {
  code: 'report-not-understood',
  severity: 'note',
  meaning: 'Groups of the report could not be read; nothing was taken from them.',
  source: 'Wmo306',
  test: ({ question: { report } }) => {
    if (report === undefined || report.notUnderstood.length === 0) return undefined;
    const count = report.notUnderstood.length;
    return {
      message: `Nothing was taken from ${count} ${count === 1 ? 'group' : 'groups'} of the report of ${report.station}, not understood: ${report.notUnderstood.join(' ')}.`,
      at: '/weather/report',
      value: count,
    };
  },
};
