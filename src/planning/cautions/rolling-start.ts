import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A takeoff that does not begin from standing at full power. */
export const rollingStart: CautionTest<TakeoffContext> = {
  code: 'rolling-start',
  severity: 'note',
  meaning: 'The takeoff begins with a rolling start; what it takes over one from standing is added to the ground roll.',
  source: 'Judgement',
  test: (context) => {
    const { rollingStartAllowance: allowance } = context;
    if (allowance === 0) return undefined;
    return {
      message: `Rolling start: ${textIn(context, 'distance', allowance)} are added to the ground roll of one from standing at full power.`,
      at: '/procedure/start',
      value: { kind: 'distance', value: allowance },
    };
  },
};
