import { measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A decision speed that could be lower but for control on the ground: the stop is the longer. */
export const decisionLimitedByControl: CautionTest<TakeoffContext> = {
  code: 'decision-limited-by-control',
  severity: 'caution',
  meaning:
    'The decision speed is the minimum control speed on the ground, and the stop from it is longer than the continued takeoff.',
  source: 'Cfr25s107',
  test: (context) => {
    const { decided, decision, engineOut } = context.engineFailure ?? {};
    if (decided?.outcome !== 'decided' || decided.because !== 'stop-longer-throughout' || decision === undefined) {
      return undefined;
    }
    if (decided.bounds.lowest.because !== 'minimum-control-speed-on-the-ground') return undefined;
    const { accelerateStopDistance: stop, accelerateGoDistance: go } = engineOut ?? {};
    if (stop === undefined || go === undefined) return undefined;
    return {
      message: `The decision speed of ${textIn(context, 'speed', decision.cas)} calibrated is the minimum control speed on the ground. The stop from it takes ${textIn(context, 'distance', stop.value)}, the continued takeoff ${measureDown(context, go.value)}.`,
      at: '/mass',
      value: { kind: 'speed', value: decision.cas },
    };
  },
};
