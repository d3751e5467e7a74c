import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Least climb gradient below which small changes move the air distance a long way: twice where no path is computed. */
const marginal = 0.03;

/** An air distance that hangs on very little climb. */
export const climbGradientMarginal: CautionTest<TakeoffContext> = {
  code: 'climb-gradient-marginal',
  severity: 'caution',
  meaning: 'The least climb gradient on the way to the screen is under 3 %.',
  threshold: { kind: 'gradient', value: marginal },
  source: 'Judgement',
  test: (context) => {
    const { stated } = context;
    if (stated === undefined || stated.leastClimbGradient >= marginal) return undefined;
    return {
      message: `The least climb gradient on the way to the screen is ${percentText(stated.leastClimbGradient, 2)}. Small changes of mass, temperature or thrust move the air distance of ${textIn(context, 'distance', stated.airDistance)} a long way.`,
      at: '/mass',
      value: { kind: 'gradient', value: stated.leastClimbGradient },
    };
  },
};
