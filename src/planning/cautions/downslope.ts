import { percentText } from '../sentences/measure-text.ts';
import type { CautionTest } from './caution-test.ts';
import { fromTo } from './from-to.ts';
import type { LandingContext } from './landing-context.ts';

/** Downward slope that is worth a caution. */
const falls = 0.01;

/** A runway that falls away under the landing. */
export const downslope: CautionTest<LandingContext> = {
  code: 'downslope',
  severity: 'caution',
  meaning: 'The runway falls by more than 1 % in the direction of movement and lengthens the ground roll.',
  threshold: { kind: 'gradient', value: -falls },
  source: 'EuAirOps330Amc2',
  test: (context) => {
    const { question, stated } = context;
    const { runway } = question;
    if (runway.slope >= -falls - 1e-9) return undefined;
    const level = stated && context.landedWith({ slope: 0, profile: undefined })?.groundRoll;
    return {
      message: `Runway ${runway.designator} falls ${percentText(-runway.slope, 2)} in the direction of movement.${fromTo(context, 'ground roll', level, stated?.groundRoll)}`,
      at: '/runway/slope',
      value: { kind: 'gradient', value: runway.slope },
    };
  },
};
