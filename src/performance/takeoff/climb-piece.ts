import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { heightRatioWithoutEffect, leastHeightRatio } from '../../physics/ground-effect.ts';
import type { PathIntegral } from '../path-integral.ts';
import { type ClimbForces, climbGradientWith, energySine } from './climb-forces.ts';

/** Nodes of the rule and, with weight 0, the ends of the piece: a gradient is often least at an end. */
const rule = gaussLegendre(8);
const count = rule.order + 2;
const nodes = Float64Array.from([-1, ...rule.nodes, 1]);
const weights = Float64Array.from([0, ...rule.weights, 0]);
const airspeeds = new Float64Array(count);
const thrusts = new Float64Array(count);

/**
 * Adds one smooth piece of the climb on the energy path: still-air distance, integral of cot(gamma) dh, and time, integral of
 * dh/(V sin gamma), 8 nodes.
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
  for (let i = 0; i < count; i++) {
    airspeeds[i] = Math.sqrt(square + growth * (middle + half * (nodes[i] as number)));
  }
  forces.thrust.fill(airspeeds, count, thrusts);
  let distance = 0;
  let time = 0;
  let { least, leastAt, most } = sum;
  for (let i = 0; i < count; i++) {
    const height = middle + half * (nodes[i] as number);
    const gradient = climbGradientWith(forces, height, thrusts[i] as number);
    if (gradient < least) {
      least = gradient;
      leastAt = height;
    }
    if (gradient > most) most = gradient;
    const sine = energySine(forces, gradient);
    const share = (weights[i] as number) / sine;
    distance += share * Math.sqrt(1 - sine * sine);
    time += share / (airspeeds[i] as number);
  }
  sum.distance += half * distance;
  sum.time += half * time;
  sum.least = least;
  sum.leastAt = leastAt;
  sum.most = most;
}

/** Heights [m] at which the slope of the climb gradient jumps: the thrust's kinks on the speed schedule, the ground effect's ends. */
export function climbJumps(forces: ClimbForces): number[] {
  const { square, growth, span, wingHeight } = forces;
  const jumps = [heightRatioWithoutEffect * span - wingHeight, leastHeightRatio * span - wingHeight];
  if (growth > 0) for (const kink of forces.thrust.kinks) jumps.push((kink * kink - square) / growth);
  return jumps;
}
