import { type AnswerContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Less than is shown as 0 [m/s]: half of 0.1 kt. */
const shownAsNothing = (0.05 * 1852) / 3600;

/** A tailwind, with what it does to the ground roll. */
export const tailwind: CautionTest<AnswerContext> = {
  code: 'tailwind',
  severity: 'caution',
  meaning: 'The wind along the runway blows in the direction of movement and lengthens the ground roll.',
  threshold: { kind: 'speed', value: 0 },
  source: 'Judgement',
  test: (context) => {
    const component = -context.wind.headwind;
    if (component < shownAsNothing) return undefined;
    const { phase, roll, question } = context;
    const still = roll === undefined ? undefined : context.rollInStillAir();
    const effect =
      still !== undefined && roll !== undefined
        ? ` It lengthens the ground roll from ${textIn(context, 'distance', still)} to ${textIn(context, 'distance', roll)}.`
        : ` It raises the speed over the ground at ${phase === 'takeoff' ? 'lift-off' : 'touchdown'} by as much.`;
    return {
      message: `Tailwind ${textIn(context, 'speed', component)} on runway ${question.runway.designator}.${effect}`,
      at: '/weather/wind',
      value: { kind: 'speed', value: component },
    };
  },
};
