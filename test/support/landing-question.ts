import type { Aeroplane } from '../../src/performance/aeroplane.ts';
import type { LandingAnswer } from '../../src/planning/answer.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planLanding } from '../../src/planning/plan-landing.ts';
import type { LandingQuestion } from '../../src/planning/question.ts';
import type { Changes } from './takeoff-question.ts';
import { plainQuestion, statedTrainer } from './takeoff-question.ts';

export type LandingChanges = Changes<LandingQuestion>;

const kt = 1852 / 3600;
const psi = 6894.757293168361;

/** The stated trainer with every figure of its landing stated, so that nothing is assumed on dry pavement. */
export const statedLander: Aeroplane = {
  ...statedTrainer,
  masses: { empty: 680, maximumTakeoff: 1050, maximumLanding: 1050 },
  configurations: {
    ...statedTrainer.configurations,
    landing: {
      for: ['landing'],
      flap: Math.PI / 6,
      maximumLift: { kind: 'coefficient', coefficient: 2 },
      groundDragIncrementCoefficient: 0.04,
      airDragIncrementCoefficient: 0.04,
      groundLiftCoefficient: 0.5,
      speeds: {
        landingReference: { kind: 'stall-ratio', ratio: 1.3 },
        touchdown: { kind: 'stall-ratio', ratio: 1.15 },
      },
      approachAngle: Math.PI / 60,
      flareLoadFactor: 1.2,
      floatDecelerationRatio: 0.12,
      freeRollTime: 1,
      idleThrust: 100,
    },
  },
  wheels: { arrangement: 'tricycle', tyrePressure: 30 * psi },
  brakes: { brakingFrictionCoefficient: 0.35, loadFactor: 0.85, antiSkid: 'none' },
};

const { procedure: _, ...common } = plainQuestion;

/** A calm, cool, dry, long, paved runway near sea level: nothing to say but that the method is an estimate. */
export const plainLanding: LandingQuestion = {
  ...common,
  aeroplane: statedLander,
  configuration: 'landing',
  runway: { ...plainQuestion.runway, surface: { kind: 'paved', state: 'dry' }, declared: { lda: 1500 } },
};

export const wetPavement = { kind: 'paved', state: 'wet' } as const;
export const wetGrass = { kind: 'grass', state: 'wet', firmness: 'firm' } as const;

/** A wind along the runway [kt], on the nose positive. */
export const along = (knots: number): LandingChanges => ({
  weather: { wind: { kind: 'components', headwind: knots * kt } },
});

/** The answer, where the question must have one. */
export function landed(question: LandingQuestion): LandingAnswer {
  const answer = planLanding(question);
  if (isRefused(answer))
    throw new Error(answer.refused.map(({ pointer, message }) => `${pointer}: ${message}`).join('; '));
  return answer;
}
