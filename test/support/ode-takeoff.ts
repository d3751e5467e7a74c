import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { odex } from './odex.ts';

const g = 9.80665;

/** Prandtl's and Wieselsberger's factor, written out again: the checks share no formula with what they check. */
function effect(ratio: number): number {
  const r = Math.max(0.03, ratio);
  return Math.min(1, 1 - (1 - 0.66 * 2 * r) / (1.05 + 3.7 * 2 * r));
}

/** m dV/dt of the roll over m, from the equation of motion. */
export function odeAcceleration(run: TakeoffRun, airspeed: number): number {
  const pressure = 0.5 * run.density * airspeed * airspeed * Math.sign(airspeed);
  const phi = effect(run.wingHeight / run.span);
  const drag =
    pressure *
    run.wingArea *
    (run.groundDragCoefficient + phi * run.inducedDragFactor * run.groundLiftCoefficient ** 2);
  const onWheels = run.mass * g - pressure * run.wingArea * run.groundLiftCoefficient;
  const thrust = run.thrust.at(Math.max(0, airspeed));
  const displaced = (run.contaminantDrag ?? 0) * (airspeed - run.headwind) ** 2;
  return (thrust - drag - displaced - run.rollingFriction * Math.max(0, onWheels)) / run.mass - g * run.slope;
}

/** (T - D)/W - max(slope, 0) at a height on the speed schedule, and the speed. */
export function odeClimb(run: TakeoffRun, height: number): { readonly gradient: number; readonly airspeed: number } {
  const screen = Math.max(run.screenSpeed, run.liftOffSpeed);
  const share = height / run.screenHeight;
  const airspeed = Math.sqrt(run.liftOffSpeed ** 2 * (1 - share) + screen ** 2 * share);
  const weight = run.mass * g;
  const pressure = 0.5 * run.density * airspeed * airspeed * run.wingArea;
  const lift = weight / pressure;
  const phi = effect((run.wingHeight + height) / run.span);
  const drag = pressure * (run.airDragCoefficient + phi * run.inducedDragFactor * lift * lift);
  return { gradient: (run.thrust.at(airspeed) - drag) / weight - Math.max(0, run.slope), airspeed };
}

/** sin of the path angle and the speed at a height: the energy's or the pull-up arc's, whichever is less. */
export function odePath(run: TakeoffRun, height: number): { readonly sine: number; readonly airspeed: number } {
  const screen = Math.max(run.screenSpeed, run.liftOffSpeed);
  const kappa = 1 + (screen ** 2 - run.liftOffSpeed ** 2) / (2 * g * run.screenHeight);
  const { gradient, airspeed } = odeClimb(run, height);
  const radius = run.liftOffSpeed ** 2 / (g * (run.pullUpLoadFactor - 1));
  const energy = Math.asin(Math.min(Math.SQRT1_2, gradient / kappa));
  const arc = height >= radius ? Math.PI / 2 : 2 * Math.asin(Math.sqrt(height / (2 * radius)));
  return { sine: Math.sin(Math.min(energy, arc)), airspeed };
}

/** Distance and time of the roll by a general ODE library, in airspeed, rotation left out; split at the given airspeeds. */
export function odeRoll(run: TakeoffRun, tolerance: number, splits: readonly number[] = []): [number, number] {
  const inside = splits.filter((v) => v > run.headwind && v < run.liftOffSpeed);
  const ends = [run.headwind, ...inside, run.liftOffSpeed].sort((a, b) => a - b);
  const total: [number, number] = [0, 0];
  for (let i = 1; i < ends.length; i++) {
    const [distance, time] = odex(
      (airspeed) => {
        const a = odeAcceleration(run, airspeed);
        return [(airspeed - run.headwind) / a, 1 / a];
      },
      ends[i - 1] as number,
      ends[i] as number,
      tolerance,
    );
    total[0] += distance;
    total[1] += time;
  }
  return total;
}

/** Distance and time of the air path by the library, in u = sqrt(h), which takes the start of the arc's root away. */
export function odeAir(run: TakeoffRun, tolerance: number, splits: readonly number[] = []): [number, number] {
  const radius = run.liftOffSpeed ** 2 / (g * (run.pullUpLoadFactor - 1));
  const limit = Math.sqrt(2 * radius);
  const inside = splits.filter((h) => h > 0 && h < run.screenHeight).map(Math.sqrt);
  const ends = [0, ...inside, Math.sqrt(run.screenHeight)].sort((a, b) => a - b);
  const total: [number, number] = [0, 0];
  for (let i = 1; i < ends.length; i++) {
    const [distance, time] = odex(
      (u) => {
        if (u === 0) return [(1 - run.headwind / run.liftOffSpeed) * limit, limit / run.liftOffSpeed];
        const { sine, airspeed } = odePath(run, u * u);
        return [(2 * u * (Math.sqrt(1 - sine * sine) - run.headwind / airspeed)) / sine, (2 * u) / (airspeed * sine)];
      },
      ends[i - 1] as number,
      ends[i] as number,
      tolerance,
    );
    total[0] += distance;
    total[1] += time;
  }
  return total;
}
