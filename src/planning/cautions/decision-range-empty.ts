import { measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A runway on which an engine failure at some speed lets the aeroplane neither stop nor go on in the declared distances. */
export const decisionRangeEmpty: CautionTest<TakeoffContext> = {
  code: 'decision-range-empty',
  severity: 'strong',
  meaning:
    'From no decision speed does the aeroplane both stop within ASDA and pass the screen within TODA: after an engine failure in a band of speeds it does neither.',
  source: 'Cfr25s109a',
  test: (context) => {
    const decided = context.engineFailure?.decided;
    if (decided?.outcome !== 'decided' || decided.range.outcome !== 'no-decision-speed') return undefined;
    const { lowest, highest, shortest } = decided.range;
    const { asda, toda } = context.declared.credited;
    const speed = (si: number) => textIn(context, 'speed', si);
    const goes =
      lowest !== undefined
        ? `goes on within TODA from ${speed(lowest.speed)} true airspeed on`
        : `does not go on within TODA: that takes ${textIn(context, 'distance', shortest?.go ?? 0)}, ${measureDown(context, toda ?? 0)} available`;
    const stops =
      highest !== undefined
        ? `stops within ASDA from up to ${speed(highest.speed)} true airspeed`
        : `does not stop within ASDA: that takes ${textIn(context, 'distance', shortest?.stop ?? 0)}, ${measureDown(context, asda ?? 0)} available`;
    const between =
      lowest !== undefined && highest !== undefined
        ? ` After an engine failure between ${speed(highest.speed)} and ${speed(lowest.speed)} it does neither.`
        : '';
    return { message: `With one engine out the aeroplane ${goes}, and ${stops}.${between}`, at: '/runway/declared' };
  },
};
