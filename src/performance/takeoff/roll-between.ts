import { splitPoints } from '../../numerics/split-points.ts';
import { g0 } from '../../physics/constants.ts';
import { addSettled, newPathIntegral, type PathIntegral } from '../path-integral.ts';
import type { SpeedChange } from '../stretched-path.ts';
import type { RollForces } from './roll-forces.ts';
import { addRollPiece, rollJumps } from './roll-piece.ts';

/** An acceleration over g that counts as none: at 1e-6 g a takeoff would last days. */
export const noAcceleration = 1e-6;
/** Below this acceleration over g, or this share of the greatest, 14 nodes a piece are not trusted unseen. */
const fineBelow = 0.02;
const fineBelowShare = 0.25;

/**
 * Distance and time of the roll from one airspeed to a higher one under steady forces.
 *
 * Gauss-Legendre, 14 nodes a piece; a piece ends where V = 0, where lift reaches the weight and at the thrust's kinks. Where the
 * acceleration is small or falls by much, pieces are halved until they agree.
 *
 * @param forces - of the roll on this stretch
 * @param headwind - w [m/s]
 * @param from - airspeed [m/s], at or above w
 * @param to - airspeed [m/s], above from
 * @returns not reaching where the acceleration is not above 1e-6 g throughout, or the halving did not settle
 */
export function rollBetween(forces: RollForces, headwind: number, from: number, to: number): SpeedChange {
  const ends = splitPoints(from, to, rollJumps(forces));
  const sum = newPathIntegral();
  for (let i = 1; i < ends.length; i++) {
    addRollPiece(forces, headwind, ends[i - 1] as number, ends[i] as number, sum);
  }
  if (!(sum.least > noAcceleration * g0)) return { reaches: false, sum };
  if (sum.least >= fineBelow * g0 && sum.least >= fineBelowShare * sum.most) return { reaches: true, sum };
  const fine = newPathIntegral();
  const add = (low: number, high: number, into: PathIntegral) => addRollPiece(forces, headwind, low, high, into);
  for (let i = 1; i < ends.length; i++) {
    if (!addSettled(add, ends[i - 1] as number, ends[i] as number, fine)) return { reaches: false, sum: fine };
  }
  return { reaches: fine.least > noAcceleration * g0, sum: fine };
}
