import { landingDefaults, steepestWithoutData } from '../rules/landing-defaults.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import { fromTo } from './from-to.ts';
import type { LandingContext } from './landing-context.ts';

/** An approach that is steeper than certification flies. */
export const approachSteep: CautionTest<LandingContext> = {
  code: 'approach-steep',
  severity: 'caution',
  meaning:
    'The approach is steeper than 4°; it is computed as stated, which is for data of the flight manual to bear out.',
  threshold: { kind: 'angle', value: steepestWithoutData },
  source: 'Cfr23s75',
  test: (context) => {
    const { run, stated } = context;
    if (run.approachAngle <= steepestWithoutData + 1e-9) return undefined;
    const usual = stated && context.landedWith({ approachAngle: landingDefaults.approachAngle.value })?.airDistance;
    return {
      message: `The approach angle of ${textIn(context, 'angle', run.approachAngle)} is steeper than ${textIn(context, 'angle', steepestWithoutData)}; certification approaches at ${textIn(context, 'angle', landingDefaults.approachAngle.value)}.${fromTo(context, 'air distance', usual, stated?.airDistance)}`,
      at: '/configuration',
      value: { kind: 'angle', value: run.approachAngle },
    };
  },
};
