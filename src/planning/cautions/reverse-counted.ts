import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import { fromTo } from './from-to.ts';
import type { LandingContext } from './landing-context.ts';

/** Reverse thrust in the ground roll, with what it is worth. */
export const reverseCounted: CautionTest<LandingContext> = {
  code: 'reverse-counted',
  severity: 'caution',
  meaning:
    'Reverse thrust shortens the ground roll, as the procedure asks; the distance that factors multiply counts none.',
  source: 'Judgement',
  test: (context) => {
    const { run, stated } = context;
    if (run.reverseThrust === undefined) return undefined;
    const { thrust, cutOffSpeed } = run.reverseThrust;
    const without = stated && context.landedWith({ reverseThrust: undefined })?.groundRoll;
    return {
      message: `Reverse thrust of ${textIn(context, 'force', thrust)} is counted down to ${textIn(context, 'speed', cutOffSpeed)} over the ground.${fromTo(context, 'ground roll', without, stated?.groundRoll)}`,
      at: '/procedure/reverse',
      value: { kind: 'force', value: thrust },
    };
  },
};
