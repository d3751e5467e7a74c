import { brent } from '../numerics/brent.ts';
import { splitPoints } from '../numerics/split-points.ts';
import type { BrakingFriction } from './braking-friction.ts';
import { greatestWetBrakingSpeed } from './braking-polynomial.ts';

/** Beyond a kink by so much the next smooth piece has begun [m/s]. */
const aside = 1e-9;

/**
 * The smaller of two braking frictions at each ground speed, with the kinks where they change places.
 *
 * @param one - smooth between its kinks, on which it meets the other no more than once
 * @param other - likewise
 * @see references.HouseContaminant
 */
export function poorerBraking(one: BrakingFriction, other: BrakingFriction): BrakingFriction {
  const kinks = [...one.kinks, ...other.kinks];
  const crossings: number[] = [];
  const ends = splitPoints(0, greatestWetBrakingSpeed, kinks);
  const difference = (groundSpeed: number) => one.at(groundSpeed) - other.at(groundSpeed);
  for (let i = 1; i < ends.length; i++) {
    const low = (ends[i - 1] as number) + (i === 1 ? 0 : aside);
    const high = (ends[i] as number) - aside;
    const [atLow, atHigh] = [difference(low), difference(high)];
    if (!(atLow * atHigh < 0)) continue;
    const crossing = brent(difference, low, high, aside);
    if (crossing.outcome === 'root') crossings.push(crossing.root);
  }
  return { at: (groundSpeed) => Math.min(one.at(groundSpeed), other.at(groundSpeed)), kinks: [...crossings, ...kinks] };
}
