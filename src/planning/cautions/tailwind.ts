import { takeoff } from '../../performance/takeoff/takeoff.ts';
import type { CautionTest } from './caution-test.ts';
import { type TakeoffContext, textIn } from './takeoff-context.ts';

/** Less than is shown as 0 [m/s]: half of 0.1 kt. */
const shownAsNothing = (0.05 * 1852) / 3600;

/** A tailwind, with what it does to the ground roll. */
export const tailwind: CautionTest<TakeoffContext> = {
  code: 'tailwind',
  severity: 'caution',
  meaning: 'The wind along the runway blows in the direction of movement and lengthens the ground roll.',
  threshold: { kind: 'speed', value: 0 },
  source: 'Judgement',
  test: (context) => {
    const component = -context.wind.headwind;
    if (component < shownAsNothing) return undefined;
    const { run, stated, question } = context;
    const still = run === undefined || stated === undefined ? undefined : takeoff({ ...run, headwind: 0 });
    const effect =
      still?.outcome === 'reaches-screen' && stated !== undefined
        ? ` It lengthens the ground roll from ${textIn(context, 'distance', still.groundRoll)} to ${textIn(context, 'distance', stated.groundRoll)}.`
        : ' It raises the speed over the ground at lift-off by as much.';
    return {
      message: `Tailwind ${textIn(context, 'speed', component)} on runway ${question.runway.designator}.${effect}`,
      at: '/weather/wind',
      value: { kind: 'speed', value: component },
    };
  },
};
