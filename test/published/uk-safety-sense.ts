import { figures } from './figures.ts';

const leaflet = {
  source: 'UK CAA SafetySense Leaflet 7c / Safety Sense 09 Aeroplane performance',
  section: 'factors table',
  unit: '1',
} as const;
const takeoff = { ...leaflet, quantity: 'factor on the takeoff distance to 50 ft' };
const landing = { ...leaflet, quantity: 'factor on the landing distance from 50 ft' };

type On = { readonly kind: 'paved' | 'grass' | 'dirt' | 'snow'; readonly state: 'dry' | 'wet' };
const on = (kind: On['kind'], state: On['state'], more: { grass?: 'short'; firmness?: 'soft' } = {}) => ({
  kind,
  state,
  ...more,
});

/** Factors of the surface in a takeoff. */
export const takeoffSurfaces = [
  ...figures({ ...takeoff, status: 'secondary' }, [
    { id: 'ssl-to-dry-grass-20cm', inputs: on('grass', 'dry'), expected: 1.2, tolerance: 0 },
    { id: 'ssl-to-wet-grass-20cm', inputs: on('grass', 'wet'), expected: 1.3, tolerance: 0 },
  ]),
  ...figures({ ...takeoff, status: 'memory' }, [
    { id: 'ssl-to-wet-paved', inputs: on('paved', 'wet'), expected: 1, tolerance: 0 },
    {
      id: 'ssl-to-soft-ground-or-snow (at least)',
      inputs: on('dirt', 'dry', { firmness: 'soft' }),
      expected: 1.25,
      tolerance: 0,
    },
  ]),
];

/** Factors of the surface in a landing. */
export const landingSurfaces = [
  ...figures({ ...landing, status: 'secondary' }, [
    { id: 'ssl-ldg-wet-grass-20cm', inputs: on('grass', 'wet'), expected: 1.35, tolerance: 0 },
  ]),
  ...figures({ ...landing, status: 'memory' }, [
    { id: 'ssl-ldg-wet-paved', inputs: on('paved', 'wet'), expected: 1.15, tolerance: 0 },
    {
      id: 'ssl-ldg-soft-ground-or-snow (at least)',
      inputs: on('dirt', 'dry', { firmness: 'soft' }),
      expected: 1.25,
      tolerance: 0,
    },
    {
      id: 'ssl-ldg-very-short-wet-grass (up to)',
      inputs: on('grass', 'wet', { grass: 'short' }),
      expected: 1.6,
      tolerance: 0,
    },
  ]),
];

/** Dry grass in a landing, as two documents print it. */
export const landingDryGrass = [
  ...figures({ ...landing, status: 'secondary' }, [
    { id: 'ssl-ldg-dry-grass-20cm', inputs: { shown: 'beside' } as const, expected: 1.15, tolerance: 0 },
  ]),
  ...figures({ ...landing, source: 'UK AIC 67/2002', section: 'table', status: 'secondary' }, [
    { id: 'dry-short-grass', inputs: { shown: 'taken' } as const, expected: 1.2, tolerance: 0 },
  ]),
];

/** What two per cent of slope the unfavourable way asks for. */
export const slopes = [
  ...figures({ ...takeoff, status: 'secondary' }, [
    { id: 'ssl-to-slope-2%', inputs: { phase: 'takeoff', slope: 0.02 } as const, expected: 1.1, tolerance: 1e-12 },
  ]),
  ...figures({ ...landing, status: 'secondary' }, [
    { id: 'ssl-ldg-slope-2%', inputs: { phase: 'landing', slope: -0.02 } as const, expected: 1.1, tolerance: 1e-12 },
  ]),
];

/** The safety factor on distances without factors. */
export const overallFactors = [
  ...figures({ ...takeoff, status: 'memory' }, [
    { id: 'ssl-to-overall-safety-factor', inputs: { phase: 'takeoff' } as const, expected: 1.33, tolerance: 0 },
  ]),
  ...figures({ ...landing, status: 'memory' }, [
    { id: 'ssl-ldg-overall-safety-factor', inputs: { phase: 'landing' } as const, expected: 1.43, tolerance: 0 },
  ]),
];

/** Rows that stand for what is computed here. */
export const rowsComputedInstead = [
  ...figures({ ...takeoff, status: 'secondary' }, [
    { id: 'ssl-to-weight+10%', inputs: { phase: 'takeoff', code: 'mass' } as const, expected: 1.2, tolerance: 0 },
    {
      id: 'ssl-to-elevation+1000ft',
      inputs: { phase: 'takeoff', code: 'elevation' } as const,
      expected: 1.1,
      tolerance: 0,
    },
    {
      id: 'ssl-to-temperature+10C',
      inputs: { phase: 'takeoff', code: 'temperature' } as const,
      expected: 1.1,
      tolerance: 0,
    },
    {
      id: 'ssl-to-tailwind-10%-of-speed',
      inputs: { phase: 'takeoff', code: 'tailwind' } as const,
      expected: 1.2,
      tolerance: 0,
    },
  ]),
  ...figures({ ...landing, status: 'secondary' }, [
    { id: 'ssl-ldg-weight+10%', inputs: { phase: 'landing', code: 'mass' } as const, expected: 1.1, tolerance: 0 },
    {
      id: 'ssl-ldg-elevation+1000ft',
      inputs: { phase: 'landing', code: 'elevation' } as const,
      expected: 1.05,
      tolerance: 0,
    },
    {
      id: 'ssl-ldg-temperature+10C',
      inputs: { phase: 'landing', code: 'temperature' } as const,
      expected: 1.05,
      tolerance: 0,
    },
    {
      id: 'ssl-ldg-tailwind-10%-of-speed',
      inputs: { phase: 'landing', code: 'tailwind' } as const,
      expected: 1.2,
      tolerance: 0,
    },
  ]),
];
