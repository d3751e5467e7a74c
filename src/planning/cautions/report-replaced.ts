import type { ConditionsContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** What the question gives stands in place of what its report says. */
export const reportReplaced: CautionTest<ConditionsContext> = {
  code: 'report-replaced',
  severity: 'caution',
  meaning: 'The question gives another temperature, dew point, pressure or wind than its own report.',
  source: 'Judgement',
  test: ({ question: { report } }) => {
    if (report === undefined || report.replaced.length === 0) return undefined;
    return {
      message: `The report of ${report.station} is not taken as it stands: ${report.replaced.join('; ')}. That is ${report.replaced.length} of its figures.`,
      at: '/weather',
    };
  },
};
