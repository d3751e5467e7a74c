import fc from 'fast-check';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { actuatorDiscThrust } from '../../src/physics/thrust/actuator-disc.ts';
import { fixedPitchThrust } from '../../src/physics/thrust/fixed-pitch.ts';
import { jetThrust } from '../../src/physics/thrust/jet.ts';
import { measuredThrust } from '../../src/physics/thrust/measured.ts';
import type { Thrust } from '../../src/physics/thrust/thrust.ts';
import { standardAir } from './standard-air.ts';

const g = 9.80665;
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

export const kinds = ['fixed-pitch', 'disc', 'capped-disc', 'jet', 'measured'] as const;
export type Kind = (typeof kinds)[number];

/** The free figures of a takeoff: ratios, so that most of them fly. */
export interface Figures {
  readonly kind: Kind;
  readonly mass: number;
  readonly wingLoading: number;
  readonly thrustToWeight: number;
  readonly pressureAltitude: number;
  readonly deviation: number;
  readonly aspectRatio: number;
  readonly heightRatio: number;
  readonly groundDrag: number;
  readonly airDrag: number;
  readonly groundLift: number;
  readonly maximumLift: number;
  readonly liftOffRatio: number;
  readonly screenRatio: number;
  readonly friction: number;
  readonly headwindRatio: number;
  readonly slope: number;
  readonly loadFactor: number;
  readonly rotationTime: number;
  readonly screenHeight: number;
}

/** Figures of any light aeroplane to an airliner, as wide as the contract's bounds in what decides the integrals. */
export const anyFigures: fc.Arbitrary<Figures> = fc.record({
  kind: fc.constantFrom(...kinds),
  mass: between(200, 100_000),
  wingLoading: between(200, 6500),
  thrustToWeight: between(0.08, 0.6),
  pressureAltitude: between(-400, 4500),
  deviation: between(-40, 40),
  aspectRatio: between(4, 16),
  heightRatio: between(0.01, 0.5),
  groundDrag: between(0.015, 0.15),
  airDrag: between(0.015, 0.1),
  groundLift: between(-0.2, 1.5),
  maximumLift: between(1, 3),
  liftOffRatio: between(1, 1.3),
  screenRatio: between(0.95, 1.3),
  friction: between(0, 0.25),
  headwindRatio: between(-0.6, 1.1),
  slope: between(-0.06, 0.06),
  loadFactor: between(1.02, 1.3),
  rotationTime: between(0, 4),
  screenHeight: fc.constantFrom(10.668, 15.24),
});

/** Figures of takeoffs that succeed comfortably: for comparisons of distances. */
export const easyFigures: fc.Arbitrary<Figures> = anyFigures.map((figures) => ({
  ...figures,
  thrustToWeight: 0.25 + figures.thrustToWeight * 0.5,
  groundDrag: Math.min(0.08, figures.groundDrag),
  airDrag: Math.min(0.06, figures.airDrag),
  groundLift: Math.abs(figures.groundLift) * 0.5,
  pressureAltitude: Math.min(1500, figures.pressureAltitude),
  deviation: Math.min(20, figures.deviation),
  friction: Math.min(0.1, figures.friction),
  headwindRatio: Math.max(-0.3, Math.min(0.6, figures.headwindRatio)),
  slope: figures.slope / 3,
  liftOffRatio: Math.max(1.05, figures.liftOffRatio),
}));

/** Thrust of a static thrust at sea level [N], falling with airspeed as its kind does. */
function thrustOf(kind: Kind, atRest: number, figures: Figures, speed: number): Thrust {
  const air = standardAir(figures.pressureAltitude, figures.deviation);
  if (kind === 'jet') return jetThrust({ staticThrust: atRest, flatRating: 15, thrustFactor: 1 }, 1, air);
  if (kind === 'measured') {
    const airspeeds = [0, 0.3, 0.7, 1.1, 2].map((share) => share * speed);
    const thrusts = [1, 0.97, 0.85, 0.7, 0.4].map((share) => share * atRest);
    return measuredThrust({ airspeeds, thrusts, density: 1.225, densityExponent: 1, thrustFactor: 1 }, 1, air);
  }
  if (kind === 'fixed-pitch') {
    const lapse = { altitudeLapseCoefficient: 0.18, temperatureExponent: 0.9, humidityFactor: 0, thrustFactor: 1 };
    const diameter = Math.sqrt((0.2 * atRest) / (0.056 * 1.225 * speed * speed));
    return fixedPitchThrust(
      { ...lapse, staticThrust: atRest, propellerDiameter: diameter, polarSlopeCoefficient: 0.056 },
      1,
      air,
    );
  }
  const induced = 0.5 * speed;
  const area = atRest / (2 * 1.225 * induced * induced);
  const power = (1.15 / 0.88) * atRest * induced;
  const disc = {
    propellerDiameter: Math.sqrt((4 * area) / Math.PI),
    profileFactor: 0.88,
    inducedFactor: 1.15,
    thrustFactor: 1,
  };
  const capped = kind === 'capped-disc' ? { ...disc, staticThrust: 0.85 * atRest } : disc;
  return actuatorDiscThrust(capped, 1, power, power, air.density);
}

/** The run of such figures. */
export function runOf(figures: Figures): TakeoffRun {
  const { mass, wingLoading, aspectRatio, maximumLift, liftOffRatio, screenRatio } = figures;
  const { density } = standardAir(figures.pressureAltitude, figures.deviation);
  const wingArea = (mass * g) / wingLoading;
  const span = Math.sqrt(aspectRatio * wingArea);
  const stallSpeed = Math.sqrt((2 * wingLoading) / (density * maximumLift));
  const liftOffSpeed = liftOffRatio * stallSpeed;
  const seaLevelSpeed = 1.15 * Math.sqrt((2 * wingLoading) / (1.225 * maximumLift));
  return {
    mass,
    wingArea,
    span,
    wingHeight: figures.heightRatio * span,
    inducedDragFactor: 1 / (Math.PI * aspectRatio * 0.78),
    groundDragCoefficient: figures.groundDrag,
    airDragCoefficient: figures.airDrag,
    groundLiftCoefficient: figures.groundLift,
    rollingFriction: figures.friction,
    thrust: thrustOf(figures.kind, figures.thrustToWeight * mass * g, figures, seaLevelSpeed),
    density,
    headwind: figures.headwindRatio * liftOffSpeed,
    slope: figures.slope,
    rotationSpeed: liftOffSpeed,
    liftOffSpeed,
    screenSpeed: screenRatio * liftOffSpeed,
    rotationTime: figures.rotationTime,
    pullUpLoadFactor: figures.loadFactor,
    screenHeight: figures.screenHeight,
  };
}
