import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { brakedRoll } from '../../../src/performance/landing/braked-roll.ts';
import { landing } from '../../../src/performance/landing/landing.ts';
import { landingArc } from '../../../src/performance/landing/landing-arc.ts';
import type { LandingRun } from '../../../src/performance/landing/landing-run.ts';
import { landingTrajectory } from '../../../src/performance/landing/landing-trajectory.ts';
import type { TrajectoryPoint } from '../../../src/performance/trajectory.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { anyLanding } from '../../support/landing-runs.ts';

const steps = 50;
const stops = anyLanding.filter((run) => run.headwind < 0.8 * run.touchdownSpeed && landing(run).outcome === 'stops');
const pointsOf = (run: LandingRun): TrajectoryPoint[] => {
  const points = landingTrajectory(run, steps);
  if (points === undefined) throw new Error('there is no trajectory');
  return points;
};
const wholeOf = (run: LandingRun) => {
  const whole = landing(run);
  if (whole.outcome !== 'stops') throw new Error(whole.outcome);
  return whole;
};

describe('landingTrajectory', () => {
  test.prop([stops], { numRuns: 100 })('begins over the screen and ends where landing ends, at rest', (run) => {
    const points = pointsOf(run);
    const whole = wholeOf(run);
    const [first, last] = [points[0] as TrajectoryPoint, points.at(-1) as TrajectoryPoint];
    expect(points).toHaveLength(steps + 1);
    expect([first.distance, first.time]).toEqual([0, 0]);
    expect(first.height).toBeCloseTo(run.screenHeight, 6);
    expect(first.trueAirspeed).toBeCloseTo(run.referenceSpeed, 9);
    expect(last.distance / whole.landingDistance).toBeCloseTo(1, 6);
    expect(last.time / (whole.airTime + whole.freeRollTime + whole.brakedRollTime)).toBeCloseTo(1, 6);
    expect(last.groundSpeed).toBeCloseTo(0, 6);
    expect(last.height).toBe(0);
  });

  test.prop([stops], { numRuns: 60 })('never climbs, never gains speed, never goes back in time', (run) => {
    const points = pointsOf(run);
    const step = wholeOf(run).landingDistance / steps;
    points.forEach((point, i) => {
      expect(point.distance / (step * Math.max(i, 1e-9))).toBeCloseTo(i === 0 ? 0 : 1, 6);
      const before = points[i - 1];
      if (before === undefined) return;
      expect(point.time).toBeGreaterThan(before.time);
      expect(point.height).toBeLessThanOrEqual(before.height + 1e-9);
      expect(point.trueAirspeed).toBeLessThanOrEqual(before.trueAirspeed + 1e-9);
      expect(point.height).toBeGreaterThanOrEqual(0);
    });
  });

  test.prop([stops], { numRuns: 40 })('is at each speed of the stop as far from its end as brakedRoll says', (run) => {
    const points = pointsOf(run);
    const whole = wholeOf(run);
    for (const { distance, time, trueAirspeed } of points) {
      if (distance < whole.airDistance + whole.freeRoll || trueAirspeed - run.headwind < 0.1) continue;
      const rest = brakedRoll(run, trueAirspeed);
      if (rest.outcome !== 'stops') throw new Error(rest.outcome);
      expect((whole.landingDistance - distance) / rest.distance).toBeCloseTo(1, 5);
      const end = whole.airTime + whole.freeRollTime + whole.brakedRollTime;
      expect((end - time) / rest.time).toBeCloseTo(1, 5);
    }
  });

  test.prop([anyLanding], { numRuns: 40 })('follows the arc where the air distance is that of the arc', (any) => {
    const { floatDecelerationRatio: _, ...fitted } = any;
    const run = { ...fitted, headwind: 0 };
    if (landing(run).outcome !== 'stops') return;
    const arc = landingArc(run);
    for (const { distance, height } of pointsOf(run)) {
      if (distance >= arc.straight) continue;
      expect(height).toBeCloseTo(run.screenHeight - distance * Math.tan(run.approachAngle), 6);
    }
  });

  test.prop([stops, fc.array(fc.double({ min: 0.1, max: 0.5, noNaN: true }), { minLength: 3, maxLength: 3 })], {
    numRuns: 40,
  })('ends where landing ends on a runway in stretches', (run, frictions) => {
    const length = wholeOf(run).landingDistance / 3;
    const stretches = frictions.map((friction, i) => ({ end: length * (i + 1), braking: constantBraking(friction) }));
    const stretched = { ...run, stretches };
    fc.pre(landing(stretched).outcome === 'stops');
    const last = pointsOf(stretched).at(-1) as TrajectoryPoint;
    expect(last.distance / wholeOf(stretched).landingDistance).toBeCloseTo(1, 6);
  });

  it('is absent where the run does not stop', () => {
    const [run] = fc.sample(stops, { numRuns: 1, seed: 4 });
    const sliding = { ...(run as LandingRun), braking: constantBraking(0), slope: -0.3 };
    expect(landing(sliding).outcome).toBe('never-stops');
    expect(landingTrajectory(sliding, steps)).toBeUndefined();
  });
});
