import { deepestWet, filmAsWet, looseContaminant } from '../../physics/runway-surface.ts';
import { depthText, surfaceText } from '../sentences/surface-text.ts';
import type { ConditionsContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Water, slush or snow no deeper than 3 mm, which is computed as a wet runway. */
export const filmCountsAsWet: CautionTest<ConditionsContext> = {
  code: 'film-counts-as-wet',
  severity: 'note',
  meaning: 'Water, slush or snow of no more than 3 mm counts as a wet runway and holds no wheel back.',
  threshold: { kind: 'depth', value: deepestWet },
  source: 'Rcam',
  test: ({ question: { runway } }) => {
    const { contaminant } = runway.surface;
    if (contaminant?.depth === undefined || looseContaminant(runway.surface) === undefined) return undefined;
    if (filmAsWet(runway.surface).contaminant !== undefined) return undefined;
    return {
      message: `The runway counts as wet under ${depthText(contaminant.depth)} of ${surfaceText(contaminant.kind)}, since that is no more than ${depthText(deepestWet)}; any deeper it holds the wheels back and brakes far worse.`,
      at: '/runway/surface/contaminant/depth',
      value: { kind: 'depth', value: contaminant.depth },
    };
  },
};
