import { figures } from './figures.ts';

/** The headwind of a wind at an angle to the movement. */
export const headwinds = figures(
  {
    source: 'geometry',
    section: 'V cos, V sin',
    status: 'computed',
    quantity: 'headwind of a wind at an angle',
    unit: 'kt',
  },
  [
    { id: 'wind-20-30', inputs: { speed_kt: 20, angle_deg: 30 }, expected: 17.3205, tolerance: 0.001 },
    { id: 'wind-20-60', inputs: { speed_kt: 20, angle_deg: 60 }, expected: 10.0, tolerance: 0.001 },
    { id: 'wind-10-180', inputs: { speed_kt: 10, angle_deg: 180 }, expected: -10, tolerance: 0.001 },
  ],
);

/** The crosswind of a wind at an angle to the movement. */
export const crosswinds = figures(
  {
    source: 'geometry',
    section: 'V cos, V sin',
    status: 'computed',
    quantity: 'crosswind of a wind at an angle',
    unit: 'kt',
  },
  [
    { id: 'wind-20-30', inputs: { speed_kt: 20, angle_deg: 30 }, expected: 10.0, tolerance: 0.001 },
    { id: 'wind-20-60', inputs: { speed_kt: 20, angle_deg: 60 }, expected: 17.3205, tolerance: 0.001 },
    { id: 'wind-10-180', inputs: { speed_kt: 10, angle_deg: 180 }, expected: 0, tolerance: 0.001 },
  ],
);

/** What a 50 % headwind, 150 % tailwind rule lets be taken into account. */
export const creditedWinds = figures(
  {
    source: '14 CFR 25.105(d)(1); CAT.POL.A.205(c)(5), .305(c)(6), .330(c)(2)',
    section: 'as listed',
    status: 'read',
    quantity: 'wind component allowed after 50 % headwind / 150 % tailwind rule',
    unit: 'kt',
  },
  [
    { id: 'wind-credit-hw', inputs: { component_kt: 20 }, expected: 10, tolerance: 1e-9 },
    { id: 'wind-credit-tw', inputs: { component_kt: -10 }, expected: -15, tolerance: 1e-9 },
  ],
);
