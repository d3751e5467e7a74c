import { figures } from './figures.ts';

/** LDA over the landing distance at the time of arrival. */
export const timeOfArrivalFactors = figures(
  {
    source: 'Reg. (EU) 965/2012 CAT.OP.MPA.303',
    section: '(a)',
    status: 'read',
    quantity: 'LDA over the landing distance at the time of arrival',
    unit: '1',
  },
  [{ id: 'time-of-arrival', inputs: {}, expected: 1.15, tolerance: 0 }],
);

/** The same in the United States. */
export const timeOfArrivalMargins = figures(
  {
    source: 'FAA SAFO 06012',
    section: 'margin',
    status: 'read',
    quantity: 'LDA over the landing distance at the time of arrival',
    unit: '1',
  },
  [{ id: 'margin', inputs: {}, expected: 1.15, tolerance: 0 }],
);
