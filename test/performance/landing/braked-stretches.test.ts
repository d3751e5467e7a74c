import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brakedRoll } from '../../../src/performance/landing/braked-roll.ts';
import { brakedStretches } from '../../../src/performance/landing/braked-stretches.ts';
import { landing } from '../../../src/performance/landing/landing.ts';
import type { BrakedRun, LandingRun } from '../../../src/performance/landing/landing-run.ts';
import { type BrakingFriction, constantBraking } from '../../../src/physics/braking-friction.ts';
import { landingVectors } from '../../published/landing-vectors.ts';
import { landingVectorRun } from '../../support/landing-runs.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

const g = 9.80665;
const run = landingVectorRun(landingVectors[0] as (typeof landingVectors)[number]);
/** no air forces: the stop from V is V^2/(2 g (mu + slope)) on each stretch */
const plain: BrakedRun = { ...run, groundDragCoefficient: 0, groundLiftCoefficient: 0, headwind: 0, idleThrust: 0 };
const braking = [0.3, 0.1, 0.2].map(constantBraking);

function stop(braked: BrakedRun, airspeed: number, begin = 0): number {
  const result = brakedRoll(braked, airspeed, begin);
  if (result.outcome !== 'stops') throw new Error(result.outcome);
  return result.distance;
}

function landed(whole: LandingRun) {
  const result = landing(whole);
  if (result.outcome !== 'stops') throw new Error(result.outcome);
  return result;
}

describe('a braked roll over stretches', () => {
  it('is the sum of V^2/(2 g (mu + slope)) over slope and braking where each of them is met', () => {
    // slope 0 to 150 m, then 2 % up; friction 0.3 to 50 m, 0.1 to 250 m, 0.2 beyond; braking from 20 m at 30 m/s
    const profile = { ends: [150, 900], slopes: [0, 0.02] };
    const stretches = [50, 250, 900].map((end, i) => ({ end, braking: braking[i] as BrakingFriction }));
    let square = 900;
    for (const [length, grip] of [
      [30, 0.3],
      [100, 0.1],
      [100, 0.12],
    ] as const) {
      square -= 2 * g * grip * length;
    }
    const expected = 230 + square / (2 * g * 0.22);
    expectNear(stop({ ...plain, profile, stretches }, 30, 20), expected, 1e-6);
  });

  it('equals the roll on one slope and one friction where they are the same throughout, for any cutting', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -0.04, max: 0.06, noNaN: true }),
        fc.array(fc.double({ min: 5, max: 300, noNaN: true }), { minLength: 1, maxLength: 6 }),
        fc.double({ min: -5, max: 10, noNaN: true }),
        fc.double({ min: 0, max: 400, noNaN: true }),
        (slope, lengths, headwind, begin) => {
          const ends = lengths.map((_, i) => lengths.slice(0, i + 1).reduce((a, b) => a + b, 0));
          const one = { ...run, slope, headwind };
          const profile = { ends, slopes: ends.map(() => slope) };
          const stretches = ends.map((end) => ({ end: end + 3, braking: one.braking }));
          expectRatio(stop({ ...one, profile, stretches }, 26, begin), stop(one, 26), 1e-9);
        },
      ),
      { numRuns: 100 },
    );
  });

  it('says never-stops where a stretch would let it run', () => {
    const profile = { ends: [50, 2000], slopes: [0, -0.08] };
    expect(brakedRoll({ ...plain, braking: constantBraking(0.05), profile }, 30).outcome).toBe('never-stops');
  });
});

describe('brakedStretches', () => {
  it('cuts where either changes and holds the last figure of each beyond its end', () => {
    const [grippy, slippery] = braking as [BrakingFriction, BrakingFriction];
    const profile = { ends: [100, 300], slopes: [0.01, -0.01] };
    const cut = brakedStretches({
      ...plain,
      profile,
      stretches: [
        { end: 100, braking: grippy, slope: 0.5 },
        { end: 200, braking: slippery },
        { end: 250, braking: grippy },
      ],
    });
    expect(cut?.map(({ end, slope }) => [end, slope])).toEqual([
      [100, 0.01],
      [200, -0.01],
      [Number.POSITIVE_INFINITY, -0.01],
    ]);
    expect(cut?.map((one) => one.braking)).toEqual([grippy, slippery, grippy]);
    expect(brakedStretches({ ...plain, profile })?.map(({ slope }) => slope)).toEqual([0.01, -0.01]);
    expect(brakedStretches(plain)).toBeUndefined();
  });
});

describe('a landing over a ground line with a profile', () => {
  it('equals the landing on its slope where the slope is the same throughout', () => {
    const slope = -0.02;
    const flat = landed({ ...run, slope });
    const profiled = landed({ ...run, slope, profile: { ends: [200, 700], slopes: [slope, slope] } });
    expectRatio(profiled.landingDistance, flat.landingDistance, 1e-9);
  });

  it('brakes on the ground where the wheels are: what lies before the brakes does not count', () => {
    const { airDistance, freeRoll, groundRoll } = landed(run);
    const begin = airDistance + freeRoll;
    const before = { ends: [begin, 5000], slopes: [-0.05, 0] };
    expectRatio(landed({ ...run, profile: before }).groundRoll, groundRoll, 1e-9);
    const after = { ends: [begin, 5000], slopes: [0, 0.03] };
    expectRatio(landed({ ...run, profile: after }).groundRoll, landed({ ...run, slope: 0.03 }).groundRoll, 1e-9);
  });
});
