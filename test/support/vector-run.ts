import { propulsionThrust } from '../../src/performance/propulsion.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { standardPressure } from '../../src/physics/atmosphere.ts';
import { inducedDragFactor } from '../../src/physics/drag.ts';
import { type TakeoffVector, type VectorAeroplane, vectorAeroplanes } from '../published/takeoff-vectors.ts';

const g = 9.80665;

/** The run of one published vector; its speeds from the vector's own stall formula. */
export function vectorRun(vector: TakeoffVector): TakeoffRun & { readonly stallSpeed: number } {
  const aeroplane: VectorAeroplane = vectorAeroplanes[vector.aeroplane];
  const { air, headwind, slope, rollingFriction } = vector;
  const stallSpeed = Math.sqrt(
    (2 * aeroplane.mass * g) / (air.density * aeroplane.wingArea * aeroplane.maximumLiftCoefficient),
  );
  const liftOffSpeed = aeroplane.liftOffRatio * stallSpeed;
  return {
    stallSpeed,
    mass: aeroplane.mass,
    wingArea: aeroplane.wingArea,
    span: aeroplane.span,
    wingHeight: aeroplane.wingHeightRatio * aeroplane.span,
    inducedDragFactor: inducedDragFactor(aeroplane.span, aeroplane.wingArea, aeroplane.oswaldFactor),
    groundDragCoefficient: aeroplane.groundDragCoefficient,
    airDragCoefficient: aeroplane.airDragCoefficient,
    groundLiftCoefficient: aeroplane.groundLiftCoefficient,
    rollingFriction,
    thrust: propulsionThrust(aeroplane.propulsion, aeroplane.engines, {
      ...air,
      pressure: standardPressure(air.pressureAltitude),
    }),
    density: air.density,
    headwind,
    slope,
    rotationSpeed: liftOffSpeed,
    liftOffSpeed,
    screenSpeed: aeroplane.screenRatio * stallSpeed,
    rotationTime: 0,
    pullUpLoadFactor: aeroplane.pullUpLoadFactor,
    screenHeight: aeroplane.screenHeight,
  };
}
