import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { heightRatioWithoutEffect, leastHeightRatio } from '../../physics/ground-effect.ts';
import type { PathIntegral } from '../path-integral.ts';
import { type ClimbForces, climbGradientWith, energySine } from './climb-forces.ts';

const { order, nodes, weights } = gaussLegendre(6);
const heights = new Float64Array(order);
const airspeeds = new Float64Array(order);
const thrusts = new Float64Array(order);

/**
 * Adds one smooth piece of the climb on the energy path: still-air distance, integral of cot(gamma) dh, and time, integral of
 * dh/(V sin gamma), 6 nodes.
 *
 * @param forces - of the climb
 * @param from - lower height [m]
 * @param to - upper height [m]
 * @param sum - receives the piece; its least and most are of the climb gradient
 * @see references.HouseEnergyPath
 */
export function addClimbPiece(forces: ClimbForces, from: number, to: number, sum: PathIntegral): void {
  const half = (to - from) / 2;
  const middle = from + half;
  const { square, growth } = forces;
  for (let i = 0; i < order; i++) {
    const height = middle + half * (nodes[i] as number);
    heights[i] = height;
    airspeeds[i] = Math.sqrt(square + growth * height);
  }
  forces.thrust.fill(airspeeds, order, thrusts);
  let distance = 0;
  let time = 0;
  let { least, leastAt, most } = sum;
  for (let i = 0; i < order; i++) {
    const height = heights[i] as number;
    const airspeed = airspeeds[i] as number;
    const gradient = climbGradientWith(forces, height, thrusts[i] as number);
    if (gradient < least) {
      least = gradient;
      leastAt = height;
    }
    if (gradient > most) most = gradient;
    const sine = energySine(forces, gradient);
    const share = (weights[i] as number) / (airspeed * sine);
    time += share;
    distance += share * airspeed * Math.sqrt(1 - sine * sine);
  }
  sum.distance += half * distance;
  sum.time += half * time;
  sum.least = least;
  sum.leastAt = leastAt;
  sum.most = most;
}

/** Heights [m] at which the slope of the climb gradient jumps: the ground effect's ends, the thrust's kinks on the speed schedule. */
export function climbJumps(forces: ClimbForces): number[] {
  const { square, growth, perSpan, wingHeight } = forces;
  const jumps = [heightRatioWithoutEffect / perSpan - wingHeight, leastHeightRatio / perSpan - wingHeight];
  if (growth > 0) for (const kink of forces.thrust.kinks) jumps.push((kink * kink - square) / growth);
  return jumps;
}
