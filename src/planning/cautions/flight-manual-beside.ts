import { boundsBeside } from '../manual/bounds-beside.ts';
import { manualBoundText, manualMeasures } from '../manual/manual-bound-text.ts';
import { isPhysicsByName } from '../method.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Speeds or a climb that the flight manual prints do not reach what is asked. */
export const flightManualBeside: CautionTest<AnswerContext> = {
  code: 'flight-manual-beside',
  severity: 'strong',
  meaning:
    'The speeds or the climb that the flight manual prints end before what is asked: their edge is taken where it is the safe side, else they are not the manual\u2019s; then strong.',
  source: 'HouseManual',
  test: ({ question, air }) => {
    if (isPhysicsByName(question)) return undefined;
    const [first, ...others] = boundsBeside(question, air);
    if (first === undefined) return undefined;
    const all = [first, ...others];
    const each = all.map(
      ({ of, isEdge, bounds }) =>
        `its ${of}: ${bounds.map((bound) => manualBoundText(bound, question.units)).join(' and ')}, ${isEdge ? 'and its edge is taken' : `so that the ${of} ${of === 'climb' ? 'is' : 'are'} not the manual's`}`,
    );
    return {
      severity: all.every(({ isEdge }) => isEdge) ? 'caution' : 'strong',
      message: `The flight manual ends before what is asked. Of ${each.join('; of ')}.`,
      at: manualMeasures[first.bounds[0]?.axis ?? 'mass'].at,
    };
  },
};
