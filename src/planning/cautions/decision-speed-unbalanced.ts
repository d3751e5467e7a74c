import { isField } from '../engine-failure/decided-speed.ts';
import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** The longer of stop and continued takeoff over the balanced field from which a decision speed is far from balanced. */
const far = 0.05;

/** A decision speed asked for that makes the field longer than it need be. */
export const decisionSpeedUnbalanced: CautionTest<TakeoffContext> = {
  code: 'decision-speed-unbalanced',
  severity: 'note',
  meaning:
    'At the decision speed asked for the longer of stop and continued takeoff is more than 5 % longer than the balanced field.',
  threshold: far,
  source: 'Judgement',
  test: (context) => {
    const { decision, decided, engineOut } = context.engineFailure ?? {};
    const balanced = engineOut?.balancedFieldLength;
    if (decision?.because !== 'asked-for' || balanced === undefined || decided === undefined) return undefined;
    const longer = Math.max(engineOut?.accelerateStopDistance?.value ?? 0, engineOut?.accelerateGoDistance?.value ?? 0);
    const over = longer / balanced.value - 1;
    if (!(over > far) || !isField(decided.field)) return undefined;
    return {
      message: `At the decision speed of ${textIn(context, 'speed', decision.cas)} calibrated the longer of stop and continued takeoff is ${textIn(context, 'distance', longer)}, ${percentText(over)} more than the ${textIn(context, 'distance', balanced.value)} at ${textIn(context, 'speed', decided.field.speed)} true airspeed.`,
      at: '/decisionSpeed',
      value: over,
    };
  },
};
