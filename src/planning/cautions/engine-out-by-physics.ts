import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Distances with an engine failure by physics, beside others by the flight manual. */
export const engineOutByPhysics: CautionTest<TakeoffContext> = {
  code: 'engine-out-by-physics',
  severity: 'note',
  meaning:
    'The distances with all engines are those of the flight manual, and those with an engine failure are computed: no table of it is read for a failure.',
  source: 'Judgement',
  test: (context) => {
    const { found, engineFailure } = context;
    if (found.method !== 'flight-manual' || engineFailure === undefined) return undefined;
    const { other } = found;
    const beside =
      other === undefined
        ? ''
        : ` With all engines physics has ${textIn(context, 'distance', other.distance)}, ${percentText(Math.abs(other.ratio - 1))} ${other.ratio < 1 ? 'less' : 'more'} than the manual.`;
    return {
      message: `The distances with 1 engine out are computed, not read in the flight manual.${beside}`,
      at: '/method',
    };
  },
};
