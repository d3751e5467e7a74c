import type { Factor } from '../../answer.ts';
import type { DeclaredDistances } from '../../declared-distances.ts';
import type { Surface } from '../../question.ts';
import { clearwayShare } from '../clearway-share.ts';
import type { ObstacleDemand, Requirement, TakeoffRules } from '../rule-set.ts';

function overall(code: string, value: number, because: string): Factor {
  return { code, value, because, source: 'EuAirOps305', status: 'read' };
}

const runAlone = overall(
  'overall',
  1.25,
  'takeoff distance against TORA where there is neither stopway nor clearway, (b)(1)',
);
const runWithMore = overall(
  'overall',
  1,
  'takeoff distance against TORA where there is stopway or clearway, (b)(2)(i)',
);
const distance = overall('overall', 1.15, 'takeoff distance against TODA, (b)(2)(ii)');
const stop = overall('overall', 1.3, 'takeoff distance against ASDA, (b)(2)(iii)');

const dryGrass = surface(1.2, 'dry grass up to 20 cm on firm soil', 'secondary');
const wetGrass = surface(1.3, 'wet grass up to 20 cm on firm soil', 'secondary');
const dampGrass = surface(1.3, 'damp grass, taken as wet: grass up to 20 cm on firm soil', 'secondary');
const wetPavement = surface(1, 'wet pavement', 'memory');
const dampPavement = surface(1, 'damp pavement, taken as wet', 'memory');

function surface(value: number, because: string, status: string): Factor {
  return { code: 'surface', value, because, source: 'EuAirOps305Amc1', status };
}

/** The surface's factor, none for dry pavement, undefined where the table does not speak of the surface or of what lies on it. */
function surfaceFactor({ kind, state, firmness, contaminant }: Surface): readonly Factor[] | undefined {
  if (contaminant !== undefined) return undefined;
  if (kind === 'paved') {
    if (state === 'dry') return [];
    return state === 'wet' ? [wetPavement] : state === 'damp' ? [dampPavement] : undefined;
  }
  if (kind !== 'grass' || firmness === 'soft') return undefined;
  if (state === 'dry') return [dryGrass];
  return state === 'wet' ? [wetGrass] : state === 'damp' ? [dampGrass] : undefined;
}

/** Five per cent a per cent of slope, linear; downhill earns nothing. */
function slopeFactor(slope: number): readonly Factor[] {
  if (slope <= 0) return [];
  return [
    {
      code: 'slope',
      value: 1 + 5 * slope,
      because: '5 % of the takeoff distance for each 1 % of upward slope',
      source: 'EuAirOps305Amc2',
      status: 'read',
    },
  ];
}

const shared = { of: 'takeoffDistance', source: 'EuAirOps305' } as const;
const alone: readonly Requirement[] = [{ ...shared, code: 'takeoff-run', against: 'tora', factor: runAlone }];
const withMore: readonly Requirement[] = [
  {
    ...shared,
    code: 'takeoff-run',
    against: 'tora',
    factor: runWithMore,
    alternative: { factor: runAlone, because: 'the reading without stopway and clearway, (b)(1)' },
  },
  { ...shared, code: 'takeoff-distance', against: 'toda', factor: distance },
  { ...shared, code: 'accelerate-stop', against: 'asda', factor: stop, presumesDryOrWet: true },
];

/**
 * CAT.POL.A.305(b): 1.25 against TORA where nothing lies beyond the run; else 1.00, 1.15 and 1.30 against TORA, TODA and ASDA.
 * What is multiplied is the takeoff distance to the screen, also against TORA.
 */
function requirements({ published: { tora, toda, asda } }: DeclaredDistances): readonly Requirement[] {
  const nothingBeyond = (toda === undefined && asda === undefined) || (toda === tora && asda === tora);
  return nothingBeyond ? alone : withMore;
}

/** CAT.POL.A.305: takeoff of class B aeroplanes. */
/** Multi-engined aeroplanes clear obstacles by 50 ft; the path begins where the required takeoff distance ends. */
const obstacles: ObstacleDemand = {
  code: 'obstacle-all-engines',
  clearance: 50 * 0.3048,
  begins: 'required-distance',
  because: 'the takeoff distance that CAT.POL.A.305(b) requires',
  appliesTo: ({ engines }) => engines > 1,
  source: 'EuAirOps310',
};

export const euClassBTakeoff: TakeoffRules = {
  source: 'EuAirOps305',
  startsFrom: 'reference',
  obstacles,
  clearwayShare,
  runwayFactors: (surface, slope) => {
    const factors = surfaceFactor(surface);
    return factors === undefined ? undefined : [...factors, ...slopeFactor(slope)];
  },
  requirements,
};
