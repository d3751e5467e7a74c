import { silenceText } from '../manual/silence-text.ts';
import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Physics carries the manual's figures to what it does not speak of. */
export const flightManualSilent: CautionTest<AnswerContext> = {
  code: 'flight-manual-silent',
  severity: 'caution',
  meaning:
    "The flight manual does not speak of something in the question; its figure is carried there by the ratio of two runs of the aeroplane's physics.",
  source: 'HouseManual',
  test: (context) => {
    const { found, wholeDistance, phase } = context;
    const { flightManual, method } = found;
    if (flightManual === undefined || flightManual.silences.length === 0) return undefined;
    if (wholeDistance === undefined || wholeDistance.method === 'flight-manual') return undefined;
    const printed = flightManual.figures.wholeDistance ?? flightManual.figures.groundRoll;
    if (printed === undefined) return undefined;
    const physics = method === 'fitted' ? 'physics fitted to it' : 'physics on stated figures';
    const name = flightManual.figures.wholeDistance === undefined ? 'ground roll' : `${phase} distance`;
    return {
      severity: method === 'fitted' ? 'note' : 'caution',
      message: `The flight manual does not speak of ${silenceText(flightManual.silences, context)}. Its ${name} of ${textIn(context, 'distance', printed)} is carried there by ${physics}: the ${phase} distance is ${textIn(context, 'distance', wholeDistance.value)}.`,
      at: '/aeroplane',
    };
  },
};
