import { figures } from './figures.ts';

/** Greatest tyre-to-ground braking coefficient on a smooth wet runway. */
export const wetBrakingCoefficients = figures(
  {
    source: '14 CFR 25.109(c)(1)',
    section: 'table; curves of 50, 200, 300 psi recalled',
    status: 'computed',
    quantity: 'braking coefficient before anti-skid efficiency',
    unit: '-',
  },
  [
    { id: 'mu-wet-50-0', inputs: { tyre_psi: 50, ground_speed_kt: 0 }, expected: 0.883, tolerance: 1e-5 },
    { id: 'mu-wet-50-50', inputs: { tyre_psi: 50, ground_speed_kt: 50 }, expected: 0.52963, tolerance: 1e-5 },
    { id: 'mu-wet-50-80', inputs: { tyre_psi: 50, ground_speed_kt: 80 }, expected: 0.38012, tolerance: 1e-5 },
    { id: 'mu-wet-50-100', inputs: { tyre_psi: 50, ground_speed_kt: 100 }, expected: 0.303, tolerance: 1e-5 },
    { id: 'mu-wet-50-120', inputs: { tyre_psi: 50, ground_speed_kt: 120 }, expected: 0.24196, tolerance: 1e-5 },
    { id: 'mu-wet-100-0', inputs: { tyre_psi: 100, ground_speed_kt: 0 }, expected: 0.804, tolerance: 1e-5 },
    { id: 'mu-wet-100-50', inputs: { tyre_psi: 100, ground_speed_kt: 50 }, expected: 0.47604, tolerance: 1e-5 },
    { id: 'mu-wet-100-80', inputs: { tyre_psi: 100, ground_speed_kt: 80 }, expected: 0.34243, tolerance: 1e-5 },
    { id: 'mu-wet-100-100', inputs: { tyre_psi: 100, ground_speed_kt: 100 }, expected: 0.2753, tolerance: 1e-5 },
    { id: 'mu-wet-100-120', inputs: { tyre_psi: 100, ground_speed_kt: 120 }, expected: 0.22329, tolerance: 1e-5 },
    { id: 'mu-wet-200-0', inputs: { tyre_psi: 200, ground_speed_kt: 0 }, expected: 0.692, tolerance: 1e-5 },
    { id: 'mu-wet-200-50', inputs: { tyre_psi: 200, ground_speed_kt: 50 }, expected: 0.42186, tolerance: 1e-5 },
    { id: 'mu-wet-200-80', inputs: { tyre_psi: 200, ground_speed_kt: 80 }, expected: 0.30993, tolerance: 1e-5 },
    { id: 'mu-wet-200-100', inputs: { tyre_psi: 200, ground_speed_kt: 100 }, expected: 0.2529, tolerance: 1e-5 },
    { id: 'mu-wet-200-120', inputs: { tyre_psi: 200, ground_speed_kt: 120 }, expected: 0.20808, tolerance: 1e-5 },
    { id: 'mu-wet-300-0', inputs: { tyre_psi: 300, ground_speed_kt: 0 }, expected: 0.614, tolerance: 1e-5 },
    { id: 'mu-wet-300-50', inputs: { tyre_psi: 300, ground_speed_kt: 50 }, expected: 0.36924, tolerance: 1e-5 },
    { id: 'mu-wet-300-80', inputs: { tyre_psi: 300, ground_speed_kt: 80 }, expected: 0.27299, tolerance: 1e-5 },
    { id: 'mu-wet-300-100', inputs: { tyre_psi: 300, ground_speed_kt: 100 }, expected: 0.2259, tolerance: 1e-5 },
    { id: 'mu-wet-300-120', inputs: { tyre_psi: 300, ground_speed_kt: 120 }, expected: 0.19023, tolerance: 1e-5 },
  ],
);

/** The same on a grooved wet runway. */
export const groovedBrakingCoefficients = figures(
  {
    source: '14 CFR 25.109(d)(2)',
    section: 'table; curves recalled',
    status: 'memory',
    quantity: 'braking coefficient on grooves before anti-skid efficiency',
    unit: '-',
  },
  [
    { id: 'mu-grooved-50-50', inputs: { tyre_psi: 50, ground_speed_kt: 50 }, expected: 0.66284, tolerance: 1e-5 },
    { id: 'mu-grooved-50-100', inputs: { tyre_psi: 50, ground_speed_kt: 100 }, expected: 0.349, tolerance: 1e-5 },
    { id: 'mu-grooved-100-50', inputs: { tyre_psi: 100, ground_speed_kt: 50 }, expected: 0.63439, tolerance: 1e-5 },
    { id: 'mu-grooved-100-100', inputs: { tyre_psi: 100, ground_speed_kt: 100 }, expected: 0.3516, tolerance: 1e-5 },
    { id: 'mu-grooved-200-50', inputs: { tyre_psi: 200, ground_speed_kt: 50 }, expected: 0.56893, tolerance: 1e-5 },
    { id: 'mu-grooved-200-100', inputs: { tyre_psi: 200, ground_speed_kt: 100 }, expected: 0.3478, tolerance: 1e-5 },
    { id: 'mu-grooved-300-50', inputs: { tyre_psi: 300, ground_speed_kt: 50 }, expected: 0.4879, tolerance: 1e-5 },
    { id: 'mu-grooved-300-100', inputs: { tyre_psi: 300, ground_speed_kt: 100 }, expected: 0.31286, tolerance: 1e-5 },
  ],
);

/** The 100 psi line with a fully modulating system. */
export const fullyModulatingCoefficients = figures(
  {
    source: '14 CFR 25.109(c)',
    section: '(c)(1) 100 psi times (c)(2) 0.80',
    status: 'read',
    quantity: 'braking coefficient with fully modulating anti-skid',
    unit: '-',
  },
  [
    { id: 'full-0', inputs: { ground_speed_kt: 0 }, expected: 0.64, tolerance: 0.005 },
    { id: 'full-50', inputs: { ground_speed_kt: 50 }, expected: 0.38, tolerance: 0.005 },
    { id: 'full-100', inputs: { ground_speed_kt: 100 }, expected: 0.22, tolerance: 0.005 },
  ],
);

/** Landing distances of textbooks and hand computation. */
export const andersonExample618 = figures(
  {
    source: 'Anderson, Introduction to Flight, 6th ed.',
    section: 'Ex. 6.18, executive jet; inputs read, 842 ft recalled',
    status: 'memory',
    quantity: 'landing ground roll',
    unit: 'm',
  },
  [{ id: 'TB-IF-6.18', inputs: {}, expected: 257.26, tolerance: 0.77 }],
);

/** Light twin, 0.95 x 5374 lb, 134 ft2, CLmax 2.2, 3 degrees from 50 ft, flare at 1.23 V_S, approach at 1.3 V_S. */
export const raymerLanding = figures(
  {
    source: 'Raymer, Aircraft Design, sec. 17.9',
    section: 'method evaluated with read inputs, R = Vf^2/(0.2 g), g 32.2',
    status: 'computed',
    quantity: 'part of the air distance',
    unit: 'ft',
  },
  [
    { id: 'TB-RAYMER-LDG radius', inputs: { part: 'radius' as const }, expected: 3422.85, tolerance: 3.4 },
    { id: 'TB-RAYMER-LDG flare height', inputs: { part: 'flareHeight' as const }, expected: 4.691, tolerance: 0.0047 },
    { id: 'TB-RAYMER-LDG approach', inputs: { part: 'straight' as const }, expected: 864.55, tolerance: 0.86 },
    { id: 'TB-RAYMER-LDG flare', inputs: { part: 'flare' as const }, expected: 179.14, tolerance: 0.18 },
  ],
);

/** A trainer (1043 kg, 16.2 m2, lift coefficient 0.20, C_D0 0.037) braked from 26 m/s without thrust. */
export const trainerStops = figures(
  {
    source: 'braked roll by an independent computation',
    section: 'sea level, standard day, still air, level',
    status: 'computed',
    quantity: 'braked roll',
    unit: 'm',
  },
  [
    { id: 'stop-0.4', inputs: { friction: 0.4 }, expected: 89, tolerance: 0.6 },
    { id: 'stop-0.2', inputs: { friction: 0.2 }, expected: 173, tolerance: 0.6 },
    { id: 'stop-0.1', inputs: { friction: 0.1 }, expected: 325, tolerance: 0.6 },
    { id: 'stop-0.05', inputs: { friction: 0.05 }, expected: 585, tolerance: 0.6 },
  ],
);
