import { independentProgram } from './takeoff-vectors.ts';

/** Whole landings solved by the same independent program as the takeoffs: the arc alone, level, sea level. SI. Status: computed. */
export const landingProgram = independentProgram;

export interface LandingVector {
  readonly id: string;
  readonly density: number;
  readonly headwind: number;
  readonly brakingFriction: number;
  readonly expected: {
    readonly air: number;
    readonly freeRoll: number;
    readonly brakedRoll: number;
    readonly referenceSpeed: number;
    readonly touchdownSpeed: number;
    readonly stallSpeed: number;
  };
}

/** The aeroplane and procedure of all of them. */
export const landingAeroplane = {
  mass: 1043,
  wingArea: 16.2,
  span: 10.889628092823004,
  wingHeightRatio: 0.2,
  aspectRatio: 7.32,
  oswaldFactor: 0.72,
  groundDragCoefficient: 0.08,
  groundLiftCoefficient: 0.35,
  maximumLiftCoefficient: 1.9,
  screenHeight: 15.24,
  approachAngleDegrees: 3,
  flareLoadFactor: 1.2,
  freeRollTime: 1,
  referenceRatio: 1.3,
  touchdownRatio: 1.15,
  idleThrust: 0,
} as const;

export const landingVectors: readonly LandingVector[] = [
  {
    id: 'landing/0/0.3',
    density: 1.225000018124288,
    headwind: 0,
    brakingFriction: 0.3,
    expected: {
      air: 301.6662752,
      freeRoll: 26.78631519,
      brakedRoll: 124.8250753,
      referenceSpeed: 30.28018239,
      touchdownSpeed: 26.78631519,
      stallSpeed: 23.292448,
    },
  },
  {
    id: 'landing/5/0.2',
    density: 1.225000018124288,
    headwind: 5,
    brakingFriction: 0.2,
    expected: {
      air: 251.5689766,
      freeRoll: 21.78631519,
      brakedRoll: 117.4815294,
      referenceSpeed: 30.28018239,
      touchdownSpeed: 26.78631519,
      stallSpeed: 23.292448,
    },
  },
];
