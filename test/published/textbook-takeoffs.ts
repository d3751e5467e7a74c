import { figures } from './figures.ts';

/** A business jet of airliner size, sea level, standard day: W 73 000 lb, S 950 ft2, mean thrust 0.341 W. */
export const andersonExample66 = figures(
  {
    source: 'Anderson, Aircraft Performance and Design, 1999',
    section: 'Ex. 6.6, p. 379; the line of K_A prints W/S 76.48 where 76.84 is used',
    status: 'read',
    quantity: 'takeoff distance',
    unit: 'ft',
  },
  [
    {
      id: 'TB-APD-6.6 ground roll with 3 s rotation',
      inputs: { part: 'roll' as const },
      expected: 2857,
      tolerance: 8.6,
    },
    { id: 'TB-APD-6.6 arc to 35 ft', inputs: { part: 'arc' as const }, expected: 724, tolerance: 2.2 },
  ],
);

/** An executive jet, sea level: W 88 176.75 N, S 29.54 m2, T 32 485 N, lift coefficient 1.0 held. */
export const andersonExample617 = figures(
  {
    source: 'Anderson, Introduction to Flight, 6th ed.',
    section: 'Ex. 6.17; inputs read, result of its formula',
    status: 'computed',
    quantity: 'lift-off distance',
    unit: 'm',
  },
  [
    { id: 'TB-IF-6.17 mean force', inputs: { by: 'mean' as const }, expected: 1102.7, tolerance: 2.2 },
    { id: 'TB-IF-6.17 exact integral', inputs: { by: 'integral' as const }, expected: 1106.4, tolerance: 2.2 },
  ],
);

/** a = a0 - k v^2 from rest to 250 km/h, a0 2 m/s2, k 4e-5 1/m. */
export const meriamKraige = figures(
  {
    source: 'Meriam & Kraige, Engineering Mechanics: Dynamics, ch. 2',
    section: 'takeoff run with and without drag; the second figure recalled',
    status: 'memory',
    quantity: 'run',
    unit: 'm',
  },
  [
    { id: 'ANALYTIC-1 without drag', inputs: { k: 0 }, expected: 1206, tolerance: 1.2 },
    { id: 'ANALYTIC-1 with drag', inputs: { k: 4e-5 }, expected: 1268, tolerance: 1.2 },
  ],
);

/** Wind on the roll at constant acceleration. */
export const windOnRoll = figures(
  {
    source: "FAA Pilot's Handbook and Aerodynamics for Naval Aviators",
    section: 'wind of 10 % of the takeoff speed',
    status: 'memory',
    quantity: 'change of ground roll',
    unit: '%',
  },
  [
    { id: 'SCALE-WIND headwind', inputs: { windShare: 0.1 }, expected: -19, tolerance: 0.5 },
    { id: 'SCALE-WIND tailwind', inputs: { windShare: -0.1 }, expected: 21, tolerance: 0.5 },
  ],
);

/** Aeroplane 1: 1043 kg, 16.2 m2, A 7.32, fixed pitch 2366 N - 0.2507 V^2, sea level. */
export const closedFormRolls = figures(
  {
    source: 'closed form of the ground roll for T0 + T2 V^2',
    section: 'checked against quadrature to 1e-12',
    status: 'computed',
    quantity: 'ground roll',
    unit: 'm',
  },
  [
    { id: 'closed form, still air', inputs: { windShare: 0 }, expected: 245.8389, tolerance: 1e-4 },
    { id: 'closed form, headwind', inputs: { windShare: 0.2 }, expected: 160.294, tolerance: 1e-4 },
  ],
);

const energyPath = {
  source: 'energy path with a pull-up arc, adaptive quadrature by an independent program',
  status: 'computed',
  quantity: 'air distance',
  unit: 'm',
} as const;

/** Aeroplane 1 to 50 ft, V_LOF 1.15 V_S, V50 1.2 V_S. */
export const lightEnergyPaths = figures({ ...energyPath, section: 'fixed-pitch single, 1043 kg, to 15.24 m' }, [
  { id: 'light 1.05', inputs: { loadFactor: 1.05, headwind: 0, time: 8.493 }, expected: 251.336, tolerance: 0.005 },
  { id: 'light 1.10', inputs: { loadFactor: 1.1, headwind: 0, time: 7.202 }, expected: 213.42, tolerance: 0.005 },
  { id: 'light 1.15', inputs: { loadFactor: 1.15, headwind: 0, time: 6.755 }, expected: 200.319, tolerance: 0.005 },
  { id: 'light 1.20', inputs: { loadFactor: 1.2, headwind: 0, time: 6.526 }, expected: 193.625, tolerance: 0.005 },
  {
    id: 'light 1.05 wind',
    inputs: { loadFactor: 1.05, headwind: 5, time: 8.493 },
    expected: 208.872,
    tolerance: 0.005,
  },
  { id: 'light 1.10 wind', inputs: { loadFactor: 1.1, headwind: 5, time: 7.202 }, expected: 177.412, tolerance: 0.005 },
  {
    id: 'light 1.15 wind',
    inputs: { loadFactor: 1.15, headwind: 5, time: 6.755 },
    expected: 166.545,
    tolerance: 0.005,
  },
  { id: 'light 1.20 wind', inputs: { loadFactor: 1.2, headwind: 5, time: 6.526 }, expected: 160.994, tolerance: 0.005 },
]);

/** A 70 t twin jet to 35 ft, V_LOF 1.1 V_S, V2 1.2 V_S, T 2 x 118 kN (1 - 0.49 sqrt(V/340.3)). */
export const jetEnergyPaths = figures({ ...energyPath, section: 'twin jet, 70 t, to 10.668 m' }, [
  { id: 'jet 1.05', inputs: { loadFactor: 1.05, headwind: 0 }, expected: 516.046, tolerance: 0.002 },
  { id: 'jet 1.10', inputs: { loadFactor: 1.1, headwind: 0 }, expected: 424.23, tolerance: 0.002 },
  { id: 'jet 1.15', inputs: { loadFactor: 1.15, headwind: 0 }, expected: 392.923, tolerance: 0.002 },
  { id: 'jet 1.20', inputs: { loadFactor: 1.2, headwind: 0 }, expected: 377.085, tolerance: 0.002 },
  { id: 'jet 1.05 wind', inputs: { loadFactor: 1.05, headwind: 5 }, expected: 482.454, tolerance: 0.002 },
  { id: 'jet 1.10 wind', inputs: { loadFactor: 1.1, headwind: 5 }, expected: 396.727, tolerance: 0.002 },
  { id: 'jet 1.15 wind', inputs: { loadFactor: 1.15, headwind: 5 }, expected: 367.507, tolerance: 0.002 },
  { id: 'jet 1.20 wind', inputs: { loadFactor: 1.2, headwind: 5 }, expected: 352.726, tolerance: 0.002 },
]);
