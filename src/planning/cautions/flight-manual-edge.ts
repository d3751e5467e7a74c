import { manualBoundText, manualMeasures } from '../manual/manual-bound-text.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** The edge of a table stands for what lies beyond it. */
export const flightManualEdge: CautionTest<AnswerContext> = {
  code: 'flight-manual-edge',
  severity: 'caution',
  meaning:
    'What is asked lies beyond the edge of a table of the flight manual on the side where the table shows its edge to be the longer distance; the figure of the edge is used as it stands.',
  source: 'HouseManual',
  test: ({ found: { flightManual }, question: { units }, wholeDistance }) => {
    const [first, ...others] = flightManual?.figures.edges ?? [];
    if (first === undefined || wholeDistance === undefined) return undefined;
    const each = [first, ...others].map((edge) => manualBoundText(edge, units));
    return {
      message: `The flight manual's ${each.join('; ')}. The figure at its edge is used as it stands: the table shows it to be the longer.`,
      at: manualMeasures[first.axis].at,
    };
  },
};
