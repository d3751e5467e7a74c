import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Figures of an engine failure that rest on what the aeroplane does not state. */
export const engineOutDataMissing: CautionTest<TakeoffContext> = {
  code: 'engine-out-data-missing',
  severity: 'strong',
  meaning:
    'The aeroplane states no minimum control speed, or no braking friction: the figures of an engine failure know no lowest decision speed, or rest on friction that was assumed.',
  source: 'Judgement',
  test: ({ engineFailure }) => {
    const [control, brakes] = [engineFailure?.out.missing[0], engineFailure?.stop.missing[0]];
    if (engineFailure === undefined || (control === undefined && brakes === undefined)) return undefined;
    const parts = [
      ...(control === undefined
        ? []
        : [
            `No minimum control speed is stated (${control}): with 1 engine out control may be lost at any of the decision speeds shown.`,
          ]),
      ...(brakes === undefined
        ? []
        : [`No braking friction is stated (${brakes}): the stop with 1 engine out rests on a usual one.`]),
    ];
    return { message: parts.join(' '), at: control ?? brakes };
  },
};
