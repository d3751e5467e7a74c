import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { landing } from '../../../src/performance/landing/landing.ts';
import { landingEstimate } from '../../../src/performance/landing/landing-estimate.ts';
import { landingVectors } from '../../published/landing-vectors.ts';
import { anyLanding, landingVectorRun } from '../../support/landing-runs.ts';

describe('landingEstimate', () => {
  it.each(landingVectors.map((vector) => [vector.id, vector] as const))(
    '%s: within 2 %% of the roll of an independent program [computed], and its air distance',
    (_, vector) => {
      const { groundRoll, airDistance } = landingEstimate(landingVectorRun(vector));
      const { air, freeRoll, brakedRoll } = vector.expected;
      expect(Math.abs(groundRoll / (freeRoll + brakedRoll) - 1)).toBeLessThan(0.02);
      expect(Math.abs(airDistance / air - 1)).toBeLessThan(1e-6);
    },
  );
  it('is within 6 % of the roll where braking is strong and does not change with speed', () => {
    fc.assert(
      fc.property(anyLanding, (run) => {
        const found = landing(run);
        fc.pre(found.outcome === 'stops' && found.leastDecelerationRatio > 0.15 && run.headwind >= 0);
        if (found.outcome !== 'stops') return;
        expect(Math.abs(landingEstimate(run).groundRoll / found.groundRoll - 1)).toBeLessThan(0.06);
      }),
      { numRuns: 200 },
    );
  });
  it('has no number where the wind is not below the touchdown speed, and no end where nothing slows', () => {
    const [vector] = landingVectors;
    if (vector === undefined) throw new Error('no vectors');
    const run = landingVectorRun(vector);
    expect(landingEstimate({ ...run, headwind: 60 }).groundRoll).toBeNaN();
    expect(landingEstimate({ ...run, slope: -0.6 }).groundRoll).toBe(Number.POSITIVE_INFINITY);
  });
  it('counts reverse thrust above its cut-off speed only', () => {
    const [vector] = landingVectors;
    if (vector === undefined) throw new Error('no vectors');
    const run = landingVectorRun(vector);
    const base = landingEstimate(run).groundRoll;
    expect(landingEstimate({ ...run, reverseThrust: { thrust: 2000, cutOffSpeed: 5 } }).groundRoll).toBeLessThan(base);
    expect(landingEstimate({ ...run, reverseThrust: { thrust: 2000, cutOffSpeed: 50 } }).groundRoll).toBe(base);
    const windy = { ...run, headwind: 12 };
    const mean = Math.SQRT1_2 * (run.touchdownSpeed - 12);
    const above = { ...windy, reverseThrust: { thrust: 2000, cutOffSpeed: mean + 0.1 } };
    expect(landingEstimate(above).groundRoll).toBe(landingEstimate(windy).groundRoll);
  });

  it('counts what a contaminant helps below its speed only', () => {
    const [vector] = landingVectors;
    if (vector === undefined) throw new Error('no vectors');
    const run = landingVectorRun(vector);
    const mean = Math.SQRT1_2 * (run.touchdownSpeed - run.headwind);
    const of = (below: number) => landingEstimate({ ...run, contaminantDrag: { perSquare: 2, below } }).groundRoll;
    expect(of(mean + 0.1)).toBeLessThan(landingEstimate(run).groundRoll);
    expect(of(mean - 0.1)).toBe(landingEstimate(run).groundRoll);
  });
});
