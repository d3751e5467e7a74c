import { constantBraking } from '../../physics/braking-friction.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { BrakedRun } from '../landing/landing-run.ts';
import { stopAlong } from '../landing/stop-along.ts';
import { rollAlong } from '../takeoff/roll-along.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import { speedAtTime } from './speed-at-time.ts';
import { type FirstAction, fastest } from './stop-from.ts';

/**
 * Some seconds of rolling with idle thrust before anybody brakes: the attitude and the drag of the takeoff roll, its wheels free.
 *
 * Mostly the aeroplane slows down; downhill idle thrust may make it gain speed. What helps of a contaminant is as in the stop.
 *
 * @param seconds - 0 or more
 * @param begin - where the engines go idle
 * @param run - of the takeoff roll
 * @param stop - idle thrust and ground, measured from brake release
 * @returns where it then is, and how fast
 * @see references.McCormick1995, sec. 7.7
 */
export function coastFor(seconds: number, begin: FirstAction, run: TakeoffRun, stop: BrakedRun): FirstAction {
  const { speed, distance, time } = begin;
  const slowing = stopAlong(onFreeWheels(run, stop));
  const gaining = rollAlong({ ...run, thrust: steadyThrust(stop.idleThrust) });
  const gained = speedAtTime((to) => gaining(speed, to, distance), speed, speed + fastest * seconds, seconds);
  const { airspeed, change } =
    gained.airspeed > speed ? gained : speedAtTime((to) => slowing(speed, to, distance), speed, run.headwind, seconds);
  const held = Math.max(0, seconds - change.sum.time);
  return {
    speed: airspeed,
    distance: distance + change.sum.distance + held * (airspeed - run.headwind),
    time: time + seconds,
  };
}

function onFreeWheels(
  { groundDragCoefficient, groundLiftCoefficient, rollingFriction }: TakeoffRun,
  stop: BrakedRun,
): BrakedRun {
  const braking = constantBraking(rollingFriction);
  return {
    ...stop,
    groundDragCoefficient,
    groundLiftCoefficient,
    braking,
    reverseThrust: undefined,
    stretches: stop.stretches?.map((stretch) => ({ ...stretch, braking })),
  };
}

function steadyThrust(thrust: number): Thrust {
  return { at: () => thrust, fill: (_, n, out) => void out.fill(thrust, 0, n), kinks: [] };
}
