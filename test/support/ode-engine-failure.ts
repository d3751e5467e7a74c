import type { EngineFailureRun } from '../../src/performance/engine-failure/engine-failure-run.ts';
import type { BrakedRun } from '../../src/performance/landing/landing-run.ts';
import type { SlopeProfile } from '../../src/performance/slope-profile.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { odeAcceleration } from './ode-takeoff.ts';
import { odexState } from './odex.ts';

const g = 9.80665;
const tolerance = 1e-10;

/** Where the aeroplane is [m], how fast through the air [m/s], and the heat in its brakes [J]. */
export type Motion = readonly [distance: number, airspeed: number, heat: number];
/** m/s2 and W at a place and an airspeed. */
type Law = (distance: number, airspeed: number) => { readonly acceleration: number; readonly heating: number };

/** The ground's slope under a place, level stretches of a profile looked up. */
function slopeAt(
  run: { readonly slope: number; readonly profile?: SlopeProfile | undefined },
  distance: number,
): number {
  if (run.profile === undefined) return run.slope;
  const { ends, slopes } = run.profile;
  const at = ends.findIndex((end) => distance < end);
  return slopes[at < 0 ? slopes.length - 1 : at] as number;
}

function accelerating(run: TakeoffRun): Law {
  return (distance, airspeed) => ({
    acceleration: odeAcceleration({ ...run, slope: slopeAt(run, distance) }, airspeed),
    heating: 0,
  });
}

/** The braked wheels, forces written out again. */
function braking(run: BrakedRun): Law {
  const r = Math.max(0.03, run.wingHeight / run.span);
  const effect = Math.min(1, 1 - (1 - 1.32 * r) / (1.05 + 7.4 * r));
  const lift = run.groundLiftCoefficient;
  const drag = run.groundDragCoefficient + effect * run.inducedDragFactor * lift * lift;
  return (distance, airspeed) => {
    const groundSpeed = airspeed - run.headwind;
    const pressure = 0.5 * run.density * airspeed * Math.abs(airspeed) * run.wingArea;
    const stretch = run.stretches?.find(({ end }) => distance < end) ?? run.stretches?.at(-1) ?? run;
    const friction = stretch.braking.at(groundSpeed) * Math.max(0, run.mass * g - pressure * lift);
    const slope = run.profile === undefined ? (stretch.slope ?? run.slope) : slopeAt(run, distance);
    const { contaminantDrag: contaminant } = stretch;
    const displaced =
      contaminant !== undefined && groundSpeed < contaminant.below ? contaminant.perSquare * groundSpeed ** 2 : 0;
    const reverse = run.reverseThrust;
    const thrust = reverse !== undefined && groundSpeed >= reverse.cutOffSpeed ? -reverse.thrust : run.idleThrust;
    const force = thrust - pressure * drag - friction - displaced - run.mass * g * slope;
    return { acceleration: force / run.mass, heating: friction * groundSpeed };
  };
}

function onward(law: Law, headwind: number, motion: Motion, seconds: number): Motion {
  const state = odexState(
    (_, [distance, airspeed]) => {
      const { acceleration, heating } = law(distance as number, airspeed as number);
      return [(airspeed as number) - headwind, acceleration, heating];
    },
    motion,
    0,
    seconds,
    tolerance,
  );
  return state as unknown as Motion;
}

/** Steps in time until a speed is reached, the last step cut there by the secant rule. */
function untilSpeed(law: Law, headwind: number, motion: Motion, airspeed: number): { motion: Motion; time: number } {
  const step = 0.5;
  const rising = airspeed > motion[1];
  let at = motion;
  for (let time = 0; time < 3000; time += step) {
    const next = onward(law, headwind, at, step);
    if (rising ? next[1] >= airspeed : next[1] <= airspeed) {
      const part = root((seconds) => onward(law, headwind, at, seconds)[1] - airspeed, 0, step);
      return { motion: onward(law, headwind, at, part), time: time + part };
    }
    at = next;
  }
  throw new Error(`${airspeed} m/s is not reached`);
}

/** Root in a bracket by halving and secants in turn: no rule of the house's own. */
function root(f: (x: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  let [fa, fb] = [f(a), f(b)];
  for (let i = 0; i < 80 && Math.abs(b - a) > 1e-11; i++) {
    const x = i % 3 === 2 ? (a + b) / 2 : Math.min(b, Math.max(a, a - (fa * (b - a)) / (fb - fa)));
    const fx = f(x);
    if (Math.abs(fx) < 1e-11) return x;
    if (fx < 0 === fa < 0) [a, fa] = [x, fx];
    else [b, fb] = [x, fx];
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b;
}

/** The takeoff on one engine, written out again. */
function oneOut(run: EngineFailureRun): TakeoffRun {
  const { allEngines, dragIncrementCoefficient: more } = run;
  return {
    ...allEngines,
    thrust: run.remainingThrust,
    groundDragCoefficient: allEngines.groundDragCoefficient + more,
    airDragCoefficient: allEngines.airDragCoefficient + more,
    rotationSpeed: run.rotationSpeed,
    liftOffSpeed: run.liftOffSpeed,
    screenSpeed: run.screenSpeed,
    screenHeight: run.screenHeight,
  };
}

/** The time of the failure after which V1 is reached in the recognition time, found by shooting; the motion at both. */
export function odeFailure(run: EngineFailureRun, decisionSpeed: number) {
  const { headwind } = run.allEngines;
  const { recognitionTime } = run.timeline;
  const still: Motion = [0, headwind, 0];
  const all = untilSpeed(accelerating(run.allEngines), headwind, still, decisionSpeed);
  const failing = accelerating(oneOut(run));
  const failedAt = (seconds: number) => onward(accelerating(run.allEngines), headwind, still, seconds);
  const time = root(
    (seconds) => onward(failing, headwind, failedAt(seconds), recognitionTime)[1] - decisionSpeed,
    0,
    all.time,
  );
  const failure = failedAt(time);
  return { failure, atDecision: onward(failing, headwind, failure, recognitionTime), allAtDecision: all.motion, time };
}

/** Both stops from brake release, the whole timeline in steps of time. */
export function odeStop(run: EngineFailureRun, decisionSpeed: number) {
  const { failure, atDecision, allAtDecision } = odeFailure(run, decisionSpeed);
  const { stop } = run;
  const failedStop = { ...stop, groundDragCoefficient: stop.groundDragCoefficient + run.dragIncrementCoefficient };
  const allStop = { ...stop, idleThrust: run.idleThrustAllEngines };
  return {
    failureSpeed: failure[1],
    failed: odeStopFrom(run, accelerating(oneOut(run)), atDecision, failedStop),
    all: odeStopFrom(run, accelerating(run.allEngines), allAtDecision, allStop),
  };
}

function odeStopFrom(run: EngineFailureRun, law: Law, begin: Motion, stop: BrakedRun): Motion {
  const { timeAtDecisionSpeed, continuedAccelerationTime, transitionTime } = run.timeline;
  const { headwind } = run.allEngines;
  const held = (motion: Motion, seconds: number): Motion => [
    motion[0] + (motion[1] - headwind) * seconds,
    motion[1],
    motion[2],
  ];
  const later = onward(law, headwind, held(begin, timeAtDecisionSpeed), continuedAccelerationTime);
  return untilSpeed(braking(stop), headwind, held(later, transitionTime), headwind).motion;
}

/** Brake release to lift-off with a failure, in steps of time, and the run on one engine for the path after it. */
export function odeGoRoll(run: EngineFailureRun, decisionSpeed: number) {
  const { headwind, rotationTime } = run.allEngines;
  const { failure } = odeFailure(run, decisionSpeed);
  const path = oneOut(run);
  const lifted = untilSpeed(accelerating(path), headwind, failure, run.liftOffSpeed).motion;
  return { roll: lifted[0] + Math.max(0, run.rotationSpeed - headwind) * rotationTime, path };
}
