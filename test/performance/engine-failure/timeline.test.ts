import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import { standstillDecisionSpeed } from '../../../src/performance/engine-failure/standstill-decision-speed.ts';
import { steepestFrom } from '../../../src/performance/slope-profile.ts';
import { anyFailure } from '../../support/engine-failure-runs.ts';
import { expectRatio } from '../../support/near.ts';
import { odeGoRoll, odeStop } from '../../support/ode-engine-failure.ts';
import { odeAir } from '../../support/ode-takeoff.ts';

describe('the whole timeline in steps of time by a general ODE library [odex 2.0.4, 1e-10, forces written out again; computed]', () => {
  it('agrees on both stops, V_EF and the heat of the brakes to 1e-5, with wind, slope, profile and slush', () => {
    const met = new Map<string, number>();
    fc.assert(
      fc.property(anyFailure, ({ run, decisionSpeed }) => {
        const found = accelerateStop(run, decisionSpeed);
        if (found.outcome !== 'stops' || decisionSpeed <= standstillDecisionSpeed(run) + 0.1) return;
        // held where one engine does not accelerate: another test's
        if (found.failureSpeed > decisionSpeed - 0.05 * run.timeline.recognitionTime) return;
        const ground = run.allEngines.profile ? 'profile' : run.allEngines.contaminantDrag ? 'slush' : 'slope';
        met.set(ground, (met.get(ground) ?? 0) + 1);
        const { failureSpeed, failed, all } = odeStop(run, decisionSpeed);
        expectRatio(found.failureSpeed, failureSpeed, 1e-5);
        expectRatio(found.engineFailureDistance, failed[0], 1e-5);
        expectRatio(found.allEnginesDistance, all[0], 1e-5);
        expectRatio(found.brakeEnergy, Math.max(failed[2], all[2]), 1e-5);
      }),
      { numRuns: 60, endOnFailure: true, seed: 61 },
    );
    for (const ground of ['slope', 'profile', 'slush']) expect(met.get(ground) ?? 0, ground).toBeGreaterThan(5);
  });

  it('agrees on the go from brake release to the screen to 1e-5', () => {
    let compared = 0;
    fc.assert(
      fc.property(anyFailure, ({ run, decisionSpeed }) => {
        const found = accelerateGo(run, decisionSpeed);
        if (found.outcome !== 'reaches-screen' || decisionSpeed <= standstillDecisionSpeed(run) + 0.1) return;
        if (found.leastClimbGradient < 0.002) return;
        compared++;
        const { roll, path } = odeGoRoll(run, decisionSpeed);
        expectRatio(found.groundRoll, roll, 1e-5);
        const { profile, thrust, span, wingHeight, liftOffSpeed, screenSpeed, screenHeight } = path;
        const slope = profile === undefined ? path.slope : steepestFrom(profile, found.groundRoll);
        const growth = Math.max(0, screenSpeed ** 2 - liftOffSpeed ** 2) / screenHeight;
        const kinks = growth > 0 ? thrust.kinks.map((v) => (v * v - liftOffSpeed ** 2) / growth) : [];
        const splits = [span / 1.32 - wingHeight, 0.03 * span - wingHeight, ...kinks];
        expectRatio(found.distance, roll + odeAir({ ...path, slope }, 1e-10, splits)[0], 1e-5);
      }),
      { numRuns: 60, endOnFailure: true, seed: 62 },
    );
    expect(compared).toBeGreaterThan(25);
  });
});
