import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { speedsAtDistances } from '../../../src/performance/engine-failure/speeds-at-distances.ts';
import { groundRoll } from '../../../src/performance/takeoff/ground-roll.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { expectNear, expectRatio } from '../../support/near.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';
import { easyFigures, runOf } from '../../support/takeoff-runs.ts';

/** Gains 4 m/s2, rotates at 28 m/s for 1 s, lifts off at 30 m/s. */
const plain = plainRun({ thrust: quadraticThrust(4), rotationSpeed: 28, liftOffSpeed: 30, rotationTime: 1 });

function pointsOf(run: TakeoffRun, distances: readonly number[]) {
  const found = speedsAtDistances(run, distances);
  if (found.outcome !== 'speeds') throw new Error(found.outcome);
  return found.points;
}

function speedAt(run: TakeoffRun, distance: number): number {
  const [point] = pointsOf(run, [distance]);
  return point === undefined || point === 'beyond-lift-off' ? Number.NaN : point.trueAirspeed;
}

describe('speedsAtDistances', () => {
  it('is the square root of 2 a s of an even acceleration, the rotation at V_R, nothing beyond lift-off', () => {
    expectNear(speedAt(plain, 0), 0, 1e-9);
    expectNear(speedAt(plain, 50), 20, 1e-8);
    for (const rotating of [98.01, 110, 125.99]) expectNear(speedAt(plain, rotating), 28, 1e-8);
    // 98 m to V_R, 28 m rotating, then 2 a s again
    expectNear(speedAt(plain, 130), Math.sqrt(28 ** 2 + 8 * 4), 1e-8);
    expect(pointsOf(plain, [50, 141, 1000]).slice(1)).toEqual(['beyond-lift-off', 'beyond-lift-off']);
    const windy = { ...plain, headwind: -5 };
    expectNear(speedAt(windy, 50), 15, 1e-8);
    expect(pointsOf(windy, [50])[0]).toMatchObject({ groundSpeed: expect.closeTo(20, 7) as number });
  });

  it('turns the ground roll round: at the roll to a speed the speed is that, and more distance is more speed', () => {
    let compared = 0;
    fc.assert(
      fc.property(easyFigures, fc.double({ min: 0.05, max: 0.95, noNaN: true }), (figures, share) => {
        const run = { ...runOf(figures), rotationTime: 0 };
        const speed = run.headwind + share * (run.liftOffSpeed - run.headwind);
        const to = groundRoll({ ...run, liftOffSpeed: speed, rotationSpeed: speed });
        if (to.outcome !== 'lifts-off' || groundRoll(run).outcome !== 'lifts-off') return;
        compared++;
        expectRatio(speedAt(run, to.distance), speed, 1e-8);
        expect(speedAt(run, 0.9 * to.distance)).toBeLessThan(speed);
      }),
      { numRuns: 200, seed: 65 },
    );
    expect(compared).toBeGreaterThan(100);
  });

  it('names a lift-off that is not reached and thrust that is not known, and asks for distances', () => {
    expect(speedsAtDistances({ ...plain, groundDragCoefficient: 0.01 }, [10])).toEqual({
      outcome: 'never-reaches-lift-off-speed',
    });
    const known = { ...plain, thrust: { ...plain.thrust, domain: [0, 20] as const } };
    expect(speedsAtDistances(known, [10])).toMatchObject({ outcome: 'outside-stated-data', bound: 20 });
    expect(() => speedsAtDistances(plain, [-1])).toThrow(/distances/);
  });
});
