import type { Factor } from '../../answer.ts';
import { clearwayShare } from '../clearway-share.ts';
import { dryGrass, dryPavement, snow, softGrass, softGround, wetGrass, wetPavement } from '../named-surfaces.ts';
import type { NotApplied, Requirement, SlopeRule, SurfaceRule, TakeoffRules } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

function factor(code: string, value: number, because: string, status: string): Factor {
  return { code, value, because, source: 'UkSafetySense', status };
}

const onDryGrass = factor('surface', 1.2, 'dry grass up to 20 cm', 'secondary');
const onWetGrass = factor('surface', 1.3, 'wet grass up to 20 cm, damp taken as wet', 'secondary');
const onWetPavement = factor('surface', 1, 'wet pavement: no factor', 'memory');
const onSoft: Factor = { ...factor('soft-ground', 1.25, 'soft ground or snow: 25 % or more', 'memory'), atLeast: true };

const surfaces: readonly SurfaceRule[] = [
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: [onWetPavement] },
  { when: 'dry grass up to 20 cm on firm soil', holds: dryGrass, factors: [onDryGrass] },
  { when: 'wet or damp grass up to 20 cm on firm soil', holds: wetGrass, factors: [onWetGrass] },
  { when: 'dry grass on soft ground', holds: softGrass('dry'), factors: [onDryGrass, onSoft] },
  { when: 'wet or damp grass on soft ground', holds: softGrass('wet'), factors: [onWetGrass, onSoft] },
  { when: 'any other soft ground', holds: softGround, factors: [onSoft] },
  { when: 'snow', holds: snow, factors: [onSoft] },
];

const slope: SlopeRule = {
  unfavourable: 'uphill',
  factor: factor('slope', 1.1, '10 % for 2 % of upward slope', 'secondary'),
  step: 0.02,
  growth: 'larger-of-linear-and-compound',
};

const overall = factor('overall', 1.33, 'safety factor on distances without factors', 'memory');

const requirements: readonly Requirement[] = [
  { code: 'takeoff-run', of: 'groundRoll', against: 'tora', factor: overall, source: 'UkSafetySense' },
  { code: 'takeoff-distance', of: 'takeoffDistance', against: 'toda', factor: overall, source: 'UkSafetySense' },
];

const computed = 'this service computes it';
const notApplied: readonly NotApplied[] = [
  { factor: factor('mass', 1.2, 'each 10 % of mass', 'secondary'), why: computed },
  { factor: factor('elevation', 1.1, 'each 1 000 ft of elevation', 'secondary'), why: computed },
  { factor: factor('temperature', 1.1, 'each 10 degC', 'secondary'), why: computed },
  { factor: factor('tailwind', 1.2, 'each tailwind of 10 % of the lift-off speed', 'secondary'), why: computed },
];

/** The UK factors for private flights, takeoff; they multiply together. */
export const ukPrivateFactorsTakeoff: TakeoffRules = {
  source: 'UkSafetySense',
  windCredit: halfAndOneAndAHalf('Judgement'),
  surfaces,
  slope,
  readings: [{ when: 'always', holds: () => true, requirements }],
  notApplied,
  clearwayShare,
  nothingBeyond: 'the check of a length that is not declared is not assessed',
};
