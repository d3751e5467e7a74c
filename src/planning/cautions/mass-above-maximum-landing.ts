import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** A mass above the aeroplane's maximum landing mass. */
export const massAboveMaximumLanding: CautionTest<LandingContext> = {
  code: 'mass-above-maximum-landing',
  severity: 'strong',
  meaning:
    'The mass is above the maximum landing mass of the aeroplane, or above the maximum takeoff mass where no other is stated.',
  source: 'Cfr25s1501',
  test: (context) => {
    const { mass, aeroplane } = context.question;
    const { maximumLanding, maximumTakeoff } = aeroplane.masses;
    const maximum = maximumLanding ?? maximumTakeoff;
    if (mass <= maximum * (1 + 1e-9)) return undefined;
    const which = maximumLanding === undefined ? 'takeoff' : 'landing';
    return {
      message: `Mass ${textIn(context, 'mass', mass)} is ${textIn(context, 'mass', mass - maximum)} above the maximum ${which} mass of ${textIn(context, 'mass', maximum)}. The distances are computed as asked.`,
      at: '/mass',
      value: { kind: 'mass', value: mass },
      threshold: { kind: 'mass', value: maximum },
    };
  },
};
