import { brent } from '../numerics/brent.ts';
import type { BrakingFriction } from './braking-friction.ts';
import { greatestWetBrakingSpeed } from './wet-braking.ts';

/**
 * Braking friction where the brakes themselves give no more than a coefficient: the smaller of the two at each speed.
 *
 * @param braking - what the tyre finds on the surface, constant or falling with ground speed
 * @param limit - what the brakes give, 0 or more
 * @see references.Judgement
 */
export function limitedBraking(braking: BrakingFriction, limit: number): BrakingFriction {
  if (!(limit >= 0)) throw new RangeError(`limit must be 0 or more: ${limit}`);
  if (braking.at(0) <= limit) return braking;
  const { at } = braking;
  const crossing = brent((groundSpeed) => at(groundSpeed) - limit, 0, greatestWetBrakingSpeed, 1e-9);
  return {
    at: (groundSpeed) => Math.min(limit, at(groundSpeed)),
    kinks: crossing.outcome === 'root' ? [crossing.root, ...braking.kinks] : braking.kinks,
  };
}
