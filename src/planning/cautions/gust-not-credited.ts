import { arithmeticSlack } from '../arithmetic-slack.ts';
import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A gust, which no distance counts. */
export const gustNotCredited: CautionTest<ConditionsContext> = {
  code: 'gust-not-credited',
  severity: 'note',
  meaning: 'Gusts are reported; distances are computed from the mean wind, and no gust shortens them.',
  source: 'Judgement',
  test: (context) => {
    const gust = context.wind.gust;
    if (gust === undefined || gust.speed - gust.mean <= arithmeticSlack) return undefined;
    const mean = context.wind.headwind;
    const counted = `Distances count the mean of ${textIn(context, 'speed', gust.mean)} only`;
    const tail =
      gust.headwind < 0
        ? `; in a gust the tailwind is ${textIn(context, 'speed', -gust.headwind)}, the mean is ${textIn(context, 'speed', -mean)}`
        : '';
    return {
      message: `Gusts of ${textIn(context, 'speed', gust.speed)}, ${textIn(context, 'speed', gust.speed - gust.mean)} over the mean wind. ${counted}${tail}.`,
      at: '/weather/wind/gust',
      value: { kind: 'speed', value: gust.speed },
    };
  },
};
