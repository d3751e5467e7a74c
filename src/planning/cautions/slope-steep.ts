import { percentText } from '../sentences/measure-text.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Slope beyond which the factor of the rules needs data accepted by the authority. */
const steep = 0.02;

/** A runway steeper than rules and data are made for. */
export const slopeSteep: CautionTest<AnswerContext> = {
  code: 'slope-steep',
  severity: 'caution',
  meaning: 'The runway slopes by more than 2 %, beyond which factors and most manuals do not speak.',
  threshold: { kind: 'gradient', value: steep },
  source: 'EuAirOps305Amc2',
  test: ({ question: { runway }, phase }) => {
    if (Math.abs(runway.slope) <= steep + 1e-9) return undefined;
    const way = runway.slope > 0 ? 'uphill' : 'downhill';
    const weight = percentText(Math.abs(runway.slope), 2);
    return {
      message: `Runway ${runway.designator} slopes ${weight} ${way} in the direction of movement. ${way === 'uphill' ? 'Uphill' : 'Downhill'} ${weight} of the weight acts along the runway ${way === 'uphill' ? 'against' : 'with'} the ${phase}; factors for slope are meant for up to 2 %.`,
      at: '/runway/slope',
      value: { kind: 'gradient', value: runway.slope },
    };
  },
};
