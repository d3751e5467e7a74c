import { figures } from './figures.ts';

/** Vapour pressure of the certification day. */
export const vapourPressures = figures(
  {
    source: '14 CFR 25.101(b)(2)',
    section: 'table',
    status: 'read',
    quantity: 'vapour pressure at 80 % RH, ISA temperature',
    unit: 'inHg',
  },
  [
    {
      id: 'far25101-e-1000',
      inputs: { pressure_altitude_ft: 1000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.354,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-3000',
      inputs: { pressure_altitude_ft: 3000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.272,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-5000',
      inputs: { pressure_altitude_ft: 5000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.207,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-6000',
      inputs: { pressure_altitude_ft: 6000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.1805,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-7000',
      inputs: { pressure_altitude_ft: 7000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.1566,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-9000',
      inputs: { pressure_altitude_ft: 9000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.1172,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-10000',
      inputs: { pressure_altitude_ft: 10000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.101,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-20000',
      inputs: { pressure_altitude_ft: 20000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.01978,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-25000',
      inputs: { pressure_altitude_ft: 25000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.00778,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-0',
      inputs: { pressure_altitude_ft: 0, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.403,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-2000',
      inputs: { pressure_altitude_ft: 2000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.311,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-4000',
      inputs: { pressure_altitude_ft: 4000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.238,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-8000',
      inputs: { pressure_altitude_ft: 8000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.1356,
      tolerance: 0.0015,
    },
    {
      id: 'far25101-e-15000',
      inputs: { pressure_altitude_ft: 15000, rh_percent: 80, isa_dev_C: 0 },
      expected: 0.0463,
      tolerance: 0.0015,
    },
  ],
);

/** Mixing ratio of the certification day. */
export const mixingRatios = figures(
  {
    source: '14 CFR 25.101(b)(2)',
    section: 'table',
    status: 'read',
    quantity: 'specific humidity (mixing ratio) at 80 % RH, ISA temperature',
    unit: 'lb/lb dry air',
  },
  [
    { id: 'far25101-w-0', inputs: { pressure_altitude_ft: 0, rh_percent: 80 }, expected: 0.00849, tolerance: 2e-5 },
    {
      id: 'far25101-w-1000',
      inputs: { pressure_altitude_ft: 1000, rh_percent: 80 },
      expected: 0.00773,
      tolerance: 2e-5,
    },
    {
      id: 'far25101-w-2000',
      inputs: { pressure_altitude_ft: 2000, rh_percent: 80 },
      expected: 0.00703,
      tolerance: 2e-5,
    },
    {
      id: 'far25101-w-3000',
      inputs: { pressure_altitude_ft: 3000, rh_percent: 80 },
      expected: 0.00638,
      tolerance: 2e-5,
    },
    {
      id: 'far25101-w-6000',
      inputs: { pressure_altitude_ft: 6000, rh_percent: 80 },
      expected: 0.00472,
      tolerance: 2e-5,
    },
    {
      id: 'far25101-w-7000',
      inputs: { pressure_altitude_ft: 7000, rh_percent: 80 },
      expected: 0.00425,
      tolerance: 2e-5,
    },
    {
      id: 'far25101-w-20000',
      inputs: { pressure_altitude_ft: 20000, rh_percent: 80 },
      expected: 0.000896,
      tolerance: 2e-6,
    },
  ],
);

/** Density ratio of the certification day. */
export const densityRatios = figures(
  {
    source: '14 CFR 25.101(b)(2)',
    section: 'table',
    status: 'read',
    quantity: 'moist-air density ratio at 80 % RH, ISA temperature',
    unit: '1',
    note: 'table is ~1.4e-4 above (p-0.378e)/(R T rho0); use tolerance 2e-4',
  },
  [
    {
      id: 'far25101-sigma-0',
      inputs: { pressure_altitude_ft: 0, rh_percent: 80 },
      expected: 0.99508,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-1000',
      inputs: { pressure_altitude_ft: 1000, rh_percent: 80 },
      expected: 0.96672,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-2000',
      inputs: { pressure_altitude_ft: 2000, rh_percent: 80 },
      expected: 0.93895,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-5000',
      inputs: { pressure_altitude_ft: 5000, rh_percent: 80 },
      expected: 0.8591,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-6000',
      inputs: { pressure_altitude_ft: 6000, rh_percent: 80 },
      expected: 0.83361,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-8000',
      inputs: { pressure_altitude_ft: 8000, rh_percent: 80 },
      expected: 0.78434,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-9000',
      inputs: { pressure_altitude_ft: 9000, rh_percent: 80 },
      expected: 0.76053,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-15000',
      inputs: { pressure_altitude_ft: 15000, rh_percent: 80 },
      expected: 0.62868,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-20000',
      inputs: { pressure_altitude_ft: 20000, rh_percent: 80 },
      expected: 0.53263,
      tolerance: 0.0002,
    },
    {
      id: 'far25101-sigma-25000',
      inputs: { pressure_altitude_ft: 25000, rh_percent: 80 },
      expected: 0.44806,
      tolerance: 0.0002,
    },
  ],
);
