import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { splitPoints } from '../../numerics/split-points.ts';
import { g0 } from '../../physics/constants.ts';
import { addSettled, newPathIntegral, type PathIntegral } from '../path-integral.ts';
import type { SpeedChange } from '../stretched-path.ts';
import { otherDeceleration, type StopForces, wheelDeceleration } from './stop-forces.ts';

/** A deceleration over g that counts as none. */
export const noDeceleration = 1e-6;
/** Below this deceleration over g, or this share of the greatest, 14 nodes a piece are not trusted unseen. */
const fineBelow = 0.02;
const fineBelowShare = 0.25;

const rule = gaussLegendre(14);
const nodes = Float64Array.from([-1, ...rule.nodes, 1]);
const weights = Float64Array.from([0, ...rule.weights, 0]);

/**
 * Distance and time of slowing down from one airspeed to a lower one under steady forces.
 *
 * Gauss-Legendre, 14 nodes a piece; a piece ends where the deceleration or its slope jumps. Where it is small or falls by much,
 * pieces are halved until they agree.
 *
 * @param forces - of the stop on this stretch
 * @param from - airspeed [m/s]
 * @param to - airspeed [m/s], below from, at or above the headwind
 * @returns not reaching where the deceleration is not above 1e-6 g throughout, or the halving did not settle
 */
export function stopBetween(forces: StopForces, from: number, to: number): SpeedChange {
  const ends = splitPoints(to, from, forces.jumps);
  const sum = newPathIntegral();
  for (let i = 1; i < ends.length; i++) addStopPiece(forces, ends[i - 1] as number, ends[i] as number, sum);
  if (!(sum.least > noDeceleration * g0)) return { reaches: false, sum };
  if (sum.least >= fineBelow * g0 && sum.least >= fineBelowShare * sum.most) return { reaches: true, sum };
  const fine = newPathIntegral();
  const add = (low: number, high: number, into: PathIntegral) => addStopPiece(forces, low, high, into);
  for (let i = 1; i < ends.length; i++) {
    if (!addSettled(add, ends[i - 1] as number, ends[i] as number, fine)) return { reaches: false, sum: fine };
  }
  return { reaches: fine.least > noDeceleration * g0, sum: fine };
}

function addStopPiece(forces: StopForces, from: number, to: number, sum: PathIntegral): void {
  const half = (to - from) / 2;
  const middle = from + half;
  for (let i = 0; i < nodes.length; i++) {
    const airspeed = middle + half * (nodes[i] as number);
    const braked = wheelDeceleration(forces, airspeed);
    const value = braked + otherDeceleration(forces, airspeed);
    if (value < sum.least) {
      sum.least = value;
      sum.leastAt = airspeed;
    }
    if (value > sum.most) sum.most = value;
    const share = (half * (weights[i] as number)) / value;
    sum.time += share;
    const way = share * (airspeed - forces.headwind);
    sum.distance += way;
    sum.brakeWork += way * braked;
  }
}
