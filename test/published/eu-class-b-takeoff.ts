import { figures } from './figures.ts';

const rule = 'Reg. (EU) 965/2012 CAT.POL.A.305(b)';
const overall = {
  source: rule,
  status: 'read',
  quantity: 'factor on unfactored AFM takeoff distance to 50 ft, class B',
  unit: '1',
} as const;

/** The overall factor against each declared distance. */
export const overallFactors = [
  ...figures({ ...overall, section: '(b)(1)' }, [
    {
      id: 'eu-classB-to-tora-no-clearway-stopway',
      inputs: { check: 'takeoff-run', more: 'none' },
      expected: 1.25,
      tolerance: 0,
    },
  ]),
  ...figures({ ...overall, section: '(b)(2)' }, [
    { id: 'eu-classB-to-tora', inputs: { check: 'takeoff-run', more: 'both' }, expected: 1.0, tolerance: 0 },
    { id: 'eu-classB-to-toda', inputs: { check: 'takeoff-distance', more: 'both' }, expected: 1.15, tolerance: 0 },
    { id: 'eu-classB-to-asda', inputs: { check: 'accelerate-stop', more: 'both' }, expected: 1.3, tolerance: 0 },
  ]),
];

const surface = {
  source: 'AMC1 CAT.POL.A.305',
  section: 'Table 1',
  quantity: 'surface factor on takeoff, class B',
  unit: '1',
} as const;

/** The surface's factor. */
export const surfaceFactors = [
  ...figures({ ...surface, status: 'secondary' }, [
    { id: 'eu-classB-to-grass-dry', inputs: { kind: 'grass', state: 'dry' } as const, expected: 1.2, tolerance: 0 },
    { id: 'eu-classB-to-grass-wet', inputs: { kind: 'grass', state: 'wet' } as const, expected: 1.3, tolerance: 0 },
  ]),
  ...figures({ ...surface, status: 'memory' }, [
    { id: 'eu-classB-to-paved-wet', inputs: { kind: 'paved', state: 'wet' } as const, expected: 1.0, tolerance: 0 },
  ]),
];

/** Chains of factors from a takeoff distance to the length that is required. */
export const chains = figures(
  {
    source: 'CAT.POL.A.305, AMC1, AMC2',
    section: 'chain',
    status: 'computed',
    quantity: 'class B required length',
    unit: 'm',
  },
  [
    {
      id: 'eu-ex-to-1',
      inputs: { tod50_m: 400, state: 'dry', slope: 0.01, check: 'takeoff-run', more: 'none' } as const,
      expected: 630,
      tolerance: 0.001,
    },
    {
      id: 'eu-ex-to-2',
      inputs: { tod50_m: 600, state: 'wet', slope: 0, check: 'takeoff-distance', more: 'both' } as const,
      expected: 897,
      tolerance: 0.001,
    },
    {
      id: 'eu-ex-to-3',
      inputs: { tod50_m: 600, state: 'wet', slope: 0, check: 'accelerate-stop', more: 'both' } as const,
      expected: 1014,
      tolerance: 0.001,
    },
  ],
);

/** The factors of class B in one place, as a worked question lists them: takeoff and landing. */
export const listed = figures(
  {
    source: 'CAT.POL.A.305, A.330, A.335 with AMC',
    section: 'REG-3',
    status: 'read',
    quantity: 'factor, class B',
    unit: '1',
  },
  [
    {
      id: 'no_stopway_clearway',
      inputs: { overall: 'takeoff-run', more: 'none' } as const,
      expected: 1.25,
      tolerance: 0,
    },
    { id: 'TORA_with', inputs: { overall: 'takeoff-run', more: 'both' } as const, expected: 1, tolerance: 0 },
    { id: 'TODA', inputs: { overall: 'takeoff-distance', more: 'both' } as const, expected: 1.15, tolerance: 0 },
    { id: 'ASDA', inputs: { overall: 'accelerate-stop', more: 'both' } as const, expected: 1.3, tolerance: 0 },
    { id: 'LDR', inputs: { overall: 'landing-distance', more: 'both' } as const, expected: 1.43, tolerance: 0.005 },
  ],
);

/** The same for surface and slope. */
export const listedOnRunways = figures(
  {
    source: 'CAT.POL.A.305, A.330, A.335 with AMC',
    section: 'REG-3',
    status: 'read',
    quantity: 'product of the factors of the runway, class B',
    unit: '1',
  },
  [
    { id: 'dry_grass_TO', inputs: on('takeoff', 'grass', 'dry', 0), expected: 1.2, tolerance: 0 },
    { id: 'wet_grass_TO', inputs: on('takeoff', 'grass', 'wet', 0), expected: 1.3, tolerance: 0 },
    { id: 'upslope_per_1%', inputs: on('takeoff', 'paved', 'dry', 0.01), expected: 1.05, tolerance: 1e-12 },
    { id: 'no credit downhill', inputs: on('takeoff', 'paved', 'dry', -0.01), expected: 1, tolerance: 0 },
    { id: 'grass_landing', inputs: on('landing', 'grass', 'dry', 0), expected: 1.15, tolerance: 0 },
    { id: 'wet_landing', inputs: on('landing', 'paved', 'wet', 0), expected: 1.15, tolerance: 0 },
    { id: 'downslope_landing_per_1%', inputs: on('landing', 'paved', 'dry', -0.01), expected: 1.05, tolerance: 1e-12 },
    { id: 'no credit uphill', inputs: on('landing', 'paved', 'dry', 0.01), expected: 1, tolerance: 0 },
  ],
);

interface OnRunway {
  readonly phase: 'takeoff' | 'landing';
  readonly kind: 'paved' | 'grass';
  readonly state: 'dry' | 'wet';
  readonly slope: number;
}

function on(phase: OnRunway['phase'], kind: OnRunway['kind'], state: OnRunway['state'], slope: number): OnRunway {
  return { phase, kind, state, slope };
}
