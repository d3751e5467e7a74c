import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** A flare that begins before the screen. */
export const flareAboveScreen: CautionTest<LandingContext> = {
  code: 'flare-above-screen',
  severity: 'note',
  meaning: 'The flare would begin above the screen; the air distance is the part of its arc below.',
  source: 'Judgement',
  test: (context) => {
    const { stated, run } = context;
    if (!stated?.flareAboveScreen) return undefined;
    return {
      message: `With a load factor of ${run.flareLoadFactor} the flare begins above the screen of ${textIn(context, 'altitude', run.screenHeight)}. The air distance of ${textIn(context, 'distance', stated.airDistance)} has no straight approach in it.`,
      at: '/configuration',
      value: run.flareLoadFactor,
    };
  },
};
