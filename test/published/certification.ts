import { figures } from './figures.ts';

const cfr = (section: string, quantity: string, unit = '1') =>
  ({ source: `14 CFR ${section}`, section: 'as cited', status: 'read', quantity, unit }) as const;

/** Landing reference speed over the stall speed. */
export const referenceRatios = [
  ...figures(cfr('23.73', 'VREF/VS0 minimum'), [
    { id: 'cert-23-vref', inputs: { basis: 'cs-23-amendment-4' } as const, expected: 1.3, tolerance: 0 },
  ]),
  ...figures(cfr('25.125(b)(2)(i)(A) and CS', 'VREF/VSR0 minimum'), [
    { id: 'cert-25-vref', inputs: { basis: 'cs-25' } as const, expected: 1.23, tolerance: 0 },
  ]),
];

/** Speed at 50 ft over the stall speed. */
export const screenRatios = figures(cfr('23.51(b)', 'speed at 50 ft / VS1 minimum'), [
  { id: 'cert-23-v50-vs1', inputs: {}, expected: 1.2, tolerance: 0 },
]);

/** Steepest approach of the landing distance. */
export const approachGradients = figures(cfr('23.75(a)(1)', 'approach gradient limit', '%'), [
  { id: 'cert-23-approach-gradient', inputs: {}, expected: 5.2, tolerance: 0.05 },
]);

/** What the takeoff distance with all engines counts for. */
export const allEnginesFactors = figures(cfr('25.113(a)(2)', 'factor on the all-engines distance to 35 ft'), [
  { id: 'cert-25-aeo-115', inputs: {}, expected: 1.15, tolerance: 0 },
]);

const gradient = (section: string, status: 'read' | 'memory', quantity: string) =>
  ({ source: `14 CFR ${section}`, section: 'as cited', status, quantity, unit: '%' }) as const;
const byEngines = (code: string, gradients: readonly [number, number, number]) =>
  gradients.map((expected, index) => ({
    id: code,
    inputs: { code, engines: index + 2 },
    expected,
    tolerance: 1e-12,
  }));

/** Gradients of climb of the transport category for two, three and four engines. */
export const transportGradients = [
  ...figures(
    gradient('25.121(a)', 'read', 'climb, gear down, one engine out'),
    byEngines('climb-gear-down-engine-out', [0, 0.3, 0.5]),
  ),
  ...figures(
    gradient('25.121(b)', 'read', 'climb, gear up, one engine out'),
    byEngines('climb-gear-up-engine-out', [2.4, 2.7, 3.0]),
  ),
  ...figures(
    gradient('25.121(c)', 'read', 'final climb, one engine out'),
    byEngines('climb-final-engine-out', [1.2, 1.5, 1.7]),
  ),
  ...figures(
    gradient('25.121(d)', 'read', 'approach climb, one engine out (cert-25-approach-2eng)'),
    byEngines('climb-approach-engine-out', [2.1, 2.4, 2.7]),
  ),
  ...figures(gradient('25.119', 'memory', 'landing climb, all engines'), [
    {
      id: 'climb-balked-landing-all-engines',
      inputs: { code: 'climb-balked-landing-all-engines', engines: 2 },
      expected: 3.2,
      tolerance: 1e-12,
    },
  ]),
];

const classB = (status: 'read' | 'memory', quantity: string) =>
  ({ source: 'Reg. (EU) 965/2012 CAT.POL.A.340', section: 'climb', status, quantity, unit: '%' }) as const;

/** Gradients of climb of class B aeroplanes with two engines. */
export const classBGradients = [
  ...figures(classB('read', 'climb after takeoff'), [
    { id: 'all engines', inputs: { code: 'climb-all-engines' }, expected: 4, tolerance: 1e-12 },
    { id: '400 ft', inputs: { code: 'climb-engine-out-400-ft' }, expected: 0, tolerance: 1e-12 },
    { id: '1500 ft', inputs: { code: 'climb-engine-out-1500-ft' }, expected: 0.75, tolerance: 1e-12 },
  ]),
  ...figures(classB('memory', 'climb after a balked landing'), [
    { id: 'all engines', inputs: { code: 'climb-balked-landing-all-engines' }, expected: 2.5, tolerance: 1e-12 },
    { id: 'one engine out', inputs: { code: 'climb-balked-landing-engine-out' }, expected: 0.75, tolerance: 1e-12 },
  ]),
];

/** A certified takeoff distance: the greater of two. */
export const greaterOfTwo = figures(
  {
    source: '14 CFR 25.113 / CS 25.113, worked question',
    section: 'REG-1',
    status: 'read',
    quantity: '115 % of the takeoff distance with all engines running',
    unit: 'm',
  },
  [{ id: 'REG-1', inputs: { oei_m: 3050, aeo_m: 2555 }, expected: 2938, tolerance: 1 }],
);
