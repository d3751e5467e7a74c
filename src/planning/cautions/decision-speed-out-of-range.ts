import { boundText } from '../engine-failure/decision-fault.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A decision speed asked for from which the aeroplane does not stop, or does not go on, within the declared distances. */
export const decisionSpeedOutOfRange: CautionTest<TakeoffContext> = {
  code: 'decision-speed-out-of-range',
  severity: 'strong',
  meaning:
    'From the decision speed asked for the aeroplane does not stop within ASDA or does not pass the screen within TODA, while from another it does both.',
  source: 'Cfr25s109a',
  test: (context) => {
    const decision = context.engineFailure?.decision;
    if (decision?.because !== 'asked-for' || decision.range === undefined) return undefined;
    const { lowest, highest, lowestBecause, highestBecause } = decision.range;
    const isLow = decision.tas < lowest.tas - 1e-6;
    if (!isLow && decision.tas <= highest.tas + 1e-6) return undefined;
    const [bound, because] = isLow ? [lowest, lowestBecause] : [highest, highestBecause];
    return {
      message: `The decision speed of ${textIn(context, 'speed', decision.cas)} calibrated is ${isLow ? 'below' : 'above'} ${boundText({ because })}, ${textIn(context, 'speed', bound.cas)}: after a failure then the aeroplane does not ${isLow ? 'pass the screen within TODA' : 'stop within ASDA'}.`,
      at: '/decisionSpeed',
      value: { kind: 'speed', value: decision.cas },
      threshold: { kind: 'speed', value: bound.cas },
    };
  },
};
