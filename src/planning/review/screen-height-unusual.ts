import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

const foot = 0.3048;
/** Screen heights of takeoff by certification basis [m]. */
const heights = { 'cs-23-amendment-4': 50 * foot, 'cs-23-commuter': 35 * foot, 'cs-25': 35 * foot } as const;

/** A screen height that is not that of the certification basis. */
export const screenHeightUnusual: FindingTest = {
  code: 'screen-height-unusual',
  severity: 'caution',
  meaning: 'The screen height of takeoff is not that of the certification basis: 50 ft, commuter and transport 35 ft.',
  source: 'Cfr25s113',
  test: (context) => {
    const { basis, screenHeight } = context.aeroplane.certification;
    if (basis === 'none') return [];
    const height = heights[basis];
    if (Math.abs(screenHeight - height) <= 0.3) return [];
    return [
      {
        message: `The screen height is ${textIn(context, 'altitude', screenHeight)}; that of ${basis} is ${textIn(context, 'altitude', height)}.`,
        at: '/certification/screenHeight',
        value: { kind: 'altitude', value: screenHeight },
        threshold: { kind: 'altitude', value: height },
      },
    ];
  },
};
