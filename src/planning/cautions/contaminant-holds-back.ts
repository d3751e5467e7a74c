import { deepContaminant } from '../../physics/runway-surface.ts';
import { depthText, surfaceText } from '../sentences/surface-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** The drag of what the wheels push aside in a takeoff. */
export const contaminantHoldsBack: CautionTest<TakeoffContext> = {
  code: 'contaminant-holds-back',
  severity: 'caution',
  meaning:
    'Water, slush or snow holds the wheels back in the takeoff roll; its drag is counted by formulas that no flight test of this aeroplane confirms.',
  source: 'Amc25s1591',
  test: (context) => {
    const { contaminantDrag, wheelSpeed, wind } = context;
    const deep = deepContaminant(context.question.runway.surface);
    if (contaminantDrag === undefined || deep?.depth === undefined) return undefined;
    const drag = contaminantDrag * Math.max(0, wheelSpeed.tas - wind.headwind) ** 2;
    return {
      message: `The wheels push aside ${depthText(deep.depth)} of ${surfaceText(deep.kind)}, which holds the aeroplane back by ${textIn(context, 'force', drag)} at lift-off. The drag is counted whole at every speed; a little more depth or an uneven cover lengthens the roll.`,
      at: '/runway/surface/contaminant',
      value: { kind: 'force', value: drag, direction: 'up' },
    };
  },
};
