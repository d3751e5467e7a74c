import type { CautionTest } from './caution-test.ts';
import { fromTo } from './from-to.ts';
import type { LandingContext } from './landing-context.ts';

/** Braking without the anti-skid system, with what it costs. */
export const antiSkidInoperative: CautionTest<LandingContext> = {
  code: 'anti-skid-inoperative',
  severity: 'caution',
  meaning: 'The anti-skid system is inoperative, as the procedure says; the pilot modulates the brakes.',
  source: 'Cfr25s109',
  test: (context) => {
    const { question, run, stated } = context;
    if (question.procedure?.antiSkid !== 'inoperative') return undefined;
    const braking = context.brakingWithAntiSkid();
    const without = stated && braking && context.landedWith(braking)?.groundRoll;
    const friction = run.braking.at(run.touchdownSpeed - run.headwind);
    return {
      message: `The anti-skid system is inoperative: the braking friction at touchdown is ${Math.round(friction * 1000) / 1000} of the weight.${fromTo(context, 'ground roll', without, stated?.groundRoll)}`,
      at: '/procedure/antiSkid',
      value: friction,
    };
  },
};
