import type { Propulsion } from '../../src/performance/aeroplane.ts';

/**
 * Whole takeoffs and landings solved by an independent program: DOP853 at rtol 1e-11 and adaptive quadrature, printed to ten
 * digits. SI. Status: computed. Relative tolerance 1e-6.
 */
export const independentProgram = {
  source: 'independent program, DOP853 at rtol 1e-11 and adaptive quadrature',
  status: 'computed',
  tolerance: 1e-6,
} as const;

export interface TakeoffVector {
  readonly id: string;
  readonly air: { readonly pressureAltitude: number; readonly temperature: number; readonly density: number };
  readonly aeroplane: keyof typeof vectorAeroplanes;
  readonly rollingFriction: number;
  readonly headwind: number;
  readonly slope: number;
  readonly expected: {
    readonly roll: number;
    readonly rollTime: number;
    readonly air: number;
    readonly airTime: number;
    readonly stallSpeed: number;
    readonly liftOffSpeed: number;
    readonly screenSpeed: number;
  };
}

export interface VectorAeroplane {
  readonly mass: number;
  readonly wingArea: number;
  readonly span: number;
  readonly wingHeightRatio: number;
  readonly aspectRatio: number;
  readonly oswaldFactor: number;
  readonly groundDragCoefficient: number;
  readonly airDragCoefficient: number;
  readonly groundLiftCoefficient: number;
  readonly maximumLiftCoefficient: number;
  readonly liftOffRatio: number;
  readonly screenRatio: number;
  readonly screenHeight: number;
  readonly pullUpLoadFactor: number;
  readonly engines: number;
  readonly propulsion: Propulsion;
}

export const vectorAeroplanes = {
  'fixed-pitch': {
    mass: 1043,
    wingArea: 16.2,
    span: 10.889628092823004,
    wingHeightRatio: 0.2,
    aspectRatio: 7.32,
    oswaldFactor: 0.72,
    groundDragCoefficient: 0.037,
    airDragCoefficient: 0.037,
    groundLiftCoefficient: 0.35,
    maximumLiftCoefficient: 1.6,
    liftOffRatio: 1.15,
    screenRatio: 1.2,
    screenHeight: 15.24,
    pullUpLoadFactor: 1.1,
    engines: 1,
    propulsion: {
      kind: 'fixed-pitch',
      staticThrust: 2366,
      propellerDiameter: 1.905,
      polarSlopeCoefficient: 0.0564,
      altitudeLapseCoefficient: 0.12,
      temperatureExponent: 0.5,
      humidityFactor: 0,
      thrustFactor: 1,
    },
  },
  'constant-speed': {
    mass: 1542,
    wingArea: 16.5,
    span: 11.049886877249016,
    wingHeightRatio: 0.1,
    aspectRatio: 7.4,
    oswaldFactor: 0.75,
    groundDragCoefficient: 0.035,
    airDragCoefficient: 0.03,
    groundLiftCoefficient: 0.4,
    maximumLiftCoefficient: 1.75,
    liftOffRatio: 1.15,
    screenRatio: 1.2,
    screenHeight: 15.24,
    pullUpLoadFactor: 1.1,
    engines: 1,
    propulsion: {
      kind: 'constant-speed',
      power: 212_000,
      propellerDiameter: 2.08,
      profileFactor: 0.88,
      inducedFactor: 1.15,
      altitudeLapseCoefficient: 0.132 / 1.132,
      temperatureExponent: 0.5,
      humidityFactor: 0,
      thrustFactor: 1,
    },
  },
  jet: {
    mass: 70000,
    wingArea: 122.4,
    span: 34.09985337211877,
    wingHeightRatio: 0.1,
    aspectRatio: 9.5,
    oswaldFactor: 0.8,
    groundDragCoefficient: 0.05,
    airDragCoefficient: 0.03,
    groundLiftCoefficient: 0.5,
    maximumLiftCoefficient: 2.0,
    liftOffRatio: 1.1,
    screenRatio: 1.2,
    screenHeight: 10.668,
    pullUpLoadFactor: 1.1,
    engines: 2,
    propulsion: { kind: 'jet', staticThrust: 118_000, flatRating: 15, thrustFactor: 1 },
  },
} as const satisfies Record<string, VectorAeroplane>;

export const takeoffVectors: readonly TakeoffVector[] = [
  {
    id: 'fixed-pitch/sea-level/0',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'fixed-pitch',
    rollingFriction: 0.03,
    headwind: 0,
    slope: 0,
    expected: {
      roll: 245.8388843,
      rollTime: 16.13409146,
      air: 213.4234557,
      airTime: 7.201728958,
      stallSpeed: 25.38235674,
      liftOffSpeed: 29.18971025,
      screenSpeed: 30.45882809,
    },
  },
  {
    id: 'fixed-pitch/sea-level/4',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'fixed-pitch',
    rollingFriction: 0.06,
    headwind: 4,
    slope: 0.01,
    expected: {
      roll: 231.9898024,
      rollTime: 17.63839332,
      air: 196.9617178,
      airTime: 7.675372086,
      stallSpeed: 25.38235674,
      liftOffSpeed: 29.18971025,
      screenSpeed: 30.45882809,
    },
  },
  {
    id: 'fixed-pitch/hot-high/-2.5',
    air: { pressureAltitude: 1627.0888955333958, temperature: 305.15, density: 0.9443140278667532 },
    aeroplane: 'fixed-pitch',
    rollingFriction: 0.03,
    headwind: -2.5,
    slope: -0.01,
    expected: {
      roll: 465.6562135,
      rollTime: 24.68255923,
      air: 381.1445412,
      airTime: 10.47329299,
      stallSpeed: 28.90957923,
      liftOffSpeed: 33.24601611,
      screenSpeed: 34.69149507,
    },
  },
  {
    id: 'constant-speed/sea-level/0',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'constant-speed',
    rollingFriction: 0.03,
    headwind: 0,
    slope: 0,
    expected: {
      roll: 217.1828448,
      rollTime: 11.8592592,
      air: 193.0778656,
      airTime: 5.678441481,
      stallSpeed: 29.24074803,
      liftOffSpeed: 33.62686024,
      screenSpeed: 35.08889764,
    },
  },
  {
    id: 'constant-speed/sea-level/4',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'constant-speed',
    rollingFriction: 0.06,
    headwind: 4,
    slope: 0.01,
    expected: {
      roll: 198.7351621,
      rollTime: 12.33159365,
      air: 173.3452843,
      airTime: 5.774499561,
      stallSpeed: 29.24074803,
      liftOffSpeed: 33.62686024,
      screenSpeed: 35.08889764,
    },
  },
  {
    id: 'constant-speed/hot-high/-2.5',
    air: { pressureAltitude: 1627.0888955333958, temperature: 305.15, density: 0.9443140278667532 },
    aeroplane: 'constant-speed',
    rollingFriction: 0.03,
    headwind: -2.5,
    slope: -0.01,
    expected: {
      roll: 418.6112162,
      rollTime: 18.52075868,
      air: 287.2087328,
      airTime: 6.935051335,
      stallSpeed: 33.30414628,
      liftOffSpeed: 38.29976822,
      screenSpeed: 39.96497554,
    },
  },
  {
    id: 'jet/sea-level/0',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'jet',
    rollingFriction: 0.02,
    headwind: 0,
    slope: 0,
    expected: {
      roll: 1127.897392,
      rollTime: 28.84222949,
      air: 412.6420962,
      airTime: 5.353940856,
      stallSpeed: 67.66289904,
      liftOffSpeed: 74.42918894,
      screenSpeed: 81.19547884,
    },
  },
  {
    id: 'jet/sea-level/4',
    air: { pressureAltitude: 0.0, temperature: 288.15, density: 1.225000018124288 },
    aeroplane: 'jet',
    rollingFriction: 0.06,
    headwind: 4,
    slope: 0.01,
    expected: {
      roll: 1229.746041,
      rollTime: 33.34566506,
      air: 402.2091083,
      airTime: 5.500497763,
      stallSpeed: 67.66289904,
      liftOffSpeed: 74.42918894,
      screenSpeed: 81.19547884,
    },
  },
  {
    id: 'jet/hot-high/-2.5',
    air: { pressureAltitude: 1627.0888955333958, temperature: 305.15, density: 0.9443140278667532 },
    aeroplane: 'jet',
    rollingFriction: 0.02,
    headwind: -2.5,
    slope: -0.01,
    expected: {
      roll: 2134.122212,
      rollTime: 45.77713712,
      air: 724.1391073,
      airTime: 7.971770341,
      stallSpeed: 77.06557592,
      liftOffSpeed: 84.77213351,
      screenSpeed: 92.4786911,
    },
  },
];
