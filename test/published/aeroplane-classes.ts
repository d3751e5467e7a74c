import type { FigureStatus } from './figures.ts';

/** From lowest to highest, both included. */
export type Range = readonly [lowest: number, highest: number];

/** Typical maximum lift coefficients: clean, takeoff, landing. */
export const maximumLiftRanges = {
  source: 'Roskam, Airplane Design, part I, table 3.1',
  status: 'memory' satisfies FigureStatus,
  singlePropeller: { clean: [1.3, 1.9], takeoff: [1.3, 1.9], landing: [1.6, 2.3] },
  twinPropeller: { clean: [1.2, 1.8], takeoff: [1.4, 2.0], landing: [1.6, 2.5] },
  turboprop: { clean: [1.5, 1.9], takeoff: [1.7, 2.1], landing: [1.9, 3.3] },
  businessJet: { clean: [1.4, 1.8], takeoff: [1.6, 2.2], landing: [1.6, 2.6] },
} as const;

/** Zero-lift drag coefficient and Oswald factor; the definition's own, without gear where it retracts. */
export const polarRanges = {
  source: 'Roskam, Airplane Design, part I, tables 3.4 and 3.6; McCormick, ch. 4',
  status: 'memory' satisfies FigureStatus,
  zeroLift: {
    fixedGearSingle: [0.024, 0.045],
    propellerTwin: [0.023, 0.033],
    utilityTurboprop: [0.025, 0.038],
    jet: [0.015, 0.025],
  },
  oswaldFactor: [0.68, 0.86],
} as const;

/** Stall speed in landing configuration at greatest mass that a single-engined aeroplane may not exceed [kt]. */
export const greatestSingleStallSpeed = {
  value: 61,
  source: '14 CFR 23.49(c) before amendment 64',
  status: 'memory' satisfies FigureStatus,
} as const;

/** Least speeds of the takeoff and landing procedures, over the stall and the minimum control speed. */
export const leastProcedureSpeeds = {
  source: '14 CFR 23.51 and 23.73 before amendment 64',
  status: 'read' satisfies FigureStatus,
  rotation: { single: { stall: 1, control: 0 }, twin: { stall: 1.1, control: 1.05 } },
  screen: { single: { stall: 1.2, control: 0 }, twin: { stall: 1.2, control: 1.1 } },
  landingReference: { stall: 1.3, control: 1 },
} as const;

/** Least gradient of climb at sea level, takeoff configuration, all engines. */
export const leastClimbGradient = {
  source: '14 CFR 23.65 before amendment 64',
  status: 'read' satisfies FigureStatus,
  piston: 0.083,
  turbine: 0.04,
} as const;

/** Least crosswind that has to be demonstrated, over the stall speed in landing configuration. */
export const leastDemonstratedCrosswind = {
  value: 0.2,
  source: '14 CFR 23.233 before amendment 64',
  status: 'memory' satisfies FigureStatus,
} as const;

/** What distances and sizes the classes have at sea level on a standard day; our judgement, from no one aeroplane. */
export const classRanges = {
  source: 'class ranges',
  status: 'judgement',
  /**
   * wing loading [kg/m2], mass over power [kg/kW] or thrust over weight [-], aspect ratio, empty over greatest mass, ground roll
   * and distance to the screen of every takeoff setting [m], gradient of climb at the screen speed out of ground effect
   */
  classes: {
    'pellibrin-trainer': {
      wingLoading: [45, 75],
      thrustToWeight: [0.19, 0.28],
      aspectRatio: [6, 9],
      emptyRatio: [0.6, 0.75],
      groundRoll: [240, 400],
      takeoffDistance: [450, 650],
      climbGradient: [0.06, 0.12],
    },
    'vandrelle-tourer': {
      wingLoading: [70, 110],
      massToPower: [6.5, 9.5],
      aspectRatio: [6.5, 10],
      emptyRatio: [0.58, 0.72],
      groundRoll: [270, 450],
      takeoffDistance: [500, 750],
      climbGradient: [0.06, 0.12],
    },
    'gorrendal-utility': {
      wingLoading: [110, 190],
      massToPower: [4.5, 7.5],
      aspectRatio: [8.5, 12],
      emptyRatio: [0.48, 0.65],
      groundRoll: [300, 520],
      takeoffDistance: [550, 900],
      climbGradient: [0.08, 0.16],
    },
    'sythelor-jet': {
      wingLoading: [200, 330],
      thrustToWeight: [0.28, 0.42],
      aspectRatio: [7.5, 10],
      emptyRatio: [0.55, 0.68],
      groundRoll: [650, 1100],
      takeoffDistance: [850, 1500],
      climbGradient: [0.12, 0.22],
    },
    'duvassel-twin': {
      wingLoading: [85, 150],
      massToPower: [5, 8.5],
      aspectRatio: [7, 10.5],
      emptyRatio: [0.6, 0.75],
      groundRoll: [330, 500],
      takeoffDistance: [550, 800],
      climbGradient: [0.08, 0.16],
    },
    'hobbrick-bush': {
      wingLoading: [38, 62],
      thrustToWeight: [0.27, 0.42],
      aspectRatio: [6, 8.5],
      emptyRatio: [0.52, 0.68],
      groundRoll: [100, 220],
      takeoffDistance: [250, 400],
      climbGradient: [0.1, 0.2],
    },
    'lummivar-electric': {
      wingLoading: [45, 70],
      massToPower: [8, 12],
      aspectRatio: [8, 12],
      emptyRatio: [0.65, 0.8],
      groundRoll: [200, 350],
      takeoffDistance: [400, 600],
      climbGradient: [0.06, 0.13],
    },
  },
} as const;

/** Local exponents of the ground roll at sea level, standard day, still air, paved. */
export const rollExponents = {
  source: 'FAA-H-8083-25 for mass (21 to 30 % for 10 %); AC 23-8 flight-test reduction for density and wind',
  status: 'secondary' satisfies FigureStatus,
  mass: [2.0, 2.75],
  density: [-3, -1.3],
  /** of 1 - w/V_LOF */
  headwind: [1.8, 2.0],
} as const;
