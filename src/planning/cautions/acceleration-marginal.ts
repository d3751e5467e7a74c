import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Least acceleration over g below which small changes move the roll a long way. */
const marginal = 0.02;

/** A ground roll that hangs on very little acceleration. */
export const accelerationMarginal: CautionTest<TakeoffContext> = {
  code: 'acceleration-marginal',
  severity: 'strong',
  meaning: 'The least acceleration of the ground roll is under 2 % of that of gravity.',
  threshold: marginal,
  source: 'Judgement',
  test: (context) => {
    const { stated } = context;
    if (stated === undefined || stated.leastAccelerationRatio >= marginal) return undefined;
    return {
      message: `The least acceleration of the ground roll is ${percentText(stated.leastAccelerationRatio, 2)} of that of gravity. Small changes of wind, slope, surface or thrust move the ground roll of ${textIn(context, 'distance', stated.groundRoll)} a long way.`,
      at: '/mass',
      value: stated.leastAccelerationRatio,
    };
  },
};
