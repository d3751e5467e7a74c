import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import { fromTo } from './from-to.ts';
import type { LandingContext } from './landing-context.ts';

/** An approach above the landing reference speed, with what it costs. */
export const approachSpeedIncrement: CautionTest<LandingContext> = {
  code: 'approach-speed-increment',
  severity: 'caution',
  meaning: 'The approach is flown above the landing reference speed, as the procedure asks.',
  threshold: { kind: 'speed', value: 0 },
  source: 'Judgement',
  test: (context) => {
    const { question, reference, stated } = context;
    const increment = question.procedure?.approachSpeedIncrement ?? 0;
    if (increment === 0) return undefined;
    const without = stated && context.landedWith({ referenceSpeed: reference.tas })?.landingDistance;
    return {
      message: `The approach is ${textIn(context, 'speed', increment)} above the landing reference speed of ${textIn(context, 'speed', reference.cas)} calibrated.${fromTo(context, 'landing distance', without, stated?.landingDistance)}`,
      at: '/procedure/approachSpeedIncrement',
      value: { kind: 'speed', value: increment },
    };
  },
};
