import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** The runway is one on file, and the question put something in place of what is on file. */
export const runwayChanged: CautionTest<AnswerContext> = {
  code: 'runway-changed',
  severity: 'note',
  meaning: 'The runway is one on file, with something in place of what is on file.',
  source: 'Judgement',
  test: ({ question: { runway } }) => {
    const { onFile, designator } = runway;
    if (onFile === undefined || onFile.changed.length === 0) return undefined;
    return {
      message: `Runway ${designator} is that of ${onFile.aerodrome}, revision ${onFile.revision}, with changes of the question: ${onFile.changed.join(', ')}.`,
      at: '/runway',
    };
  },
};
