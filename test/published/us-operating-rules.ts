import { figures } from './figures.ts';

const usable = { quantity: 'usable part of the effective length', unit: '1' } as const;

/** What decides before departure. */
export const destinations = [
  ...figures({ ...usable, source: '14 CFR 121.195(b)', section: '(b)', status: 'read' }, [
    { id: 'far-121195b', inputs: { set: 'us-part-121', category: 'twin-jet' } as const, expected: 0.6, tolerance: 0 },
  ]),
  ...figures({ ...usable, source: '14 CFR 135.385(b)', section: '(b)', status: 'read' }, [
    { id: 'far-135385b', inputs: { set: 'us-part-135', category: 'twin-jet' } as const, expected: 0.6, tolerance: 0 },
  ]),
];

/** Destinations that are not confirmed. */
export const destinationsRecalled = [
  ...figures({ ...usable, source: '14 CFR 135.393', section: '-', status: 'memory' }, [
    { id: 'large nontransport', inputs: { basis: 'none', kilograms: 6000 } as const, expected: 0.6, tolerance: 0 },
  ]),
  ...figures({ ...usable, source: '14 CFR 135.375', section: '-', status: 'memory' }, [
    { id: 'large transport piston', inputs: { basis: 'cs-25', kilograms: 9000 } as const, expected: 0.6, tolerance: 0 },
  ]),
];

/** The factor of a wet or slippery destination on the length before it, turbojets alone. */
export const wetFactors = figures(
  {
    source: '14 CFR 121.195(d); 135.385(d)',
    section: '(d)',
    status: 'secondary',
    quantity: 'factor of a wet runway on the (b) length, turbojet',
    unit: '1',
  },
  [
    { id: 'far-121195d', inputs: { set: 'us-part-121' } as const, expected: 1.15, tolerance: 0 },
    { id: 'far-121195d', inputs: { set: 'us-part-135' } as const, expected: 1.15, tolerance: 0 },
  ],
);

/** Shown beside: at an alternate. */
export const alternates = [
  ...figures({ ...usable, source: '14 CFR 135.387(a)', section: '(a)', status: 'read' }, [
    {
      id: 'far-135387a-tp',
      inputs: { set: 'us-part-135', category: 'twin-turboprop', basis: 'cs-25' } as const,
      expected: 0.7,
      tolerance: 0,
    },
  ]),
  ...figures({ ...usable, source: '14 CFR 135.395', section: '-', status: 'read' }, [
    {
      id: 'far-135395',
      inputs: { set: 'us-part-135', category: 'twin-turboprop', basis: 'none' } as const,
      expected: 0.7,
      tolerance: 0,
    },
  ]),
  ...figures({ ...usable, source: '14 CFR 135.377', section: '-', status: 'read' }, [
    {
      id: '135.377',
      inputs: { set: 'us-part-135', category: 'twin-piston', basis: 'cs-25' } as const,
      expected: 0.7,
      tolerance: 0,
    },
  ]),
  ...figures({ ...usable, source: '14 CFR 121.195(c), 121.197', section: '-', status: 'memory' }, [
    {
      id: '121.197-tp',
      inputs: { set: 'us-part-121', category: 'twin-turboprop', basis: 'cs-25' } as const,
      expected: 0.7,
      tolerance: 0,
    },
  ]),
];

/** The same part at an alternate as at a destination: nothing to show beside it. */
export const jetAlternates = figures({ ...usable, source: '14 CFR 135.387(a)', section: '(a)', status: 'read' }, [
  { id: 'far-135387a-tj', inputs: { set: 'us-part-135' } as const, expected: 0.6, tolerance: 0 },
]);

/** Not applied: for operations that no question can state. */
export const otherOperations = [
  ...figures({ ...usable, source: '14 CFR 135.387(b)', section: '(b)', status: 'read' }, [
    { id: 'far-135387b', inputs: { set: 'us-part-135' } as const, expected: 0.8, tolerance: 0 },
  ]),
  ...figures({ ...usable, source: '14 CFR 91.1037(b)', section: '(b)', status: 'read' }, [
    { id: 'far-911037b', inputs: { set: 'us-part-91' } as const, expected: 0.6, tolerance: 0 },
  ]),
];

/** A landing distance and the runway it needs. */
export const requiredRunways = figures(
  {
    source: '14 CFR 135.385(b)',
    section: 'worked example',
    status: 'secondary',
    quantity: 'required runway under the 60 % rule',
    unit: 'ft',
  },
  [{ id: 'far-ex-1', inputs: { ld_ft: 3600 }, expected: 6000, tolerance: 0.01 }],
);

/** Worked question of dispatch factors, as factors. */
export const dispatchFactors = figures(
  {
    source: '14 CFR 121.195(b), (d)',
    section: 'REG-6, p. 329 of the copy',
    status: 'read',
    quantity: 'jet dispatch landing factor, rounded as printed',
    unit: '1',
  },
  [
    { id: 'REG-6', inputs: { state: 'dry' } as const, expected: 1.67, tolerance: 0.005 },
    { id: 'REG-6', inputs: { state: 'wet' } as const, expected: 1.92, tolerance: 0.005 },
  ],
);
