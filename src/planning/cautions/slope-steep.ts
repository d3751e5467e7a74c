import type { Question } from '../question.ts';
import { percentText } from '../sentences/measure-text.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Slope beyond which the factor of the rules needs data accepted by the authority. */
const steep = 0.02;

/** The slope, or of a profile the one furthest from level. */
function steepestOf({ slope, profile }: Question['runway']): number {
  if (profile === undefined) return slope;
  return profile.slopes.reduce((steepest, one) => (Math.abs(one) > Math.abs(steepest) ? one : steepest));
}

/** A runway steeper than rules and data are made for. */
export const slopeSteep: CautionTest<AnswerContext> = {
  code: 'slope-steep',
  severity: 'caution',
  meaning: 'The runway slopes by more than 2 %, beyond which factors and most manuals do not speak.',
  threshold: { kind: 'gradient', value: steep },
  source: 'EuAirOps305Amc2',
  test: ({ question: { runway }, phase }) => {
    const slope = steepestOf(runway);
    if (Math.abs(slope) <= steep + 1e-9) return undefined;
    const way = slope > 0 ? 'uphill' : 'downhill';
    const weight = percentText(Math.abs(slope), 2);
    const where = runway.profile === undefined ? 'Runway' : 'A stretch of runway';
    return {
      message: `${where} ${runway.designator} slopes ${weight} ${way} in the direction of movement. ${way === 'uphill' ? 'Uphill' : 'Downhill'} ${weight} of the weight acts along the runway ${way === 'uphill' ? 'against' : 'with'} the ${phase}; factors for slope are meant for up to 2 %.`,
      at: '/runway/slope',
      value: { kind: 'gradient', value: slope },
    };
  },
};
