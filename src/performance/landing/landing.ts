import { brakedRoll } from './braked-roll.ts';
import { landingAirDistance } from './landing-air-distance.ts';
import type { LandingResult, LandingRun } from './landing-run.ts';

/**
 * The landing from the screen to a standstill: air distance, free roll, braked roll.
 *
 * The free roll is (V_TD - w) t_F without deceleration.
 *
 * @param run - everything the integrations need, in SI
 * @returns distances [m], times [s], or the name of why there are none: 'ground-speed-not-positive' where the headwind is at or
 * above the touchdown speed, 'never-stops' of brakedRoll
 * @see references.Raymer, ch. 17; references.McCormick1995, sec. 7.7
 */
export function landing(run: LandingRun): LandingResult {
  const { headwind, touchdownSpeed, freeRollTime } = run;
  if (headwind >= touchdownSpeed) return { outcome: 'ground-speed-not-positive', headwind, touchdownSpeed };
  const air = landingAirDistance(run);
  const freeRoll = (touchdownSpeed - headwind) * freeRollTime;
  const braked = brakedRoll(run, touchdownSpeed, air.distance + freeRoll);
  if (braked.outcome === 'never-stops') return braked;
  const groundRoll = freeRoll + braked.distance;
  return {
    outcome: 'stops',
    airDistance: air.distance,
    airTime: air.time,
    floatDistance: air.floatDistance,
    airDistanceFrom: air.from,
    flareAboveScreen: air.flareAboveScreen,
    freeRoll,
    freeRollTime,
    brakedRoll: braked.distance,
    brakedRollTime: braked.time,
    groundRoll,
    landingDistance: air.distance + groundRoll,
    leastDecelerationRatio: braked.leastDecelerationRatio,
  };
}
