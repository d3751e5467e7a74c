import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** A go-around at a speed that the stated thrust does not reach. */
export const balkedLandingUnknown: CautionTest<LandingContext> = {
  code: 'balked-landing-unknown',
  severity: 'caution',
  meaning:
    'The stated thrust does not reach the landing reference speed, so the climb after a balked landing is not known.',
  source: 'Judgement',
  test: (context) => {
    const { balkedLanding } = context;
    if (balkedLanding.outcome !== 'outside-stated-data') return undefined;
    const { airspeed, bound } = balkedLanding;
    return {
      message: `The climb after a balked landing is not known: the thrust is asked for at ${textIn(context, 'speed', airspeed)} true airspeed, and its data end at ${textIn(context, 'speed', bound)}.`,
      at: '/aeroplane',
      value: { kind: 'speed', value: airspeed },
      threshold: { kind: 'speed', value: bound },
    };
  },
};
