import { landingEstimate } from '../performance/landing/landing-estimate.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import { scaledBraking } from '../physics/braking-friction.ts';
import { assumptionEffects, withNumber } from './assumption-effects.ts';
import type { LandingAssumed, LandingOtherEnd } from './resolve-landing.ts';

/**
 * What each assumption of a landing is worth, by the mean-deceleration estimate.
 *
 * @param assumed - in the order in which they were made
 * @param run - as stated; undefined where it does not stop
 */
export function landingEffects(
  assumed: readonly LandingAssumed[],
  run: LandingRun | undefined,
): readonly LandingAssumed[] {
  if (run === undefined) return assumed;
  return assumptionEffects(assumed, (other) => {
    const { groundRoll, airDistance } = landingEstimate(other === undefined ? run : withOther(run, other));
    return groundRoll + airDistance;
  });
}

function withOther(run: LandingRun, other: LandingOtherEnd): LandingRun {
  switch (other.kind) {
    case 'idle-thrust':
      return { ...run, idleThrust: other.value };
    case 'braking-friction':
      return { ...run, braking: scaledBraking(run.braking, other.factor) };
    default:
      return withNumber<LandingRun>(run, other);
  }
}
