import type { Factor } from '../../answer.ts';
import {
  dryGrass,
  dryPavement,
  shortWetGrass,
  snow,
  softGrass,
  softGround,
  wetGrass,
  wetPavement,
} from '../named-surfaces.ts';
import type { NotApplied, PhaseRules, Requirement, SlopeRule, SurfaceRule } from '../rule-set.ts';
import { veryShortWetGrass, veryShortWetGrassFactor } from '../very-short-wet-grass.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

function factor(code: string, value: number, because: string, status: string): Factor {
  return { code, value, because, source: 'UkSafetySense', status };
}

const onDryGrass: Factor = {
  ...factor('surface', 1.2, 'dry grass up to 20 cm, as an older circular prints it', 'secondary'),
  source: 'UkAic67s2002',
};
const asTheLeafletPrints = factor('surface', 1.15, 'dry grass up to 20 cm, as the leaflet prints it', 'secondary');
const onWetGrass = factor('surface', 1.35, 'wet grass up to 20 cm, damp taken as wet', 'secondary');
const onShortWetGrass = factor(
  veryShortWetGrass,
  veryShortWetGrassFactor,
  'very short wet grass may take up to 60 % more, in place of 1.35 for wet grass',
  'memory',
);
const onWetPavement = factor('surface', 1.15, 'wet pavement, damp taken as wet', 'memory');
const onSoft: Factor = { ...factor('soft-ground', 1.25, 'soft ground or snow: 25 % or more', 'memory'), atLeast: true };

const surfaces: readonly SurfaceRule[] = [
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: [onWetPavement] },
  { when: 'dry grass up to 20 cm on firm soil', holds: dryGrass, factors: [onDryGrass] },
  { when: 'wet or damp grass said to be short, on firm soil', holds: shortWetGrass, factors: [onShortWetGrass] },
  { when: 'wet or damp grass up to 20 cm on firm soil', holds: wetGrass, factors: [onWetGrass] },
  { when: 'dry grass on soft ground', holds: softGrass('dry'), factors: [onDryGrass, onSoft] },
  { when: 'wet or damp grass on soft ground', holds: softGrass('wet'), factors: [onWetGrass, onSoft] },
  { when: 'any other soft ground', holds: softGround, factors: [onSoft] },
  { when: 'snow', holds: snow, factors: [onSoft] },
];

const slope: SlopeRule = {
  unfavourable: 'downhill',
  factor: factor('slope', 1.1, '10 % for 2 % of downward slope', 'secondary'),
  step: 0.02,
  growth: 'larger-of-linear-and-compound',
};

const requirement: Requirement = {
  code: 'landing-distance',
  of: 'landingDistance',
  against: 'lda',
  factor: factor('overall', 1.43, 'safety factor on distances without factors', 'memory'),
  source: 'UkSafetySense',
};

const computed = 'this service computes it';
const notApplied: readonly NotApplied[] = [
  { factor: factor('mass', 1.1, 'each 10 % of mass', 'secondary'), why: computed },
  { factor: factor('elevation', 1.05, 'each 1 000 ft of elevation', 'secondary'), why: computed },
  { factor: factor('temperature', 1.05, 'each 10 degC', 'secondary'), why: computed },
  { factor: factor('tailwind', 1.2, 'each tailwind of 10 % of the touchdown speed', 'secondary'), why: computed },
];

/** The UK factors for private flights, landing; they multiply together. */
export const ukPrivateFactorsLanding: PhaseRules = {
  source: 'UkSafetySense',
  windCredit: halfAndOneAndAHalf('Judgement'),
  surfaces,
  slope,
  readings: [
    {
      when: 'dry grass',
      holds: (asked) => dryGrass(asked) || softGrass('dry')(asked),
      requirements: [
        {
          ...requirement,
          alternatives: [{ factor: asTheLeafletPrints, because: 'the leaflet prints 1.15 for dry grass' }],
        },
      ],
    },
    { when: 'any other surface', holds: () => true, requirements: [requirement] },
  ],
  notApplied,
};
