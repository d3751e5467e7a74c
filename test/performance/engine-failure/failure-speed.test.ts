import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { failureSpeed } from '../../../src/performance/engine-failure/failure-speed.ts';
import { standstillDecisionSpeed } from '../../../src/performance/engine-failure/standstill-decision-speed.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { anyFailure } from '../../support/engine-failure-runs.ts';
import { expectNear } from '../../support/near.ts';
import { quadraticThrust } from '../../support/plain-run.ts';

const seen = block(5, { recognitionTime: 1.5 });

describe('failureSpeed', () => {
  it('lies the recognition time before V1 at the acceleration on one engine, by hand', () => {
    expectNear((failureSpeed(seen, 20) as { speed: number }).speed, 17, 1e-8);
    // 17^2/8 m and 17/4 s on both engines
    expect(failureSpeed(seen, 20)).toMatchObject({
      outcome: 'fails',
      distance: expect.closeTo(289 / 8, 7) as number,
      time: expect.closeTo(4.25, 8) as number,
    });
    expect(failureSpeed(block(5), 20)).toMatchObject({ speed: 20 });
  });

  it('follows an acceleration that changes on the way: V = V0 tanh(c t) of a = a0 - k V^2 [closed form; computed]', () => {
    const run = { ...seen, remainingThrust: quadraticThrust(2, -0.003) };
    const end = Math.sqrt(2 / 0.003);
    const expected = end * Math.tanh(Math.atanh(22 / end) - 1.5 * Math.sqrt(2 * 0.003));
    expectNear((failureSpeed(run, 22) as { speed: number }).speed, expected, 1e-8);
  });

  it('takes the slope under the wheels: on a rise the failure comes at a higher speed, by hand', () => {
    // rising by 1 m/s2 from 30 m on: V1 of 20 is reached there on one engine at 1 m/s2
    const g = 9.80665;
    const profile = { ends: [30, 1000], slopes: [0, 1 / g] };
    const run = { ...seen, allEngines: { ...seen.allEngines, profile } };
    expectNear((failureSpeed(run, 20) as { speed: number }).speed, 18.5, 1e-7);
  });

  it('is at standstill and never before it where V1 comes sooner than a failure is seen', () => {
    for (const wind of [-5, 0, 8]) {
      const run = inWind(seen, wind);
      expectNear(standstillDecisionSpeed(run), wind + 3, 1e-8);
      for (const above of [0, 1, 2.9])
        expect(failureSpeed(run, wind + above)).toMatchObject({ speed: wind, distance: 0 });
      expectNear((failureSpeed(run, wind + 4) as { speed: number }).speed, wind + 1, 1e-8);
    }
  });

  it('is V1 where the engines that remain do not accelerate', () => {
    const run = { ...seen, remainingThrust: quadraticThrust(0) };
    expect(failureSpeed(run, 20)).toMatchObject({ speed: 20 });
    expect(standstillDecisionSpeed(run)).toBe(0);
    // from 20 m/s on: V_EF can be as near to V1 as the time asks for, up to where no time is enough
    const fading = { ...seen, remainingThrust: quadraticThrust(2, -0.005) };
    const speeds = [15, 18, 19.9, 19.999, 20, 21].map((v1) => (failureSpeed(fading, v1) as { speed: number }).speed);
    expect([...speeds].sort((a, b) => a - b)).toEqual(speeds);
    expect(speeds.at(-1)).toBe(21);
  });

  it('rises with V1 and lies between the wind and V1', () => {
    fc.assert(
      fc.property(anyFailure, ({ run, decisionSpeed }) => {
        const { headwind, profile } = run.allEngines;
        fc.pre(profile === undefined);
        let before = headwind;
        for (const share of [0.3, 0.6, 0.9, 1]) {
          const found = failureSpeed(run, headwind + share * (decisionSpeed - headwind));
          if (found.outcome !== 'fails') return;
          expect(found.speed).toBeGreaterThanOrEqual(before - 1e-8);
          expect(found.speed).toBeLessThanOrEqual(headwind + share * (decisionSpeed - headwind) + 1e-9);
          before = found.speed;
        }
      }),
      { numRuns: 300, seed: 63 },
    );
  });

  it('names a V1 that all engines do not reach, at standstill too', () => {
    const still = { ...seen, allEngines: { ...seen.allEngines, slope: 0.5 } };
    for (const v1 of [0, 20]) {
      expect(failureSpeed(still, v1)).toMatchObject({ outcome: 'never-reaches-decision-speed', atAirspeed: 0 });
    }
  });

  it('asks for a V1 that the wind alone does not exceed', () => {
    expect(() => failureSpeed(inWind(seen, 10), 9)).toThrow(/decisionSpeed/);
  });
});

describe('standstillDecisionSpeed', () => {
  it('is the rotation speed at most, and the headwind where there is no roll', () => {
    expect(standstillDecisionSpeed(block(5, { recognitionTime: 60 }))).toBe(30);
    expect(standstillDecisionSpeed(inWind(seen, 30))).toBe(30);
  });
});
