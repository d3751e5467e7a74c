import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../../src/physics/thrust/thrust.ts';

/** A thrust T0 + T2 V^2 [N]. */
export function quadraticThrust(atRest: number, perSquare = 0): Thrust {
  const at = (airspeed: number) => atRest + perSquare * Math.max(0, airspeed) ** 2;
  return {
    at,
    fill: (airspeeds, n, out) => {
      for (let i = 0; i < n; i++) out[i] = at(airspeeds[i] as number);
    },
    kinks: [],
  };
}

/** A run without friction, drag, wind or slope, unit mass and wing in air of unit density: what a test sets stands alone. */
export function plainRun(changes: Partial<TakeoffRun>): TakeoffRun {
  const liftOffSpeed = changes.liftOffSpeed ?? 30;
  return {
    mass: 1,
    wingArea: 1,
    span: 10,
    wingHeight: 2,
    inducedDragFactor: 0,
    groundDragCoefficient: 0,
    airDragCoefficient: 0,
    groundLiftCoefficient: 0,
    rollingFriction: 0,
    thrust: quadraticThrust(2),
    density: 1,
    headwind: 0,
    slope: 0,
    rotationSpeed: liftOffSpeed,
    liftOffSpeed,
    screenSpeed: liftOffSpeed,
    rotationTime: 0,
    pullUpLoadFactor: 1.1,
    screenHeight: 15.24,
    ...changes,
  };
}
