import { boundText } from '../engine-failure/decision-fault.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Limits of the aeroplane that leave no decision speed. */
export const noDecisionSpeed: CautionTest<TakeoffContext> = {
  code: 'no-decision-speed',
  severity: 'strong',
  meaning:
    'The lowest decision speed that the aeroplane allows is above the highest: no speed keeps control, brakes, tyres and rotation together.',
  source: 'Cfr25s107',
  test: (context) => {
    const field = context.engineFailure?.decided?.field;
    if (field?.outcome !== 'no-decision-speed') return undefined;
    const { lowest, highest } = field.bounds;
    return {
      message: `No decision speed: it is at least ${textIn(context, 'speed', lowest.speed)} true airspeed by ${boundText(lowest)}, and at most ${textIn(context, 'speed', highest.speed)} by ${boundText(highest)}.`,
      at: '/mass',
      value: { kind: 'speed', value: lowest.speed },
      threshold: { kind: 'speed', value: highest.speed },
    };
  },
};
