import { figures } from './figures.ts';

/** Density of moist air by the formula of the metrologists. */
export const moistDensities = figures(
  {
    source: 'CIPM-2007, Metrologia 45 (2008) 149',
    section: 'eqs 1-4, A1.1',
    status: 'computed',
    quantity: 'moist-air density CIPM-2007, xCO2=400e-6',
    unit: 'kg/m3',
    note: 'ideal-gas (p-0.378e)/(R T) is 3-4e-4 relative below CIPM (Z<1, R differs): compare with 5e-4 relative tolerance',
  },
  [
    { id: 'cipm2007-20-101325-50', inputs: { t_C: 20, p_Pa: 101325, rh: 0.5 }, expected: 1.19931, tolerance: 5e-5 },
    { id: 'cipm2007-20-101325-0', inputs: { t_C: 20, p_Pa: 101325, rh: 0 }, expected: 1.20456, tolerance: 5e-5 },
    { id: 'cipm2007-25-101325-50', inputs: { t_C: 25, p_Pa: 101325, rh: 0.5 }, expected: 1.17732, tolerance: 5e-5 },
    { id: 'cipm2007-15-101325-0', inputs: { t_C: 15, p_Pa: 101325, rh: 0.0 }, expected: 1.22552, tolerance: 5e-5 },
    { id: 'cipm2007-30-101325-80', inputs: { t_C: 30, p_Pa: 101325, rh: 0.8 }, expected: 1.15001, tolerance: 5e-5 },
    { id: 'cipm2007-10-90000-30', inputs: { t_C: 10, p_Pa: 90000, rh: 0.3 }, expected: 1.10606, tolerance: 5e-5 },
  ],
);
