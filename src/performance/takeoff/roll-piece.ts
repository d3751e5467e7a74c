import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { g0 } from '../../physics/constants.ts';
import type { PathIntegral } from '../path-integral.ts';
import { accelerationWith, type RollForces } from './roll-forces.ts';

/** Nodes of the rule and, with weight 0, the ends of the piece: an acceleration is often least at an end. */
const rule = gaussLegendre(14);
const count = rule.order + 2;
const nodes = Float64Array.from([-1, ...rule.nodes, 1]);
const weights = Float64Array.from([0, ...rule.weights, 0]);
const airspeeds = new Float64Array(count);
const thrusts = new Float64Array(count);

/**
 * Adds one smooth piece of the roll: integral of (V - w)/a dV and of dV/a, 14 nodes.
 *
 * Where the thrust falls with the square root of the airspeed, V = u^2 makes the integrand smooth again.
 *
 * @param forces - of the roll
 * @param headwind - w [m/s]
 * @param from - airspeed at the lower end [m/s]
 * @param to - airspeed at the upper end [m/s]
 * @param sum - receives the piece
 */
export function addRollPiece(forces: RollForces, headwind: number, from: number, to: number, sum: PathIntegral): void {
  const root = forces.thrust.squareRootAtRest === true && from >= 0;
  const low = root ? Math.sqrt(from) : from;
  const half = ((root ? Math.sqrt(to) : to) - low) / 2;
  const middle = low + half;
  for (let i = 0; i < count; i++) {
    const x = middle + half * (nodes[i] as number);
    airspeeds[i] = root ? x * x : x;
  }
  forces.thrust.fill(airspeeds, count, thrusts);
  let distance = 0;
  let time = 0;
  let { least, leastAt, most } = sum;
  for (let i = 0; i < count; i++) {
    const airspeed = airspeeds[i] as number;
    const acceleration = accelerationWith(forces, airspeed, thrusts[i] as number);
    if (acceleration < least) {
      least = acceleration;
      leastAt = airspeed;
    }
    if (acceleration > most) most = acceleration;
    const stretch = root ? 2 * (middle + half * (nodes[i] as number)) : 1;
    const share = ((weights[i] as number) * stretch) / acceleration;
    time += share;
    distance += share * (airspeed - headwind);
  }
  sum.distance += half * distance;
  sum.time += half * time;
  sum.least = least;
  sum.leastAt = leastAt;
  sum.most = most;
}

/** Airspeeds [m/s] at which the slope of the acceleration jumps: still air, the wheels unloaded, the thrust's kinks. */
export function rollJumps(forces: RollForces): number[] {
  const jumps = [0];
  if (forces.lift > 0) jumps.push(Math.sqrt(g0 / forces.lift));
  for (const kink of forces.thrust.kinks) jumps.push(kink);
  return jumps;
}
