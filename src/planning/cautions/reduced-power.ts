import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A takeoff below full power, with what it costs. */
export const reducedPower: CautionTest<TakeoffContext> = {
  code: 'reduced-power',
  severity: 'note',
  meaning: 'The takeoff is computed below full power, as the procedure asks.',
  threshold: 1,
  source: 'Judgement',
  test: (context) => {
    const { fullPowerRatio, stated } = context;
    if (fullPowerRatio === 1) return undefined;
    const full = stated && context.wholeAtFullPower();
    const effect =
      full === undefined || stated === undefined
        ? ''
        : ` It lengthens the takeoff distance from ${textIn(context, 'distance', full)} to ${textIn(context, 'distance', stated.takeoffDistance)}.`;
    return {
      message: `The takeoff is at ${percentText(fullPowerRatio)} of full power.${effect}`,
      at: '/procedure/power',
      value: fullPowerRatio,
    };
  },
};
