import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A variable wind direction, of which the least favourable is taken. */
export const windVariable: CautionTest<ConditionsContext> = {
  code: 'wind-variable',
  severity: 'note',
  meaning: 'The direction of the wind varies; the least headwind and the greatest crosswind of the sector are taken.',
  source: 'Judgement',
  test: (context) => {
    const { variable, headwind } = context.wind;
    if (!variable) return undefined;
    const along = `${headwind < 0 ? 'tailwind' : 'headwind'} ${textIn(context, 'speed', Math.abs(headwind))}`;
    return {
      message: `The wind varies in direction. The least favourable of the sector is taken: ${along}.`,
      at: '/weather/wind/variable',
      value: { kind: 'speed', value: headwind },
    };
  },
};
