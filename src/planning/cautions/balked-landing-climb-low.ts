import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** Gradient that the rules of class B ask for with all engines after a balked landing. */
const low = 0.025;

/** A go-around that climbs little, or not at all. */
export const balkedLandingClimbLow: CautionTest<LandingContext> = {
  code: 'balked-landing-climb-low',
  severity: 'strong',
  meaning: 'The climb gradient after a balked landing is under 2.5 % (a caution), or there is no climb (strong).',
  threshold: { kind: 'gradient', value: low },
  source: 'EuAirOps340',
  test: (context) => {
    const { balkedLanding, speeds } = context;
    if (balkedLanding.outcome !== 'computed' || balkedLanding.gradient >= low) return undefined;
    const { gradient, rate } = balkedLanding;
    const climbs = gradient > 0;
    return {
      severity: climbs ? 'caution' : 'strong',
      message: `After a balked landing the aeroplane ${climbs ? 'climbs' : 'sinks'} at ${percentText(Math.abs(gradient), 2)}, ${textIn(context, 'rateOfClimb', Math.abs(rate))}, at full power, in this configuration, at ${textIn(context, 'speed', speeds.landingReference.cas)} calibrated.`,
      at: '/mass',
      value: { kind: 'gradient', value: gradient },
    };
  },
};
