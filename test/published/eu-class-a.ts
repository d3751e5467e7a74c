import { figures } from './figures.ts';

/** The usable part of LDA on a dry runway. */
export const usableParts = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.230 / .255; GM2 CAT.POL.A.230 & .235',
    section: 'Table 1',
    status: 'read',
    quantity: 'usable part of LDA, class A',
    unit: '1',
  },
  [
    { id: 'eu-classA-ld-turbojet-dry', inputs: { category: 'twin-jet' } as const, expected: 0.6, tolerance: 0 },
    { id: 'eu-classA-ld-turboprop-dry', inputs: { category: 'twin-turboprop' } as const, expected: 0.7, tolerance: 0 },
  ],
);

/** Not applied: it needs an approval that no question can state. */
export const usablePartsWithApproval = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.230 / .255; GM2 CAT.POL.A.230 & .235',
    section: 'Table 1',
    status: 'read',
    quantity: 'usable part of LDA with approval, class A',
    unit: '1',
  },
  [{ id: 'eu-classA-ld-reduced-dry', inputs: {}, expected: 0.8, tolerance: 0 }],
);

/** The same as factors, as the guidance prints them. */
export const printedFactors = figures(
  {
    source: 'GM2 CAT.POL.A.230 & .235',
    section: 'Table 1',
    status: 'read',
    quantity: 'LDA over the landing distance on a dry runway, class A, rounded as printed',
    unit: '1',
  },
  [
    { id: 'eu-classA-ld-factor-turbojet', inputs: { category: 'twin-jet' } as const, expected: 1.67, tolerance: 0.005 },
    {
      id: 'eu-classA-ld-factor-turboprop',
      inputs: { category: 'twin-turboprop' } as const,
      expected: 1.43,
      tolerance: 0.005,
    },
  ],
);

/** Wet over dry landing distance. */
export const wetFactors = [
  ...figures(
    {
      source: 'Reg. (EU) 965/2012 CAT.POL.A.235',
      section: '(a), 1.15 x required dry',
      status: 'computed',
      quantity: 'LDA over the landing distance on a dry runway, on a wet one, class A',
      unit: '1',
    },
    [
      {
        id: 'eu-classA-wet-turbojet',
        inputs: { category: 'twin-jet' } as const,
        expected: 1.916667,
        tolerance: 1e-6,
      },
    ],
  ),
  ...figures(
    {
      source: 'Reg. (EU) 965/2012 CAT.POL.A.235',
      section: '(a), as printed for turboprops',
      status: 'read',
      quantity: 'LDA over the landing distance on a dry runway, on a wet one, class A',
      unit: '1',
    },
    [
      {
        id: 'eu-classA-wet-turboprop',
        inputs: { category: 'twin-turboprop' } as const,
        expected: 1.64,
        tolerance: 0.005,
      },
    ],
  ),
];

/** What a contaminated runway asks over the landing distance on it. */
export const contaminatedFactors = figures(
  {
    source: 'EU-OPS 1.520(b)',
    section: '(b)',
    status: 'secondary',
    quantity: 'factor on the landing distance on a contaminated runway, class A',
    unit: '1',
  },
  [{ id: 'contaminated', inputs: {}, expected: 1.15, tolerance: 0 }],
);
