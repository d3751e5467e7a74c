import { figures } from './figures.ts';

/** Full-throttle power of a normally aspirated engine over its sea-level power. */
export const gaggFerrar = figures(
  {
    source: 'Gagg & Ferrar, SAE 1934',
    section: 'P/P0 = sigma - (1 - sigma)/7.55 on standard densities',
    status: 'computed',
    quantity: 'power ratio',
    unit: '-',
  },
  [
    { id: 'gf-5000', inputs: { pressureAltitude_ft: 5000, sigma: 0.86167 }, expected: 0.84335, tolerance: 5e-5 },
    { id: 'gf-10000', inputs: { pressureAltitude_ft: 10_000, sigma: 0.73848 }, expected: 0.70384, tolerance: 5e-5 },
  ],
);

/** Thrust of a 160 hp fixed-pitch trainer. */
export const lowryTrainer = figures(
  {
    source: 'Lowry, JAAER 6(1) 1995',
    section: 'linear propeller polar, m 1.70, b -0.0564, D 1.905 m, M0 422 N m',
    status: 'secondary',
    quantity: 'thrust',
    unit: 'N',
  },
  [
    { id: 'lowry-0', inputs: { airspeed_ms: 0 }, expected: 2366, tolerance: 1 },
    { id: 'lowry-29.2', inputs: { airspeed_ms: 29.2 }, expected: 2152, tolerance: 1 },
  ],
);
