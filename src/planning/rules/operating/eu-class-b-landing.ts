import type { Factor } from '../../answer.ts';
import { dryGrass, dryPavement, shortWetGrass as isShortWetGrass, wetGrass, wetPavement } from '../named-surfaces.ts';
import type { Asked, ClimbDemand, PhaseRules, Reading, Requirement, SlopeRule, SurfaceRule } from '../rule-set.ts';
import { veryShortWetGrass, veryShortWetGrassFactor } from '../very-short-wet-grass.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { timeOfArrival } from './time-of-arrival.ts';

const grass = surface(1.15, 'grass up to 20 cm on firm soil', 'EuAirOps330Amc1', 'secondary');
const wet = surface(1.15, 'wet runway, damp taken as wet', 'EuAirOps335', 'read');
const shortWetGrass: Factor = {
  code: veryShortWetGrass,
  value: veryShortWetGrassFactor,
  because: 'short wet grass on firm subsoil may be as slippery as ice, in place of 1.15 for grass and 1.15 for wet',
  source: 'EuAirOps335Gm1',
  status: 'read',
};

function surface(value: number, because: string, source: Factor['source'], status: string): Factor {
  return { code: 'surface', value, because, source, status };
}

const surfaces: readonly SurfaceRule[] = [
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: [wet] },
  { when: 'dry grass up to 20 cm on firm soil', holds: dryGrass, factors: [grass] },
  { when: 'wet or damp grass said to be short, on firm soil', holds: isShortWetGrass, factors: [shortWetGrass] },
  { when: 'wet or damp grass up to 20 cm on firm soil', holds: wetGrass, factors: [grass, wet] },
];

const slope: SlopeRule = {
  unfavourable: 'downhill',
  factor: {
    code: 'slope',
    value: 1.05,
    because: '5 % of the landing distance for each 1 % of downward slope',
    source: 'EuAirOps330Amc2',
    status: 'secondary',
  },
  step: 0.01,
  growth: 'linear',
};

const requirement: Requirement = {
  code: 'landing-distance',
  of: 'landingDistance',
  against: 'lda',
  factor: {
    code: 'overall',
    value: 1 / 0.7,
    because: 'a full stop from 50 ft within 70 % of LDA, (a)',
    source: 'EuAirOps330',
    status: 'read',
  },
  source: 'EuAirOps330',
};

const inFlight: Requirement = {
  ...requirement,
  onRunway: timeOfArrival,
  runwayDecides:
    'the length required before departure, in place of 115 % where there are no data for the time of arrival, (b) and (c)',
  source: 'EuAirOps303',
};

const always = (one: Requirement): readonly Reading[] => [{ when: 'always', holds: () => true, requirements: [one] }];

const twin = {
  of: 'balked-landing',
  appliesTo: ({ engines }: Asked['aeroplane']) => engines > 1,
  when: 'more than one engine',
  source: 'EuAirOps340',
  status: 'memory',
} as const;

const demands: readonly ClimbDemand[] = [
  {
    ...twin,
    code: 'climb-balked-landing-all-engines',
    engines: 'all',
    gradient: 0.025,
    configuration: 'landing flap, gear down, full power, at the landing reference speed',
  },
  {
    ...twin,
    code: 'climb-balked-landing-engine-out',
    engines: 'one-out',
    gradient: 0.0075,
    atHeight: 1500 * 0.3048,
    configuration: 'with one engine out, 1 500 ft above the runway',
  },
];

/** CAT.POL.A.330, A.335 and A.340: landing of class B aeroplanes, on dry and on wet runways, before departure. */
export const euClassBLanding: PhaseRules = {
  source: 'EuAirOps330',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps330', ', (c)(2)'),
  surfaces,
  slope,
  readings: always(requirement),
  demands,
  notApplied: [
    {
      factor: {
        code: 'overall',
        value: 1 / 0.8,
        because: 'a full stop within 80 % of LDA, (b) and A.355',
        source: 'EuAirOps330',
        status: 'read',
      },
      why: 'it needs an approval of the authority that no question can state',
    },
  ],
};

/** CAT.OP.MPA.303: the same in flight. */
export const euClassBLandingInFlight: PhaseRules = {
  ...euClassBLanding,
  source: 'EuAirOps303',
  stage: 'in-flight',
  readings: always(inFlight),
  notApplied: [],
};
