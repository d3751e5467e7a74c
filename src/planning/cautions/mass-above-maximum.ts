import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A mass above the aeroplane's maximum takeoff mass. */
export const massAboveMaximum: CautionTest<AnswerContext> = {
  code: 'mass-above-maximum',
  severity: 'strong',
  meaning: 'The mass is above the maximum takeoff mass of the aeroplane.',
  source: 'Cfr25s1501',
  test: (context) => {
    const { mass, aeroplane } = context.question;
    const maximum = aeroplane.masses.maximumTakeoff;
    if (mass <= maximum * (1 + 1e-9)) return undefined;
    return {
      message: `Mass ${textIn(context, 'mass', mass)} is ${textIn(context, 'mass', mass - maximum)} above the maximum takeoff mass of ${textIn(context, 'mass', maximum)}. The distances are computed as asked.`,
      at: '/mass',
      value: { kind: 'mass', value: mass },
      threshold: { kind: 'mass', value: maximum },
    };
  },
};
