import { type BrakingFriction, constantBraking } from './braking-friction.ts';
import { poorerBraking } from './poorer-braking.ts';

/**
 * Braking friction where the brakes themselves give no more than a coefficient: the smaller of the two at each speed.
 *
 * @param braking - what the tyre finds on the surface, constant or falling with ground speed
 * @param limit - what the brakes give, 0 or more
 * @see references.Judgement
 */
export function limitedBraking(braking: BrakingFriction, limit: number): BrakingFriction {
  if (!(limit >= 0)) throw new RangeError(`limit must be 0 or more: ${limit}`);
  return braking.at(0) <= limit ? braking : poorerBraking(braking, constantBraking(limit));
}
