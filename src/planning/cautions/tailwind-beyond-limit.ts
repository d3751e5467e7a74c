import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Tailwind beyond which certification data seldom reach [m/s]: 10 kt. */
const usualLimit = (10 * 1852) / 3600;

/** A tailwind beyond the aeroplane's limitation, or beyond 10 kt. */
export const tailwindBeyondLimit: CautionTest<ConditionsContext> = {
  code: 'tailwind-beyond-limit',
  severity: 'strong',
  meaning: 'The tailwind, mean or in a gust, is beyond the limitation of the aeroplane, or beyond 10 kt.',
  threshold: { kind: 'speed', value: usualLimit },
  source: 'Judgement',
  test: (context) => {
    const mean = -context.wind.headwind;
    const gust = -(context.wind.gust?.headwind ?? Number.POSITIVE_INFINITY);
    const component = Math.max(mean, gust);
    const limitation = context.question.aeroplane.limitations?.tailwind;
    const isLimited = limitation !== undefined && component > limitation + 1e-9;
    const limit = isLimited ? limitation : usualLimit;
    if (component <= limit + 1e-9) return undefined;
    const what = isLimited
      ? `the aeroplane's limitation of ${textIn(context, 'speed', limitation)}`
      : `${textIn(context, 'speed', usualLimit)}, where data of aeroplanes usually end`;
    return {
      message: `${gust > mean ? 'In a gust the tailwind of' : 'Tailwind'} ${textIn(context, 'speed', component)} is ${textIn(context, 'speed', component - limit)} beyond ${what}.`,
      at: '/weather/wind',
      value: { kind: 'speed', value: component },
      threshold: { kind: 'speed', value: limit },
    };
  },
};
