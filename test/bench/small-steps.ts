import { climbForces, climbGradient, energySine } from '../../src/performance/takeoff/climb-forces.ts';
import { pullUpRadius } from '../../src/performance/takeoff/pull-up-arc.ts';
import { rollAcceleration, rollForces } from '../../src/performance/takeoff/roll-forces.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';

/**
 * Distance travelled until a state reaches its goal, by Runge-Kutta steps of the fourth order in time; the last step is cut.
 *
 * @param rate - of the state
 * @param speed - over the ground, of the state
 */
function march(
  rate: (x: number) => number,
  speed: (x: number) => number,
  from: number,
  goal: number,
  step: number,
): number {
  let x = from;
  let distance = 0;
  while (x < goal) {
    const k1 = rate(x);
    const dt = x + k1 * step > goal ? (goal - x) / k1 : step;
    const k2 = rate(x + (k1 * dt) / 2);
    const k3 = rate(x + (k2 * dt) / 2);
    const k4 = rate(x + k3 * dt);
    distance +=
      (dt * (speed(x) + 2 * speed(x + (k1 * dt) / 2) + 2 * speed(x + (k2 * dt) / 2) + speed(x + k3 * dt))) / 6;
    x += (dt * (k1 + 2 * k2 + 2 * k3 + k4)) / 6;
  }
  return distance;
}

/** The roll, rotation left out, by steps in time [s]. */
export function steppedRoll(run: TakeoffRun, step: number): number {
  const forces = rollForces(run);
  const rate = (airspeed: number) => rollAcceleration(forces, airspeed);
  return march(rate, (airspeed) => airspeed - run.headwind, run.headwind, run.liftOffSpeed, step);
}

/** Sine of the path angle at a height: the energy's or the arc's, whichever is less. */
export function pathOf(run: TakeoffRun): (height: number) => { sine: number; airspeed: number } {
  const forces = climbForces(run);
  const radius = pullUpRadius(run.liftOffSpeed, run.pullUpLoadFactor);
  return (height) => {
    const cosine = 1 - height / radius;
    const arc = Math.sqrt((height / radius) * (1 + cosine));
    const sine = Math.min(energySine(forces, climbGradient(forces, height)), cosine < 0 ? 1 : arc);
    return { sine, airspeed: Math.sqrt(forces.square + forces.growth * height) };
  };
}

/** The air path by steps in time [s], in the root of the height. */
export function steppedAir(run: TakeoffRun, step: number): number {
  const path = pathOf(run);
  const start = Math.sqrt(1 / (2 * pullUpRadius(run.liftOffSpeed, run.pullUpLoadFactor)));
  const rate = (u: number) => {
    if (u <= 0) return run.liftOffSpeed * start;
    const { sine, airspeed } = path(u * u);
    return (airspeed * sine) / (2 * u);
  };
  const speed = (u: number) => {
    const { sine, airspeed } = path(u * u);
    return airspeed * Math.sqrt(1 - sine * sine) - run.headwind;
  };
  return march(rate, speed, 0, Math.sqrt(run.screenHeight), step);
}
