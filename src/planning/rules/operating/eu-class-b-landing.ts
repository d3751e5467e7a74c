import type { Factor } from '../../answer.ts';
import type { Surface } from '../../question.ts';
import type { PhaseRules, Requirement } from '../rule-set.ts';

/** Code of the factor on very short wet grass; it stands for grass and wet together. */
export const veryShortWetGrass = 'very-short-wet-grass';
/** What landing on very short wet grass may need over landing on a paved, dry runway. @see references.EuAirOps335Gm1, (a) */
export const veryShortWetGrassFactor = 1.6;

const grass = surface(1.15, 'grass up to 20 cm on firm soil', 'EuAirOps330Amc1', 'secondary');
const wet = surface(1.15, 'wet runway', 'EuAirOps335', 'read');
const damp = surface(1.15, 'damp runway, taken as wet', 'EuAirOps335', 'read');
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

/** The surface's factors, none for dry pavement, undefined where the rules do not speak of the surface. */
function surfaceFactors({ kind, state, firmness, grass: length, contaminant }: Surface): readonly Factor[] | undefined {
  if (contaminant !== undefined) return undefined;
  const isDry = state === 'dry';
  if (!isDry && state !== 'wet' && state !== 'damp') return undefined;
  const moisture = isDry ? [] : [state === 'wet' ? wet : damp];
  if (kind === 'paved') return moisture;
  if (kind !== 'grass' || firmness === 'soft') return undefined;
  return !isDry && length === 'short' ? [shortWetGrass] : [grass, ...moisture];
}

/** Five per cent a per cent of downward slope, linear; uphill earns nothing. */
function slopeFactor(slope: number): readonly Factor[] {
  if (slope >= 0) return [];
  return [
    {
      code: 'slope',
      value: 1 - 5 * slope,
      because: '5 % of the landing distance for each 1 % of downward slope',
      source: 'EuAirOps330Amc2',
      status: 'secondary',
    },
  ];
}

const requirements: readonly Requirement[] = [
  {
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
  },
];

/** CAT.POL.A.330 and A.335: landing of class B aeroplanes, on dry and on wet runways. */
export const euClassBLanding: PhaseRules = {
  source: 'EuAirOps330',
  startsFrom: 'reference',
  runwayFactors: (surface, slope) => {
    const factors = surfaceFactors(surface);
    return factors === undefined ? undefined : [...factors, ...slopeFactor(slope)];
  },
  requirements: () => requirements,
};
