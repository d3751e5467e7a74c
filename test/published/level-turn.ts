import { figures } from './figures.ts';

/** Exact values; the page with the example prints 64.2, 71.4 and 84.6 from multipliers rounded to 1.07, 1.19 and 1.41. */
export const stallSpeedsInTurns = figures(
  {
    source: 'V_S sqrt(n), n = 1/cos(bank)',
    section: 'level turn',
    status: 'computed',
    quantity: 'stall speed in a level turn',
    unit: 'kt',
  },
  [
    { id: 'STALL-1 30', inputs: { stall_kt: 60, bank_deg: 30 }, expected: 64.47, tolerance: 0.05 },
    { id: 'STALL-1 45', inputs: { stall_kt: 60, bank_deg: 45 }, expected: 71.35, tolerance: 0.05 },
    { id: 'STALL-1 60', inputs: { stall_kt: 60, bank_deg: 60 }, expected: 84.85, tolerance: 0.05 },
  ],
);
