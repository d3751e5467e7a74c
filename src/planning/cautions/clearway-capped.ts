import { type AnswerContext, measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A clearway longer than counts. */
export const clearwayCapped: CautionTest<AnswerContext> = {
  code: 'clearway-capped',
  severity: 'caution',
  meaning: 'The clearway is longer than half the run available; what is beyond does not count.',
  source: 'EuAirOps205',
  test: (context) => {
    const { clearwayNotCredited, credited } = context.declared;
    if (clearwayNotCredited === undefined || credited.toda === undefined) return undefined;
    return {
      message: `The clearway counts up to half the run. ${textIn(context, 'distance', clearwayNotCredited)} of the declared TODA is not counted: ${measureDown(context, credited.toda)} is available.`,
      at: '/runway/declared/toda',
      value: { kind: 'distance', value: clearwayNotCredited, direction: 'up' },
      threshold: { kind: 'distance', value: credited.toda, direction: 'down' },
    };
  },
};
