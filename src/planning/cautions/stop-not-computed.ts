import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A takeoff from a slippery runway, whose rejected takeoff nobody has computed. */
export const stopNotComputed: CautionTest<TakeoffContext> = {
  code: 'stop-not-computed',
  severity: 'strong',
  meaning:
    'The runway is contaminated or its condition code is 2 or less; the stop of a rejected takeoff is not computed with that braking.',
  threshold: 2,
  source: 'HouseContaminant',
  test: ({ condition: { codes, isSlippery }, surface }) => {
    if (!isSlippery) return undefined;
    const poorest = codes === undefined ? undefined : Math.min(...codes);
    const code = poorest === undefined ? '' : `, condition code ${poorest}`;
    return {
      message: `The runway is slippery (${surface}${code}). The stop of a rejected takeoff is not computed with its braking, and no factor here stands for it: ASDA may be far too short.`,
      at: '/runway/surface',
      value: poorest,
    };
  },
};
