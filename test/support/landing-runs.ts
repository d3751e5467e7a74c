import fc from 'fast-check';
import type { LandingRun } from '../../src/performance/landing/landing-run.ts';
import { constantBraking } from '../../src/physics/braking-friction.ts';
import { type LandingVector, landingAeroplane } from '../published/landing-vectors.ts';

const g = 9.80665;

/** The run of one published landing. */
export function landingVectorRun(vector: LandingVector): LandingRun & { readonly stallSpeed: number } {
  const aeroplane = landingAeroplane;
  const { mass, wingArea, span } = aeroplane;
  const stallSpeed = Math.sqrt((2 * mass * g) / (vector.density * wingArea * aeroplane.maximumLiftCoefficient));
  return {
    stallSpeed,
    mass,
    wingArea,
    span,
    wingHeight: aeroplane.wingHeightRatio * span,
    inducedDragFactor: 1 / (Math.PI * aeroplane.aspectRatio * aeroplane.oswaldFactor),
    groundDragCoefficient: aeroplane.groundDragCoefficient,
    groundLiftCoefficient: aeroplane.groundLiftCoefficient,
    braking: constantBraking(vector.brakingFriction),
    idleThrust: aeroplane.idleThrust,
    density: vector.density,
    headwind: vector.headwind,
    slope: 0,
    referenceSpeed: aeroplane.referenceRatio * stallSpeed,
    touchdownSpeed: aeroplane.touchdownRatio * stallSpeed,
    approachAngle: (aeroplane.approachAngleDegrees * Math.PI) / 180,
    flareLoadFactor: aeroplane.flareLoadFactor,
    screenHeight: aeroplane.screenHeight,
    freeRollTime: aeroplane.freeRollTime,
  };
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Landings of any light aeroplane to an airliner, as wide as the contract's bounds in what decides the distances. */
export const anyLanding: fc.Arbitrary<LandingRun> = fc
  .record({
    mass: between(200, 100_000),
    wingLoading: between(200, 6000),
    density: between(0.7, 1.4),
    maximumLift: between(1.2, 3.2),
    groundLift: between(-0.1, 1),
    groundDrag: between(0.02, 0.2),
    heightRatio: between(0.03, 0.4),
    friction: between(0.02, 0.5),
    idleRatio: between(-0.05, 0.04),
    headwindRatio: between(-0.6, 1.1),
    slope: between(-0.05, 0.05),
    referenceRatio: between(1.2, 1.4),
    touchdownShare: between(0.8, 1),
    approachDegrees: between(1.5, 8),
    flareLoadFactor: between(1.03, 1.4),
    freeRollTime: between(0, 4),
    fitted: fc.boolean(),
  })
  .map((figures): LandingRun => {
    const wingArea = (figures.mass * g) / figures.wingLoading;
    const span = Math.sqrt(8 * wingArea);
    const stall = Math.sqrt((2 * figures.wingLoading) / (figures.density * figures.maximumLift));
    const referenceSpeed = figures.referenceRatio * stall;
    const touchdownSpeed = figures.touchdownShare * referenceSpeed;
    return {
      mass: figures.mass,
      wingArea,
      span,
      wingHeight: figures.heightRatio * span,
      inducedDragFactor: 1 / (Math.PI * 8 * 0.75),
      groundDragCoefficient: figures.groundDrag,
      groundLiftCoefficient: figures.groundLift,
      braking: constantBraking(figures.friction),
      idleThrust: figures.idleRatio * figures.mass * g,
      density: figures.density,
      headwind: figures.headwindRatio * touchdownSpeed,
      slope: figures.slope,
      referenceSpeed,
      touchdownSpeed,
      approachAngle: (figures.approachDegrees * Math.PI) / 180,
      flareLoadFactor: figures.flareLoadFactor,
      screenHeight: 15.24,
      freeRollTime: figures.freeRollTime,
      ...(figures.fitted ? {} : { floatDecelerationRatio: 0.12 }),
    };
  });
