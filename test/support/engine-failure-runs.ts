import type { EngineFailureRun, StopTimeline } from '../../src/performance/engine-failure/engine-failure-run.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { constantBraking } from '../../src/physics/braking-friction.ts';
import type { Thrust } from '../../src/physics/thrust/thrust.ts';
import { balancedFieldAeroplane as jet } from '../published/balanced-field.ts';
import { quadraticThrust } from './plain-run.ts';

const g = 9.80665;

export const noDelay: StopTimeline = {
  recognitionTime: 0,
  timeAtDecisionSpeed: 0,
  continuedAccelerationTime: 0,
  transitionTime: 0,
};

/** A share of a thrust: of the engines that still run. */
export function shareOfThrust(thrust: Thrust, share: number): Thrust {
  return {
    ...thrust,
    at: (airspeed) => share * thrust.at(airspeed),
    fill: (airspeeds, n, out) => {
      thrust.fill(airspeeds, n, out);
      for (let i = 0; i < n; i++) out[i] = share * (out[i] as number);
    },
  };
}

/** A takeoff with a failure of one engine of two, from the takeoff with both: brakes, idle and speeds as they come. */
export function withFailure(allEngines: TakeoffRun, changes: Partial<EngineFailureRun> = {}): EngineFailureRun {
  const { mass, wingArea, span, wingHeight, inducedDragFactor, density, headwind, slope, profile } = allEngines;
  return {
    allEngines,
    remainingThrust: shareOfThrust(allEngines.thrust, 0.5),
    dragIncrementCoefficient: 0,
    rotationSpeed: allEngines.rotationSpeed,
    liftOffSpeed: allEngines.liftOffSpeed,
    screenSpeed: allEngines.screenSpeed,
    screenHeight: allEngines.screenHeight,
    stop: {
      mass,
      wingArea,
      span,
      wingHeight,
      inducedDragFactor,
      density,
      headwind,
      slope,
      profile,
      groundDragCoefficient: allEngines.groundDragCoefficient,
      groundLiftCoefficient: allEngines.groundLiftCoefficient,
      braking: constantBraking(0.3),
      idleThrust: 0,
    },
    idleThrustAllEngines: 0,
    timeline: noDelay,
    ...changes,
  };
}

/** One-g stall speed of the published problem [m/s], and its induced drag factors: free air, and its own law on the ground. */
const stallSpeed = Math.sqrt((2 * jet.mass * g) / (jet.density * jet.wingArea * jet.maximumLift));
const freeInduced = 1 / (Math.PI * jet.aspectRatio * jet.oswaldFactor);
const ownHeight = 33 * (jet.wingHeight / (jet.span / 2)) ** 1.5;
const groundInduced = (freeInduced * ownHeight) / (1 + ownHeight);
export const balancedFieldSpeeds = { stallSpeed, rotation: 1.2 * stallSpeed, screen: 1.25 * stallSpeed };

/** The published problem; its own drag in ground effect on the wheels where asked for, ours in the air. */
export function balancedFieldRun(liftOffSpeed: number, groundDrag: 'own' | 'ours', loadFactor = 1.1): EngineFailureRun {
  // far enough above the ground our factor is 1, and the problem's own drag on the ground is all of it
  const own = groundDrag === 'own';
  return withFailure({
    mass: jet.mass,
    wingArea: jet.wingArea,
    span: jet.span,
    wingHeight: own ? jet.span : jet.wingHeight,
    inducedDragFactor: own ? groundInduced : freeInduced,
    groundDragCoefficient: jet.zeroLiftDrag,
    airDragCoefficient: jet.zeroLiftDrag,
    groundLiftCoefficient: jet.groundLift,
    rollingFriction: jet.rollingFriction,
    thrust: quadraticThrust(jet.thrustOfBoth),
    density: jet.density,
    headwind: 0,
    slope: 0,
    rotationSpeed: Math.min(liftOffSpeed, balancedFieldSpeeds.rotation),
    liftOffSpeed,
    screenSpeed: Math.max(liftOffSpeed, balancedFieldSpeeds.screen),
    rotationTime: 0,
    pullUpLoadFactor: loadFactor,
    screenHeight: jet.screenHeight,
  });
}
