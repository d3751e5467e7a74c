import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A speed schedule that falls after lift-off. */
export const screenSpeedBelowLiftOff: CautionTest<TakeoffContext> = {
  code: 'screen-speed-below-lift-off',
  severity: 'caution',
  meaning: 'The speed at the screen is below the lift-off speed; the lift-off speed is held to the screen instead.',
  source: 'Judgement',
  test: (context) => {
    const { screen, liftOff } = context.speeds;
    if (screen.cas >= liftOff.cas * (1 - 1e-9)) return undefined;
    return {
      message: `The speed at the screen, ${textIn(context, 'speed', screen.cas)} calibrated, is below the lift-off speed of ${textIn(context, 'speed', liftOff.cas)}. The air distance is computed with the lift-off speed held.`,
      at: '/configuration',
      value: { kind: 'speed', value: screen.cas },
      threshold: { kind: 'speed', value: liftOff.cas },
    };
  },
};
