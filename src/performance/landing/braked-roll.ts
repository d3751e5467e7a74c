import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { splitPoints } from '../../numerics/split-points.ts';
import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import { addSettled, newPathIntegral, type PathIntegral } from '../path-integral.ts';
import type { BrakedRun } from './landing-run.ts';

/** The stop, or the name of why there is none. */
export type BrakedRoll =
  | {
      readonly outcome: 'stops';
      /** [m], [s] */
      readonly distance: number;
      readonly time: number;
      /** least deceleration over g */
      readonly leastDecelerationRatio: number;
    }
  | { readonly outcome: 'never-stops'; readonly atGroundSpeed: number; readonly leastDecelerationRatio: number };

/** A deceleration over g that counts as none. */
const none = 1e-6;
/** Below this deceleration over g, or this share of the greatest, 14 nodes a piece are not trusted unseen. */
const fineBelow = 0.02;
const fineBelowShare = 0.25;

const rule = gaussLegendre(14);
const nodes = Float64Array.from([-1, ...rule.nodes, 1]);
const weights = Float64Array.from([0, ...rule.weights, 0]);

/**
 * Distance on the wheels from an airspeed to a standstill, brakes full on.
 *
 * s = integral of (V - w)/d(V) dV from V = w to the airspeed; t = integral of dV/d;
 * m d = mu_B(V - w) max(0, W - q S C_Lg) + q S C_Dg - T_idle + W slope, q = rho V|V|/2,
 * with the reverse thrust added in place of T_idle taken off, at and above its cut-off speed.
 *
 * @param run - configuration, wind and braking of the stop
 * @param airspeed - true, at which braking begins [m/s], above w
 * @returns distance [m] and time [s]; 'never-stops' where d is not above 1e-6 g throughout, with the highest ground speed at which
 * it is gone
 * @remarks Small slopes; wheels, not skis or floats; the friction acts from the first moment.
 * @see references.McCormick1995, sec. 7.7; references.Raymer, ch. 17
 */
export function brakedRoll(run: BrakedRun, airspeed: number): BrakedRoll {
  const { headwind } = run;
  if (!(airspeed > headwind)) throw new RangeError(`airspeed must be above the headwind ${headwind}: ${airspeed}`);
  const deceleration = decelerationOf(run);
  const add = (from: number, to: number, into: PathIntegral) => addBrakedPiece(deceleration, headwind, from, to, into);
  const ends = splitPoints(headwind, airspeed, jumpsOf(run));
  let sum = newPathIntegral();
  for (let i = 1; i < ends.length; i++) add(ends[i - 1] as number, ends[i] as number, sum);
  if (!(sum.least > none * g0)) return neverStops(deceleration, headwind, airspeed, sum.leastAt);
  if (sum.least < fineBelow * g0 || sum.least < fineBelowShare * sum.most) {
    sum = newPathIntegral();
    let settled = true;
    for (let i = 1; i < ends.length && settled; i++)
      settled = addSettled(add, ends[i - 1] as number, ends[i] as number, sum);
    if (!settled || !(sum.least > none * g0)) return neverStops(deceleration, headwind, airspeed, sum.leastAt);
  }
  return { outcome: 'stops', distance: sum.distance, time: sum.time, leastDecelerationRatio: sum.least / g0 };
}

/** Airspeeds [m/s] at which the deceleration or its slope jumps: still air, the wheels unloaded, the friction's kinks, reverse. */
function jumpsOf(run: BrakedRun): number[] {
  const jumps = [0, ...run.braking.kinks.map((groundSpeed) => groundSpeed + run.headwind)];
  if (run.reverseThrust !== undefined) jumps.push(run.reverseThrust.cutOffSpeed + run.headwind);
  const lift = 0.5 * run.density * run.wingArea * run.groundLiftCoefficient;
  if (lift > 0) jumps.push(Math.sqrt((run.mass * g0) / lift));
  return jumps;
}

/** Deceleration [m/s2] against true airspeed [m/s]. */
function decelerationOf(run: BrakedRun): (airspeed: number) => number {
  const { braking, headwind, groundLiftCoefficient: liftCoefficient } = run;
  const halfRhoS = (0.5 * run.density * run.wingArea) / run.mass;
  const phi = groundEffect(run.wingHeight / run.span);
  const drag = halfRhoS * dragCoefficient(run.groundDragCoefficient, run.inducedDragFactor, liftCoefficient, phi);
  const lift = halfRhoS * liftCoefficient;
  const steady = g0 * run.slope - run.idleThrust / run.mass;
  const { thrust: reverse, cutOffSpeed } = run.reverseThrust ?? { thrust: 0, cutOffSpeed: Number.POSITIVE_INFINITY };
  const reversed = g0 * run.slope + reverse / run.mass;
  return (airspeed) => {
    const square = airspeed * Math.abs(airspeed);
    const groundSpeed = airspeed - headwind;
    const rest = groundSpeed < cutOffSpeed ? steady : reversed;
    return braking.at(groundSpeed) * Math.max(0, g0 - lift * square) + drag * square + rest;
  };
}

function addBrakedPiece(
  deceleration: (airspeed: number) => number,
  headwind: number,
  from: number,
  to: number,
  sum: PathIntegral,
): void {
  const half = (to - from) / 2;
  const middle = from + half;
  for (let i = 0; i < nodes.length; i++) {
    const airspeed = middle + half * (nodes[i] as number);
    const value = deceleration(airspeed);
    if (value < sum.least) {
      sum.least = value;
      sum.leastAt = airspeed;
    }
    if (value > sum.most) sum.most = value;
    const share = (half * (weights[i] as number)) / value;
    sum.time += share;
    sum.distance += share * (airspeed - headwind);
  }
}

/** The named outcome, with the first ground speed on slowing down at which the deceleration is gone, to a thousandth. */
function neverStops(
  deceleration: (airspeed: number) => number,
  headwind: number,
  airspeed: number,
  leastAt: number,
): BrakedRoll {
  const leastDecelerationRatio = deceleration(leastAt) / g0;
  for (let i = 0; i <= 1000; i++) {
    const at = airspeed + ((headwind - airspeed) * i) / 1000;
    if (deceleration(at) <= none * g0)
      return { outcome: 'never-stops', atGroundSpeed: at - headwind, leastDecelerationRatio };
  }
  return { outcome: 'never-stops', atGroundSpeed: leastAt - headwind, leastDecelerationRatio };
}
