import { figures } from './figures.ts';

/** Printed temperatures by geopotential altitude. */
export const temperatures = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 5, by geopotential altitude',
    status: 'read',
    quantity: 'ISA temperature',
    unit: 'K',
  },
  [
    { id: 'isa-T--1000', inputs: { geopotential_altitude_m: -1000 }, expected: 294.65, tolerance: 0.0005 },
    { id: 'isa-T--500', inputs: { geopotential_altitude_m: -500 }, expected: 291.4, tolerance: 0.0005 },
    { id: 'isa-T-0', inputs: { geopotential_altitude_m: 0 }, expected: 288.15, tolerance: 0.0005 },
    { id: 'isa-T-250', inputs: { geopotential_altitude_m: 250 }, expected: 286.525, tolerance: 0.0005 },
    { id: 'isa-T-500', inputs: { geopotential_altitude_m: 500 }, expected: 284.9, tolerance: 0.0005 },
    { id: 'isa-T-1500', inputs: { geopotential_altitude_m: 1500 }, expected: 278.4, tolerance: 0.0005 },
    { id: 'isa-T-2500', inputs: { geopotential_altitude_m: 2500 }, expected: 271.9, tolerance: 0.0005 },
    { id: 'isa-T-3000', inputs: { geopotential_altitude_m: 3000 }, expected: 268.65, tolerance: 0.0005 },
    { id: 'isa-T-3500', inputs: { geopotential_altitude_m: 3500 }, expected: 265.4, tolerance: 0.0005 },
    { id: 'isa-T-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 258.9, tolerance: 0.0005 },
    { id: 'isa-T-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 249.15, tolerance: 0.0005 },
    { id: 'isa-T-7000', inputs: { geopotential_altitude_m: 7000 }, expected: 242.65, tolerance: 0.0005 },
    { id: 'isa-T-9000', inputs: { geopotential_altitude_m: 9000 }, expected: 229.65, tolerance: 0.0005 },
    { id: 'isa-T-10000', inputs: { geopotential_altitude_m: 10000 }, expected: 223.15, tolerance: 0.0005 },
    { id: 'isa-T-11000', inputs: { geopotential_altitude_m: 11000 }, expected: 216.65, tolerance: 0.0005 },
    { id: 'isa-T-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 216.65, tolerance: 0.0005 },
    { id: 'isa-T-13000', inputs: { geopotential_altitude_m: 13000 }, expected: 216.65, tolerance: 0.0005 },
    { id: 'isa-T-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 216.65, tolerance: 0.0005 },
    { id: 'isa-T-20000', inputs: { geopotential_altitude_m: 20000 }, expected: 216.65, tolerance: 0.0005 },
  ],
);

/** Printed pressures by geopotential altitude. */
export const pressures = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 5, by geopotential altitude',
    status: 'read',
    quantity: 'ISA pressure',
    unit: 'hPa',
  },
  [
    { id: 'isa-p--2000', inputs: { geopotential_altitude_m: -2000 }, expected: 1277.74, tolerance: 0.01 },
    { id: 'isa-p-0', inputs: { geopotential_altitude_m: 0 }, expected: 1013.25, tolerance: 0.01 },
    { id: 'isa-p-250', inputs: { geopotential_altitude_m: 250 }, expected: 983.575, tolerance: 0.001 },
    { id: 'isa-p-500', inputs: { geopotential_altitude_m: 500 }, expected: 954.608, tolerance: 0.001 },
    { id: 'isa-p-750', inputs: { geopotential_altitude_m: 750 }, expected: 926.336, tolerance: 0.001 },
    { id: 'isa-p-1500', inputs: { geopotential_altitude_m: 1500 }, expected: 845.56, tolerance: 0.001 },
    { id: 'isa-p-2000', inputs: { geopotential_altitude_m: 2000 }, expected: 794.952, tolerance: 0.001 },
    { id: 'isa-p-2500', inputs: { geopotential_altitude_m: 2500 }, expected: 746.825, tolerance: 0.001 },
    { id: 'isa-p-3000', inputs: { geopotential_altitude_m: 3000 }, expected: 701.085, tolerance: 0.001 },
    { id: 'isa-p-3500', inputs: { geopotential_altitude_m: 3500 }, expected: 657.641, tolerance: 0.001 },
    { id: 'isa-p-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 577.283, tolerance: 0.001 },
    { id: 'isa-p-5000', inputs: { geopotential_altitude_m: 5000 }, expected: 540.199, tolerance: 0.001 },
    { id: 'isa-p-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 471.81, tolerance: 0.001 },
    { id: 'isa-p-7000', inputs: { geopotential_altitude_m: 7000 }, expected: 410.607, tolerance: 0.001 },
    { id: 'isa-p-8000', inputs: { geopotential_altitude_m: 8000 }, expected: 355.998, tolerance: 0.001 },
    { id: 'isa-p-9000', inputs: { geopotential_altitude_m: 9000 }, expected: 307.424, tolerance: 0.001 },
    { id: 'isa-p-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 193.304, tolerance: 0.001 },
    { id: 'isa-p-13000', inputs: { geopotential_altitude_m: 13000 }, expected: 165.104, tolerance: 0.001 },
    { id: 'isa-p-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 120.446, tolerance: 0.001 },
    { id: 'isa-p-20000', inputs: { geopotential_altitude_m: 20000 }, expected: 54.7488, tolerance: 0.0001 },
  ],
);

/** Printed densities by geopotential altitude. */
export const densities = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 5, by geopotential altitude',
    status: 'read',
    quantity: 'ISA density',
    unit: 'kg/m3',
  },
  [
    { id: 'isa-rho--1000', inputs: { geopotential_altitude_m: -1000 }, expected: 1.347, tolerance: 1e-5 },
    { id: 'isa-rho--500', inputs: { geopotential_altitude_m: -500 }, expected: 1.28489, tolerance: 1e-5 },
    { id: 'isa-rho-0', inputs: { geopotential_altitude_m: 0 }, expected: 1.225, tolerance: 1e-5 },
    { id: 'isa-rho-250', inputs: { geopotential_altitude_m: 250 }, expected: 1.19587, tolerance: 1e-5 },
    { id: 'isa-rho-750', inputs: { geopotential_altitude_m: 750 }, expected: 1.1392, tolerance: 1e-5 },
    { id: 'isa-rho-1000', inputs: { geopotential_altitude_m: 1000 }, expected: 1.11164, tolerance: 1e-5 },
    { id: 'isa-rho-2000', inputs: { geopotential_altitude_m: 2000 }, expected: 1.00649, tolerance: 1e-5 },
    { id: 'isa-rho-2500', inputs: { geopotential_altitude_m: 2500 }, expected: 0.956859, tolerance: 1e-6 },
    { id: 'isa-rho-3000', inputs: { geopotential_altitude_m: 3000 }, expected: 0.909122, tolerance: 1e-6 },
    { id: 'isa-rho-4000', inputs: { geopotential_altitude_m: 4000 }, expected: 0.819129, tolerance: 1e-6 },
    { id: 'isa-rho-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 0.776774, tolerance: 1e-6 },
    { id: 'isa-rho-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 0.659697, tolerance: 1e-6 },
    { id: 'isa-rho-7000', inputs: { geopotential_altitude_m: 7000 }, expected: 0.589501, tolerance: 1e-6 },
    { id: 'isa-rho-8000', inputs: { geopotential_altitude_m: 8000 }, expected: 0.525167, tolerance: 1e-6 },
    { id: 'isa-rho-10000', inputs: { geopotential_altitude_m: 10000 }, expected: 0.412706, tolerance: 1e-6 },
    { id: 'isa-rho-11000', inputs: { geopotential_altitude_m: 11000 }, expected: 0.363918, tolerance: 1e-6 },
    { id: 'isa-rho-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 0.310828, tolerance: 1e-6 },
    { id: 'isa-rho-13000', inputs: { geopotential_altitude_m: 13000 }, expected: 0.265483, tolerance: 1e-6 },
    { id: 'isa-rho-14000', inputs: { geopotential_altitude_m: 14000 }, expected: 0.226753, tolerance: 1e-6 },
    { id: 'isa-rho-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 0.193673, tolerance: 1e-6 },
    { id: 'isa-rho-20000', inputs: { geopotential_altitude_m: 20000 }, expected: 0.0880347, tolerance: 1e-7 },
  ],
);

/** Printed pressure ratios. */
export const pressureRatios = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 6, by geopotential altitude',
    status: 'read',
    quantity: 'ISA pressure ratio',
    unit: '1',
  },
  [
    { id: 'isa-delta--2000', inputs: { geopotential_altitude_m: -2000 }, expected: 1.26103, tolerance: 1e-5 },
    { id: 'isa-delta--1000', inputs: { geopotential_altitude_m: -1000 }, expected: 1.12439, tolerance: 1e-5 },
    { id: 'isa-delta--500', inputs: { geopotential_altitude_m: -500 }, expected: 1.06072, tolerance: 1e-5 },
    { id: 'isa-delta-0', inputs: { geopotential_altitude_m: 0 }, expected: 1.0, tolerance: 1e-5 },
    { id: 'isa-delta-250', inputs: { geopotential_altitude_m: 250 }, expected: 0.970713, tolerance: 1e-6 },
    { id: 'isa-delta-750', inputs: { geopotential_altitude_m: 750 }, expected: 0.914223, tolerance: 1e-6 },
    { id: 'isa-delta-1000', inputs: { geopotential_altitude_m: 1000 }, expected: 0.886993, tolerance: 1e-6 },
    { id: 'isa-delta-2000', inputs: { geopotential_altitude_m: 2000 }, expected: 0.784557, tolerance: 1e-6 },
    { id: 'isa-delta-3000', inputs: { geopotential_altitude_m: 3000 }, expected: 0.691917, tolerance: 1e-6 },
    { id: 'isa-delta-4000', inputs: { geopotential_altitude_m: 4000 }, expected: 0.608342, tolerance: 1e-6 },
    { id: 'isa-delta-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 0.569734, tolerance: 1e-6 },
    { id: 'isa-delta-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 0.46564, tolerance: 1e-6 },
    { id: 'isa-delta-7000', inputs: { geopotential_altitude_m: 7000 }, expected: 0.405238, tolerance: 1e-6 },
    { id: 'isa-delta-10000', inputs: { geopotential_altitude_m: 10000 }, expected: 0.260905, tolerance: 1e-6 },
    { id: 'isa-delta-11000', inputs: { geopotential_altitude_m: 11000 }, expected: 0.223361, tolerance: 1e-6 },
    { id: 'isa-delta-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 0.190776, tolerance: 1e-6 },
    { id: 'isa-delta-14000', inputs: { geopotential_altitude_m: 14000 }, expected: 0.139174, tolerance: 1e-6 },
    { id: 'isa-delta-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 0.11887, tolerance: 1e-6 },
  ],
);

/** Printed density ratios. */
export const densityRatios = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 6, by geopotential altitude',
    status: 'read',
    quantity: 'ISA density ratio',
    unit: '1',
  },
  [
    { id: 'isa-sigma--1000', inputs: { geopotential_altitude_m: -1000 }, expected: 1.09959, tolerance: 1e-5 },
    { id: 'isa-sigma--500', inputs: { geopotential_altitude_m: -500 }, expected: 1.04889, tolerance: 1e-5 },
    { id: 'isa-sigma-0', inputs: { geopotential_altitude_m: 0 }, expected: 1.0, tolerance: 1e-5 },
    { id: 'isa-sigma-250', inputs: { geopotential_altitude_m: 250 }, expected: 0.976219, tolerance: 1e-6 },
    { id: 'isa-sigma-500', inputs: { geopotential_altitude_m: 500 }, expected: 0.952872, tolerance: 1e-6 },
    { id: 'isa-sigma-750', inputs: { geopotential_altitude_m: 750 }, expected: 0.929956, tolerance: 1e-6 },
    { id: 'isa-sigma-1000', inputs: { geopotential_altitude_m: 1000 }, expected: 0.907463, tolerance: 1e-6 },
    { id: 'isa-sigma-1500', inputs: { geopotential_altitude_m: 1500 }, expected: 0.863728, tolerance: 1e-6 },
    { id: 'isa-sigma-2000', inputs: { geopotential_altitude_m: 2000 }, expected: 0.821625, tolerance: 1e-6 },
    { id: 'isa-sigma-3500', inputs: { geopotential_altitude_m: 3500 }, expected: 0.704676, tolerance: 1e-6 },
    { id: 'isa-sigma-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 0.634101, tolerance: 1e-6 },
    { id: 'isa-sigma-5000', inputs: { geopotential_altitude_m: 5000 }, expected: 0.600911, tolerance: 1e-6 },
    { id: 'isa-sigma-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 0.538528, tolerance: 1e-6 },
    { id: 'isa-sigma-7000', inputs: { geopotential_altitude_m: 7000 }, expected: 0.481225, tolerance: 1e-6 },
    { id: 'isa-sigma-9000', inputs: { geopotential_altitude_m: 9000 }, expected: 0.380692, tolerance: 1e-6 },
    { id: 'isa-sigma-10000', inputs: { geopotential_altitude_m: 10000 }, expected: 0.336903, tolerance: 1e-6 },
    { id: 'isa-sigma-11000', inputs: { geopotential_altitude_m: 11000 }, expected: 0.297076, tolerance: 1e-6 },
    { id: 'isa-sigma-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 0.253737, tolerance: 1e-6 },
    { id: 'isa-sigma-14000', inputs: { geopotential_altitude_m: 14000 }, expected: 0.185105, tolerance: 1e-6 },
    { id: 'isa-sigma-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 0.158101, tolerance: 1e-6 },
  ],
);

/** Printed speeds of sound. */
export const speedsOfSound = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: 'Table 6, by geopotential altitude',
    status: 'read',
    quantity: 'ISA speed of sound',
    unit: 'm/s',
  },
  [
    { id: 'isa-a--1000', inputs: { geopotential_altitude_m: -1000 }, expected: 344.111, tolerance: 0.001 },
    { id: 'isa-a--500', inputs: { geopotential_altitude_m: -500 }, expected: 342.208, tolerance: 0.001 },
    { id: 'isa-a-500', inputs: { geopotential_altitude_m: 500 }, expected: 338.369, tolerance: 0.001 },
    { id: 'isa-a-750', inputs: { geopotential_altitude_m: 750 }, expected: 337.403, tolerance: 0.001 },
    { id: 'isa-a-1000', inputs: { geopotential_altitude_m: 1000 }, expected: 336.434, tolerance: 0.001 },
    { id: 'isa-a-1500', inputs: { geopotential_altitude_m: 1500 }, expected: 334.487, tolerance: 0.001 },
    { id: 'isa-a-2500', inputs: { geopotential_altitude_m: 2500 }, expected: 330.559, tolerance: 0.001 },
    { id: 'isa-a-4000', inputs: { geopotential_altitude_m: 4000 }, expected: 324.579, tolerance: 0.001 },
    { id: 'isa-a-4500', inputs: { geopotential_altitude_m: 4500 }, expected: 322.56, tolerance: 0.001 },
    { id: 'isa-a-6000', inputs: { geopotential_altitude_m: 6000 }, expected: 316.428, tolerance: 0.001 },
    { id: 'isa-a-10000', inputs: { geopotential_altitude_m: 10000 }, expected: 299.463, tolerance: 0.001 },
    { id: 'isa-a-11000', inputs: { geopotential_altitude_m: 11000 }, expected: 295.069, tolerance: 0.001 },
    { id: 'isa-a-12000', inputs: { geopotential_altitude_m: 12000 }, expected: 295.069, tolerance: 0.001 },
    { id: 'isa-a-13000', inputs: { geopotential_altitude_m: 13000 }, expected: 295.069, tolerance: 0.001 },
    { id: 'isa-a-14000', inputs: { geopotential_altitude_m: 14000 }, expected: 295.069, tolerance: 0.001 },
    { id: 'isa-a-15000', inputs: { geopotential_altitude_m: 15000 }, expected: 295.069, tolerance: 0.001 },
    { id: 'isa-a-20000', inputs: { geopotential_altitude_m: 20000 }, expected: 295.069, tolerance: 0.001 },
  ],
);

/** The constants of tables 1 and 4: exact. */
export const standardConstants = [
  { id: 'isa-const-g0', quantity: 'ISA constant g0', expected: 9.80665, unit: 'm/s2' },
  { id: 'isa-const-p0', quantity: 'ISA constant p0', expected: 101325, unit: 'Pa' },
  { id: 'isa-const-T0', quantity: 'ISA constant T0', expected: 288.15, unit: 'K' },
  { id: 'isa-const-rho0', quantity: 'ISA constant rho0', expected: 1.225, unit: 'kg/m3' },
  { id: 'isa-const-R_star', quantity: 'ISA constant R_star', expected: 8314.32, unit: 'J/(kmol K)' },
  { id: 'isa-const-R_specific', quantity: 'ISA constant R_specific', expected: 287.05287, unit: 'J/(kg K)' },
  { id: 'isa-const-kappa', quantity: 'ISA constant kappa', expected: 1.4, unit: '1' },
  {
    id: 'isa-const-earth_radius_for_geopotential',
    quantity: 'ISA constant earth_radius_for_geopotential',
    expected: 6356766,
    unit: 'm',
  },
  { id: 'isa-const-lapse_troposphere', quantity: 'ISA constant lapse_troposphere', expected: -0.0065, unit: 'K/m' },
  {
    id: 'isa-const-tropopause_geopotential',
    quantity: 'ISA constant tropopause_geopotential',
    expected: 11000,
    unit: 'm',
  },
  { id: 'isa-const-T_stratosphere', quantity: 'ISA constant T_stratosphere', expected: 216.65, unit: 'K' },
] as const;

/** Speed of sound at sea level; the page prints 661.48 kt. */
export const seaLevelSpeedOfSound = figures(
  {
    source: 'ISO 2533:1975 Standard Atmosphere',
    section: '2.14 formula (21)',
    status: 'read',
    quantity: 'speed of sound at ISA sea level',
    unit: 'kt',
    note: 'page prints 661.48 kt',
  },
  [{ id: 'a0-kt', inputs: {}, expected: 661.4786, tolerance: 0.005 }],
);
