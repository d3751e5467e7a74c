import type { Factor } from '../../answer.ts';
import { dryPavement, wetPavement } from '../named-surfaces.ts';
import type { PhaseRules, Requirement, SlopeRule, SurfaceRule } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { timeOfArrival } from './time-of-arrival.ts';

const overall: Factor = {
  code: 'overall',
  value: 1 / 0.7,
  because: 'a full stop from 50 ft within 70 % of LDA, (a)',
  source: 'EuAirOps430',
  status: 'read',
};

const wet: Factor = {
  code: 'surface',
  value: 1.15,
  because: 'wet runway, damp taken as wet; the rule prints 1.64 with the overall factor in it',
  source: 'EuAirOps430',
  status: 'read',
};

const surfaces: readonly SurfaceRule[] = [
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: [wet] },
];

const slope: SlopeRule = {
  unfavourable: 'downhill',
  factor: {
    code: 'slope',
    value: 1.05,
    because: '5 % of the landing distance for each 1 % of downward slope',
    source: 'EuAirOps430',
    status: 'read',
  },
  step: 0.01,
  growth: 'linear',
};

const requirement: Requirement = {
  code: 'landing-distance',
  of: 'landingDistance',
  against: 'lda',
  factor: overall,
  source: 'EuAirOps430',
};

/** CAT.POL.A.430 and A.435: landing of class C aeroplanes before departure. */
export const euClassCLanding: PhaseRules = {
  source: 'EuAirOps430',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps400', ', (d)(5), taken for landings too'),
  surfaces,
  slope,
  readings: [
    {
      when: 'dry, wet or damp pavement',
      holds: (asked) => dryPavement(asked) || wetPavement(asked),
      requirements: [requirement],
    },
    {
      when: 'any other surface',
      holds: () => true,
      requirements: [{ ...requirement, notAssessed: 'class C has no factor for this surface here' }],
    },
  ],
};

/** CAT.OP.MPA.303: the same in flight, on whatever surface physics speaks of. */
export const euClassCLandingInFlight: PhaseRules = {
  source: 'EuAirOps303',
  stage: 'in-flight',
  windCredit: euClassCLanding.windCredit,
  surfaces: [],
  readings: [
    {
      when: 'always',
      holds: () => true,
      requirements: [{ ...requirement, factor: timeOfArrival, source: 'EuAirOps303' }],
    },
  ],
};
