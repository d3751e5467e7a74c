import { figures } from './figures.ts';

/** The most that counts of a clearway, over the run available. */
export const clearwayShares = figures(
  {
    source: 'CAT.POL.A.400(c)(2); CAT.POL.A.205(b)(2); 14 CFR 135.379(c)(2)',
    section: 'as listed; taken for every set',
    status: 'read',
    quantity: 'clearway that counts, share of TORA',
    unit: '1',
  },
  [{ id: 'clearway-limit', inputs: {}, expected: 0.5, tolerance: 0 }],
);
