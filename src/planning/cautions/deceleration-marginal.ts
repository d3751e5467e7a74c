import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** Least deceleration over g below which small changes move the roll a long way. */
const marginal = 0.05;

/** A stop that hangs on very little deceleration. */
export const decelerationMarginal: CautionTest<LandingContext> = {
  code: 'deceleration-marginal',
  severity: 'strong',
  meaning: 'The least deceleration of the braked roll is under 5 % of that of gravity.',
  threshold: marginal,
  source: 'Judgement',
  test: (context) => {
    const { stated } = context;
    if (stated === undefined || stated.leastDecelerationRatio >= marginal) return undefined;
    return {
      message: `The least deceleration of the braked roll is ${percentText(stated.leastDecelerationRatio, 2)} of that of gravity. Small changes of friction, slope or thrust move the ground roll of ${textIn(context, 'distance', stated.groundRoll)} a long way.`,
      at: '/runway/surface',
      value: stated.leastDecelerationRatio,
    };
  },
};
