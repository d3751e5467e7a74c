import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** A place after lift-off at which the aeroplane does not climb on the engines that remain. */
export const engineOutClimbNotPositive: CautionTest<TakeoffContext> = {
  code: 'engine-out-climb-not-positive',
  severity: 'strong',
  meaning: 'With one engine out the aeroplane does not climb at lift-off, at 400 ft or at 1 500 ft above the runway.',
  threshold: { kind: 'gradient', value: 0 },
  source: 'AndersonPerformance',
  test: (context) => {
    const lost = context.engineFailure?.climb.filter(({ gradient }) => gradient <= 0) ?? [];
    const [first] = lost;
    if (first === undefined) return undefined;
    const each = lost.map(
      ({ height, gradient }) =>
        `${percentText(gradient, 2)} ${height === 0 ? 'at lift-off' : `at ${textIn(context, 'altitude', height)} above the runway`}`,
    );
    return {
      message: `With one engine out the climb gradient is ${each.join(', ')}: no height is gained there.`,
      at: '/mass',
      value: { kind: 'gradient', value: first.gradient },
    };
  },
};
