import fc from 'fast-check';
import type { EngineFailureRun, StopTimeline } from '../../src/performance/engine-failure/engine-failure-run.ts';
import type { SlopeProfile } from '../../src/performance/slope-profile.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { constantBraking } from '../../src/physics/braking-friction.ts';
import type { Thrust } from '../../src/physics/thrust/thrust.ts';
import { balancedFieldAeroplane as jet } from '../published/balanced-field.ts';
import { quadraticThrust } from './plain-run.ts';
import { easyFigures, runOf } from './takeoff-runs.ts';

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

const range = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A takeoff with a failure and a decision speed on the way. */
export interface FailureAsked {
  readonly run: EngineFailureRun;
  readonly decisionSpeed: number;
}

/** Failures of any light twin to an airliner: wind, slope or profile, delays, brakes that fade with speed, slush. */
export const anyFailure: fc.Arbitrary<FailureAsked> = fc
  .record({
    figures: easyFigures,
    friction: range(0.08, 0.45),
    fading: range(0, 0.6),
    idle: range(0, 0.02),
    increment: range(0, 0.02),
    share: range(0.4, 1),
    timeline: fc.record({
      recognitionTime: range(0, 3),
      timeAtDecisionSpeed: fc.constantFrom(0, 2),
      continuedAccelerationTime: fc.constantFrom(0, 2),
      transitionTime: range(0, 2),
    }),
    ground: fc.constantFrom<'slope' | 'profile' | 'slush'>('slope', 'profile', 'slush'),
    slopes: fc.array(range(-0.02, 0.02), { minLength: 3, maxLength: 3 }),
    length: range(100, 700),
    displaced: range(0.0005, 0.004),
    remaining: range(0.5, 0.75),
  })
  .map(
    ({ figures, friction, fading, idle, increment, share, timeline, ground, slopes, length, displaced, remaining }) => {
      const still = runOf({ ...figures, friction: Math.min(0.05, figures.friction) });
      const { mass, liftOffSpeed, headwind } = still;
      const profile: SlopeProfile = { ends: [length, 2 * length, 3 * length], slopes };
      const perSquare = displaced * mass;
      const allEngines: TakeoffRun = {
        ...still,
        ...(ground === 'profile' && { profile }),
        ...(ground === 'slush' && { contaminantDrag: 0.3 * perSquare }),
      };
      const plain = withFailure(allEngines, {
        remainingThrust: shareOfThrust(allEngines.thrust, remaining),
        dragIncrementCoefficient: increment,
        idleThrustAllEngines: 2 * idle * mass * g,
        timeline,
      });
      const kink = 0.5 * liftOffSpeed;
      const braking = {
        at: (speed: number) => friction * (1 - fading * Math.min(1, Math.max(0, speed / kink))),
        kinks: [kink],
      };
      const contaminantDrag = { perSquare: 0.1 * perSquare, below: 0.7 * liftOffSpeed };
      const run: EngineFailureRun = {
        ...plain,
        stop: {
          ...plain.stop,
          braking,
          idleThrust: idle * mass * g,
          groundLiftCoefficient: 0.2 * plain.stop.groundLiftCoefficient,
          groundDragCoefficient: plain.stop.groundDragCoefficient + 0.02,
          ...(ground === 'slush' && { contaminantDrag }),
        },
      };
      return { run, decisionSpeed: headwind + share * (liftOffSpeed - headwind) };
    },
  );
