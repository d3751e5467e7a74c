import { figures } from './figures.ts';

/** Magnus form over water. */
export const magnus = figures(
  {
    source: 'WMO-No. 8 (CIMO Guide) Annex 4.B',
    section: 'pure-phase water',
    status: 'computed',
    quantity: 'saturation vapour pressure, WMO Magnus form 6.112 exp(17.62 t/(243.12+t))',
    unit: 'hPa',
  },
  [
    { id: 'svp-magnus-10', inputs: { t_C: 10 }, expected: 12.2603, tolerance: 0.0005 },
    { id: 'svp-magnus-15', inputs: { t_C: 15 }, expected: 17.0167, tolerance: 0.0005 },
    { id: 'svp-magnus-25', inputs: { t_C: 25 }, expected: 31.6006, tolerance: 0.0005 },
    { id: 'svp-magnus-30', inputs: { t_C: 30 }, expected: 42.3372, tolerance: 0.0005 },
    { id: 'svp-magnus-35', inputs: { t_C: 35 }, expected: 56.1284, tolerance: 0.0005 },
  ],
);

/** Buck 1981 without the enhancement factor. */
export const buck1981 = figures(
  {
    source: 'Buck 1981, J. Appl. Meteor. 20:1527',
    section: 'eq. (8) without enhancement factor',
    status: 'computed',
    quantity: 'saturation vapour pressure, Buck 1981 6.1121 exp(17.502 t/(240.97+t))',
    unit: 'hPa',
  },
  [
    { id: 'svp-buck81-0', inputs: { t_C: 0 }, expected: 6.1121, tolerance: 0.0005 },
    { id: 'svp-buck81-10', inputs: { t_C: 10 }, expected: 12.276, tolerance: 0.0005 },
    { id: 'svp-buck81-15', inputs: { t_C: 15 }, expected: 17.0457, tolerance: 0.0005 },
    { id: 'svp-buck81-30', inputs: { t_C: 30 }, expected: 42.4351, tolerance: 0.0005 },
    { id: 'svp-buck81-35', inputs: { t_C: 35 }, expected: 56.2591, tolerance: 0.0005 },
    { id: 'svp-buck81-40', inputs: { t_C: 40 }, expected: 73.8418, tolerance: 0.0005 },
  ],
);

/** Smithsonian table 94, recalled. */
export const goffGratch = figures(
  {
    source: 'Smithsonian Meteorological Tables (Goff-Gratch 1946)',
    section: 'Table 94',
    status: 'memory',
    quantity: 'saturation vapour pressure over water',
    unit: 'hPa',
    note: 'tolerance 0.3 % covers Magnus(17.62,243.12), Buck 1981 and CIPM curves',
  },
  [
    { id: 'svp-goffgratch-0', inputs: { t_C: 0 }, expected: 6.1078, tolerance: 0.0183 },
    { id: 'svp-goffgratch-5', inputs: { t_C: 5 }, expected: 8.7192, tolerance: 0.0262 },
    { id: 'svp-goffgratch-10', inputs: { t_C: 10 }, expected: 12.272, tolerance: 0.0368 },
    { id: 'svp-goffgratch-15', inputs: { t_C: 15 }, expected: 17.044, tolerance: 0.0511 },
    { id: 'svp-goffgratch-25', inputs: { t_C: 25 }, expected: 31.671, tolerance: 0.095 },
    { id: 'svp-goffgratch-30', inputs: { t_C: 30 }, expected: 42.43, tolerance: 0.1273 },
    { id: 'svp-goffgratch-35', inputs: { t_C: 35 }, expected: 56.237, tolerance: 0.1687 },
    { id: 'svp-goffgratch-40', inputs: { t_C: 40 }, expected: 73.777, tolerance: 0.2213 },
    { id: 'svp-goffgratch-45', inputs: { t_C: 45 }, expected: 95.855, tolerance: 0.2876 },
    { id: 'svp-goffgratch-50', inputs: { t_C: 50 }, expected: 123.4, tolerance: 0.3702 },
  ],
);
