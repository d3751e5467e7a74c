import type { Thrust } from '../physics/thrust/thrust.ts';

/**
 * The same thrust with its first and last measured values held beyond its data: for slopes at the edge of the data, never for an
 * answer.
 */
export function heldThrust(thrust: Thrust): Thrust {
  const { domain } = thrust;
  if (domain === undefined) return thrust;
  const [lowest, highest] = domain;
  return { ...thrust, at: (airspeed) => thrust.at(Math.min(highest, Math.max(lowest, airspeed))) };
}
