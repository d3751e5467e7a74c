import type { Factor } from '../../answer.ts';
import { clearwayShare } from '../clearway-share.ts';
import { dryGrass, dryPavement, wetGrass, wetPavement } from '../named-surfaces.ts';
import type { Asked, ClimbDemand, ObstacleDemand, Reading, SlopeRule, SurfaceRule, TakeoffRules } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

function overall(value: number, because: string): Factor {
  return { code: 'overall', value, because, source: 'EuAirOps305', status: 'read' };
}

const runAlone = overall(1.25, 'takeoff distance against TORA where there is neither stopway nor clearway, (b)(1)');
const runWithMore = overall(1, 'takeoff distance against TORA where there is stopway or clearway, (b)(2)(i)');
const distance = overall(1.15, 'takeoff distance against TODA, (b)(2)(ii)');
const stop = overall(1.3, 'takeoff distance against ASDA, (b)(2)(iii)');

function surface(value: number, because: string, status: string): readonly Factor[] {
  return [{ code: 'surface', value, because, source: 'EuAirOps305Amc1', status }];
}

const surfaces: readonly SurfaceRule[] = [
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: surface(1, 'wet pavement', 'memory') },
  {
    when: 'dry grass up to 20 cm on firm soil',
    holds: dryGrass,
    factors: surface(1.2, 'dry grass up to 20 cm on firm soil', 'secondary'),
  },
  {
    when: 'wet or damp grass up to 20 cm on firm soil',
    holds: wetGrass,
    factors: surface(1.3, 'wet grass up to 20 cm on firm soil, damp taken as wet', 'secondary'),
  },
];

const slope: SlopeRule = {
  unfavourable: 'uphill',
  factor: {
    code: 'slope',
    value: 1.05,
    because: '5 % of the takeoff distance for each 1 % of upward slope',
    source: 'EuAirOps305Amc2',
    status: 'read',
  },
  step: 0.01,
  growth: 'linear',
};

const shared = { of: 'takeoffDistance', source: 'EuAirOps305' } as const;

function nothingBeyond({ published: { tora, toda, asda } }: Asked): boolean {
  return (toda === undefined && asda === undefined) || (toda === tora && asda === tora);
}

const readings: readonly Reading[] = [
  {
    when: 'neither TODA nor ASDA is declared, or both are TORA',
    holds: nothingBeyond,
    // 1.25 stands here for the stop as well: with (b)(2) that same runway would have to hold 1.30 times the distance as ASDA
    requirements: [{ ...shared, code: 'takeoff-run', against: 'tora', factor: runAlone, presumesDryOrWet: true }],
  },
  {
    when: 'a TODA or ASDA beyond TORA is declared, or one of them alone',
    holds: () => true,
    requirements: [
      {
        ...shared,
        code: 'takeoff-run',
        against: 'tora',
        factor: runWithMore,
        alternatives: [{ factor: runAlone, because: 'the reading without stopway and clearway, (b)(1)' }],
      },
      { ...shared, code: 'takeoff-distance', against: 'toda', factor: distance },
      { ...shared, code: 'accelerate-stop', against: 'asda', factor: stop, presumesDryOrWet: true },
    ],
  },
];

const twin = {
  of: 'takeoff',
  appliesTo: ({ engines }: Asked['aeroplane']) => engines > 1,
  when: 'more than one engine',
  source: 'EuAirOps340',
  status: 'read',
} as const;

const demands: readonly ClimbDemand[] = [
  {
    ...twin,
    code: 'climb-all-engines',
    engines: 'all',
    gradient: 0.04,
    configuration:
      'takeoff flap and power, gear down unless it comes up within 7 s, at the greater of 1.1 times the minimum control and 1.2 times the stall speed',
  },
  {
    ...twin,
    code: 'climb-engine-out-400-ft',
    engines: 'one-out',
    gradient: 0,
    positive: true,
    atHeight: 400 * 0.3048,
    configuration: 'with one engine out, 400 ft above the runway',
  },
  {
    ...twin,
    code: 'climb-engine-out-1500-ft',
    engines: 'one-out',
    gradient: 0.0075,
    atHeight: 1500 * 0.3048,
    configuration: 'with one engine out, 1 500 ft above the runway',
  },
];

/** Multi-engined aeroplanes clear obstacles by 50 ft; the path begins where the required takeoff distance ends. */
const obstacles: ObstacleDemand = {
  code: 'obstacle-all-engines',
  clearance: 50 * 0.3048,
  begins: 'required-distance',
  because: 'the takeoff distance that CAT.POL.A.305(b) requires',
  appliesTo: ({ engines }) => engines > 1,
  source: 'EuAirOps310',
};

/** CAT.POL.A.305 and A.340: takeoff of class B aeroplanes. What is multiplied is the takeoff distance to the screen, also against TORA. */
export const euClassBTakeoff: TakeoffRules = {
  source: 'EuAirOps305',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps305', ', (c)(6)'),
  surfaces,
  slope,
  readings,
  demands,
  obstacles,
  clearwayShare,
  nothingBeyond:
    'where neither TODA nor ASDA is declared there is taken to be none, and 1.25 counts against TORA, (b)(1)',
};
