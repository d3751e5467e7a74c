import { figures } from './figures.ts';

/** TAS of a CAS. */
export const trueAirspeeds = figures(
  {
    source: 'isentropic pitot law (subsonic)',
    section: 'CAS definition',
    status: 'computed',
    quantity: 'TAS from CAS (compressible)',
    unit: 'kt',
  },
  [
    {
      id: 'tas-60-0-0',
      inputs: { cas_kt: 60, pressure_altitude_ft: 0, isa_dev_C: 0 },
      expected: 60.0,
      tolerance: 0.05,
    },
    {
      id: 'tas-100-5000-0',
      inputs: { cas_kt: 100, pressure_altitude_ft: 5000, isa_dev_C: 0 },
      expected: 107.67,
      tolerance: 0.05,
    },
    {
      id: 'tas-100-5000-20',
      inputs: { cas_kt: 100, pressure_altitude_ft: 5000, isa_dev_C: 20 },
      expected: 111.47,
      tolerance: 0.05,
    },
    {
      id: 'tas-200-10000-0',
      inputs: { cas_kt: 200, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 231.57,
      tolerance: 0.05,
    },
    {
      id: 'tas-250-10000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 288.7,
      tolerance: 0.05,
    },
    {
      id: 'tas-250-20000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 20000, isa_dev_C: 0 },
      expected: 335.95,
      tolerance: 0.05,
    },
    {
      id: 'tas-300-20000-0',
      inputs: { cas_kt: 300, pressure_altitude_ft: 20000, isa_dev_C: 0 },
      expected: 400.1,
      tolerance: 0.05,
    },
    {
      id: 'tas-280-29000-0',
      inputs: { cas_kt: 280, pressure_altitude_ft: 29000, isa_dev_C: 0 },
      expected: 430.55,
      tolerance: 0.05,
    },
    {
      id: 'tas-250-35000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 35000, isa_dev_C: 0 },
      expected: 427.24,
      tolerance: 0.05,
    },
  ],
);

/** EAS of a CAS. */
export const equivalentAirspeeds = figures(
  {
    source: 'isentropic pitot law (subsonic)',
    section: 'CAS definition',
    status: 'computed',
    quantity: 'EAS from CAS',
    unit: 'kt',
  },
  [
    {
      id: 'eas-60-0-0',
      inputs: { cas_kt: 60, pressure_altitude_ft: 0, isa_dev_C: 0 },
      expected: 60.0,
      tolerance: 0.05,
    },
    {
      id: 'eas-100-0-20',
      inputs: { cas_kt: 100, pressure_altitude_ft: 0, isa_dev_C: 20 },
      expected: 100.0,
      tolerance: 0.05,
    },
    {
      id: 'eas-100-5000-0',
      inputs: { cas_kt: 100, pressure_altitude_ft: 5000, isa_dev_C: 0 },
      expected: 99.94,
      tolerance: 0.05,
    },
    {
      id: 'eas-100-5000-20',
      inputs: { cas_kt: 100, pressure_altitude_ft: 5000, isa_dev_C: 20 },
      expected: 99.94,
      tolerance: 0.05,
    },
    {
      id: 'eas-120-8000-15',
      inputs: { cas_kt: 120, pressure_altitude_ft: 8000, isa_dev_C: 15 },
      expected: 119.83,
      tolerance: 0.05,
    },
    {
      id: 'eas-150-10000-0',
      inputs: { cas_kt: 150, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 149.57,
      tolerance: 0.05,
    },
    {
      id: 'eas-200-10000-0',
      inputs: { cas_kt: 200, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 199.0,
      tolerance: 0.05,
    },
    {
      id: 'eas-250-20000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 20000, isa_dev_C: 0 },
      expected: 245.22,
      tolerance: 0.05,
    },
    {
      id: 'eas-300-20000-0',
      inputs: { cas_kt: 300, pressure_altitude_ft: 20000, isa_dev_C: 0 },
      expected: 292.05,
      tolerance: 0.05,
    },
    {
      id: 'eas-280-29000-0',
      inputs: { cas_kt: 280, pressure_altitude_ft: 29000, isa_dev_C: 0 },
      expected: 268.23,
      tolerance: 0.05,
    },
    {
      id: 'eas-250-35000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 35000, isa_dev_C: 0 },
      expected: 237.83,
      tolerance: 0.05,
    },
  ],
);

/** Mach number of a CAS. */
export const machNumbers = figures(
  {
    source: 'isentropic pitot law (subsonic)',
    section: 'CAS definition',
    status: 'computed',
    quantity: 'Mach from CAS',
    unit: '1',
  },
  [
    {
      id: 'mach-60-0-0',
      inputs: { cas_kt: 60, pressure_altitude_ft: 0, isa_dev_C: 0 },
      expected: 0.0907,
      tolerance: 5e-5,
    },
    {
      id: 'mach-100-0-20',
      inputs: { cas_kt: 100, pressure_altitude_ft: 0, isa_dev_C: 20 },
      expected: 0.1512,
      tolerance: 5e-5,
    },
    {
      id: 'mach-100-5000-0',
      inputs: { cas_kt: 100, pressure_altitude_ft: 5000, isa_dev_C: 0 },
      expected: 0.1656,
      tolerance: 5e-5,
    },
    {
      id: 'mach-150-10000-0',
      inputs: { cas_kt: 150, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 0.2727,
      tolerance: 5e-5,
    },
    {
      id: 'mach-250-10000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 10000, isa_dev_C: 0 },
      expected: 0.4523,
      tolerance: 5e-5,
    },
    {
      id: 'mach-300-20000-0',
      inputs: { cas_kt: 300, pressure_altitude_ft: 20000, isa_dev_C: 0 },
      expected: 0.6513,
      tolerance: 5e-5,
    },
    {
      id: 'mach-280-29000-0',
      inputs: { cas_kt: 280, pressure_altitude_ft: 29000, isa_dev_C: 0 },
      expected: 0.7274,
      tolerance: 5e-5,
    },
    {
      id: 'mach-250-35000-0',
      inputs: { cas_kt: 250, pressure_altitude_ft: 35000, isa_dev_C: 0 },
      expected: 0.7412,
      tolerance: 5e-5,
    },
  ],
);
