import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** An aeroplane that does not get away on the engines that remain. */
export const engineOutCannotContinue: CautionTest<TakeoffContext> = {
  code: 'engine-out-cannot-continue',
  severity: 'strong',
  meaning: 'With one engine out the aeroplane does not reach lift-off, or does not climb to the screen.',
  source: 'HouseEnergyPath',
  test: (context) => {
    const { engineFailure } = context;
    const field = engineFailure?.decided?.field;
    if (engineFailure === undefined || field?.outcome !== 'single-engine-cannot-continue') return undefined;
    const { accelerateStopDistance: stop } = engineFailure.engineOut;
    const { decision } = engineFailure;
    const ahead =
      stop === undefined || decision === undefined
        ? ''
        : ` Rejected at ${textIn(context, 'speed', decision.cas)} calibrated the takeoff ends after ${textIn(context, 'distance', stop.value)}; later there is no distance.`;
    const { why = '' } = engineFailure.checked;
    return {
      message: `${why.charAt(0).toUpperCase()}${why.slice(1)}.${ahead}`,
      at: '/mass',
      value: { kind: 'gradient', value: field.least },
      threshold: { kind: 'gradient', value: 0 },
    };
  },
};
