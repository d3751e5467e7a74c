import { figures } from './figures.ts';

/** Factor on induced drag against height over span. */
export const groundEffectFactors = figures(
  {
    source: 'Wieselsberger, NACA TM 77, and Prandtl',
    section: 'sigma = (1 - 0.66 g/b)/(1.05 + 3.7 g/b), g twice the height',
    status: 'computed',
    quantity: 'factor on induced drag',
    unit: '-',
  },
  [
    { id: 'phi-0.05', inputs: { heightRatio: 0.05 }, expected: 0.342, tolerance: 6e-4 },
    { id: 'phi-0.10', inputs: { heightRatio: 0.1 }, expected: 0.515, tolerance: 6e-4 },
    { id: 'phi-0.15', inputs: { heightRatio: 0.15 }, expected: 0.629, tolerance: 6e-4 },
    { id: 'phi-0.20', inputs: { heightRatio: 0.2 }, expected: 0.709, tolerance: 6e-4 },
    { id: 'phi-0.30', inputs: { heightRatio: 0.3 }, expected: 0.815, tolerance: 6e-4 },
    { id: 'phi-0.50', inputs: { heightRatio: 0.5 }, expected: 0.928, tolerance: 6e-4 },
    { id: 'phi-1', inputs: { heightRatio: 1 }, expected: 1, tolerance: 0 },
  ],
);
