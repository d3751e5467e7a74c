import { figures } from './figures.ts';

/** The overall factor on the takeoff distance to 50 ft with all engines, against TORA. */
export const takeoffFactors = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.400(b)',
    section: '(b)',
    status: 'read',
    quantity: 'factor on the all-engines distance to 50 ft against TORA, class C',
    unit: '1',
  },
  [
    { id: 'eu-classC-to-2eng', inputs: { engines: 2 }, expected: 1.33, tolerance: 0 },
    { id: 'eu-classC-to-3eng', inputs: { engines: 3 }, expected: 1.25, tolerance: 0 },
    { id: 'eu-classC-to-4eng', inputs: { engines: 4 }, expected: 1.18, tolerance: 0 },
  ],
);

/** Wet runway, as printed with the overall factor in it. */
export const wetFactors = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.430',
    section: 'wet',
    status: 'read',
    quantity: 'LDA over the landing distance on a dry runway, on a wet one, class C',
    unit: '1',
  },
  [{ id: 'wet', inputs: {}, expected: 1.64, tolerance: 0.005 }],
);

/** Slope, in a straight line, for one per cent. */
export const slopeFactors = [
  ...figures(
    {
      source: 'Reg. (EU) 965/2012 CAT.POL.A.430 with AMC',
      section: 'slope',
      status: 'read',
      quantity: 'factor on the landing distance for 1 % of slope, class C',
      unit: '1',
    },
    [{ id: 'downhill', inputs: { phase: 'landing', slope: -0.01 } as const, expected: 1.05, tolerance: 1e-12 }],
  ),
  ...figures(
    {
      source: 'Reg. (EU) 965/2012 CAT.POL.A.400 with AMC',
      section: 'slope',
      status: 'memory',
      quantity: 'factor on the takeoff distance for 1 % of slope, class C',
      unit: '1',
    },
    [{ id: 'uphill', inputs: { phase: 'takeoff', slope: 0.01 } as const, expected: 1.05, tolerance: 1e-12 }],
  ),
];
