import { figures } from './figures.ts';

/** The usable part of LDA. */
export const usableParts = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.330(a); CAT.POL.A.430',
    section: '(a)',
    status: 'read',
    quantity: 'usable part of LDA, class B and C',
    unit: '1',
  },
  [{ id: 'eu-classB-ld-70', inputs: {}, expected: 0.7, tolerance: 0 }],
);

/** Not offered: it needs an approval that no question can state. */
export const usablePartsWithApproval = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.POL.A.330(b)/.355',
    section: '(b)',
    status: 'read',
    quantity: 'usable part of LDA with reduced-landing-distance approval, class B',
    unit: '1',
  },
  [{ id: 'eu-classB-ld-80', inputs: {}, expected: 0.8, tolerance: 0 }],
);

const quantity = 'factor on the landing distance, class B';

/** The surface's factors. */
export const surfaceFactors = [
  ...figures({ source: 'AMC1 CAT.POL.A.330', section: 'table', status: 'secondary', quantity, unit: '1' }, [
    { id: 'eu-classB-ld-grass', inputs: { kind: 'grass', state: 'dry' } as const, expected: 1.15, tolerance: 0 },
  ]),
  ...figures(
    {
      source: 'CAT.POL.A.335(a); GM1 CAT.POL.A.335(b)',
      section: '(a)',
      status: 'read',
      quantity,
      unit: '1',
    },
    [{ id: 'eu-classB-ld-wet', inputs: { kind: 'paved', state: 'wet' } as const, expected: 1.15, tolerance: 0 }],
  ),
  ...figures({ source: 'GM1 CAT.POL.A.335(a)', section: '(a)', status: 'read', quantity, unit: '1' }, [
    {
      id: 'eu-classB-ld-short-wet-grass',
      inputs: { kind: 'grass', state: 'wet', grass: 'short' } as const,
      expected: 1.6,
      tolerance: 0,
    },
  ]),
];

/** Chains of factors from a landing distance to the LDA that is required. */
export const chains = figures(
  {
    source: 'CAT.POL.A.330/.335, AMC1, AMC2',
    section: 'chain',
    status: 'computed',
    quantity: 'class B required LDA',
    unit: 'm',
  },
  [
    {
      id: 'eu-ex-ld-1',
      inputs: { ld50_m: 500, kind: 'grass', state: 'dry', slope: 0 } as const,
      expected: 821.4286,
      tolerance: 0.001,
    },
    {
      id: 'eu-ex-ld-2',
      inputs: { ld50_m: 500, kind: 'grass', state: 'wet', slope: -0.01 } as const,
      expected: 991.875,
      tolerance: 0.001,
    },
  ],
);
