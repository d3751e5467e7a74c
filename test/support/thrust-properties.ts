import { expect } from 'vitest';
import type { Thrust } from '../../src/physics/thrust/thrust.ts';

/** What every thrust must hold: finite, never negative, never rising with airspeed, fill equal to at. */
export function expectThrust(thrust: Thrust, highest: number, tolerance = 1e-12): void {
  const airspeeds = Float64Array.from({ length: 41 }, (_, i) => ((i - 4) * highest) / 36);
  const filled = new Float64Array(41);
  thrust.fill(airspeeds, 41, filled);
  const atRest = thrust.at(0);
  let before = Number.POSITIVE_INFINITY;
  airspeeds.forEach((airspeed, i) => {
    const value = thrust.at(airspeed);
    expect(Number.isFinite(value) && value >= 0, `thrust ${value} at ${airspeed}`).toBe(true);
    expect(Math.abs((filled[i] as number) - value)).toBeLessThanOrEqual(tolerance * Math.max(1, atRest));
    if (airspeed <= 0) expect(value).toBe(atRest);
    expect(value).toBeLessThanOrEqual(before * (1 + 1e-12));
    before = value;
  });
}

/** Changes of slope at the kinks: the slope just above over the slope just below. */
export function slopeRatios(thrust: Thrust): number[] {
  const step = 1e-4;
  return thrust.kinks.map(
    (kink) => (thrust.at(kink + step) - thrust.at(kink)) / (thrust.at(kink) - thrust.at(kink - step)),
  );
}
