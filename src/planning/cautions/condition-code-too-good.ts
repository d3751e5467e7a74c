import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A condition code better than what lies on the runway allows. */
export const conditionCodeTooGood: CautionTest<AnswerContext> = {
  code: 'condition-code-too-good',
  severity: 'caution',
  meaning: 'A runway condition code is better than what is reported on the runway allows; the worse of the two counts.',
  source: 'Rcam',
  test: ({ condition: { given, derived } }) => {
    if (given === undefined || derived === undefined) return undefined;
    const best = Math.max(...given);
    if (best <= derived.code) return undefined;
    return {
      message: `Condition code ${best} is given, and ${derived.because} is ${derived.code}: ${derived.code} counts.`,
      at: '/runway/surface/runwayConditionCode',
      value: best,
      threshold: derived.code,
    };
  },
};
