import { figures } from './figures.ts';

const nist = { section: 'appendix B.8', status: 'memory', quantity: 'SI value of the unit' } as const;
const factor = (id: string, expected: number) => ({ id, inputs: {}, expected, tolerance: 0 });

/** Exact by definition. */
export const exactFactors = figures(
  {
    ...nist,
    source: 'NIST SP 811 (2008); BIPM SI brochure, 9th edition; ICAO Annex 5',
    unit: 'SI',
  },
  [
    factor('length ft', 0.3048),
    factor('length in', 0.0254),
    factor('length NM', 1852),
    factor('length km', 1000),
    factor('area ft2', 0.09290304),
    factor('mass lb', 0.45359237),
    factor('mass t', 1000),
    factor('speed mph', 0.44704),
    factor('speed ft/min', 0.00508),
    factor('pressure hPa', 100),
    factor('pressure kPa', 1000),
    factor('pressure bar', 100_000),
    factor('time min', 60),
    factor('time h', 3600),
    factor('force kN', 1000),
    factor('power kW', 1000),
    factor('energy MJ', 1e6),
    factor('force lbf', 4.4482216152605),
    factor('proportion percent', 0.01),
  ],
);

const printed = (id: string, expected: number, tolerance: number) => ({ id, inputs: {}, expected, tolerance });

/** Printed to seven digits. */
export const printedFactors = figures({ ...nist, source: 'NIST SP 811 (2008)', unit: 'SI' }, [
  printed('speed kt', 0.5144444, 5e-8),
  printed('speed km/h', 0.2777778, 5e-8),
  printed('pressure inHg', 3386.389, 5e-4),
  printed('pressure psi', 6894.757, 5e-4),
  printed('power hp', 745.6999, 5e-5),
  printed('angle deg', 0.01745329, 5e-9),
  printed('rotation rpm', 0.1047198, 5e-8),
]);
