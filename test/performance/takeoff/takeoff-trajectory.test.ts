import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { takeoff } from '../../../src/performance/takeoff/takeoff.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { takeoffTrajectory } from '../../../src/performance/takeoff/takeoff-trajectory.ts';
import type { TrajectoryPoint } from '../../../src/performance/trajectory.ts';
import { odePath, odeRoll } from '../../support/ode-takeoff.ts';
import { anyFigures, easyFigures, runOf } from '../../support/takeoff-runs.ts';

const steps = 50;
const pointsOf = (run: TakeoffRun, allowance = 0): TrajectoryPoint[] => {
  const points = takeoffTrajectory(run, allowance, steps);
  if (points === undefined) throw new Error('there is no trajectory');
  return points;
};
const flies = easyFigures.map(runOf).filter((run) => takeoff(run).outcome === 'reaches-screen');

describe('takeoffTrajectory', () => {
  test.prop([flies, fc.double({ min: 0, max: 200, noNaN: true })], { numRuns: 60 })(
    'ends where takeoff ends, in distance, time, speed and height',
    (run, allowance) => {
      const points = pointsOf(run, allowance);
      const whole = takeoff(run);
      if (whole.outcome !== 'reaches-screen') throw new Error(whole.outcome);
      const last = points.at(-1) as TrajectoryPoint;
      expect(points).toHaveLength(steps + 1);
      expect(last.distance / (whole.takeoffDistance + allowance)).toBeCloseTo(1, 6);
      expect(last.time / (whole.groundRollTime + whole.airTime)).toBeCloseTo(1, 6);
      expect(last.height).toBeCloseTo(run.screenHeight, 9);
      expect(last.trueAirspeed).toBeCloseTo(Math.max(run.screenSpeed, run.liftOffSpeed), 8);
    },
  );

  test.prop([flies], { numRuns: 60 })(
    'goes in even steps, never back in time, speed on the ground or height',
    (run) => {
      const points = pointsOf(run);
      const step = (points.at(-1) as TrajectoryPoint).distance / steps;
      points.forEach((point, i) => {
        expect(point.distance).toBeCloseTo(step * i, 6);
        const before = points[i - 1];
        if (before === undefined) return;
        expect(point.time).toBeGreaterThan(before.time);
        expect(point.height).toBeGreaterThanOrEqual(before.height);
        if (point.height === 0) {
          expect(point.trueAirspeed).toBeGreaterThanOrEqual(before.trueAirspeed);
          expect(point.groundSpeed).toBeCloseTo(point.trueAirspeed - run.headwind, 9);
        }
        // the mean speed of a step lies between those at its ends, or near where it changes its sense
        const mean = step / (point.time - before.time);
        const [least, most] = [point.groundSpeed, before.groundSpeed].sort((a, b) => a - b) as [number, number];
        expect(mean).toBeGreaterThan(least * 0.98 - 1e-9);
        expect(mean).toBeLessThan(most * 1.02 + 1e-9);
      });
    },
  );

  test.prop([flies], { numRuns: 30 })(
    'has on the ground the distance and time of an ODE library [odex 2.0.4, 1e-9] to each speed; tolerance 1e-6',
    (run) => {
      for (const { distance, time, trueAirspeed, height } of pointsOf({ ...run, rotationTime: 0 })) {
        if (height > 0 || trueAirspeed <= run.headwind * (1 + 1e-9) + 1e-6) continue;
        const [there, then] = odeRoll({ ...run, liftOffSpeed: trueAirspeed }, 1e-10, [0, ...run.thrust.kinks]);
        expect(distance / there).toBeCloseTo(1, 6);
        expect(time / then).toBeCloseTo(1, 6);
      }
    },
  );

  test.prop([flies], { numRuns: 30 })(
    'climbs at the angle of the equations written out again; tolerance 1e-6',
    (run) => {
      for (const { groundSpeed, trueAirspeed, height } of pointsOf(run)) {
        if (height <= 0) continue;
        const { sine, airspeed } = odePath(run, height);
        expect(trueAirspeed / airspeed).toBeCloseTo(1, 8);
        const cosine = (groundSpeed + run.headwind) / trueAirspeed;
        expect(cosine).toBeCloseTo(Math.sqrt(1 - sine * sine), 5);
      }
    },
  );

  test.prop([flies, fc.array(fc.double({ min: -0.02, max: 0.02, noNaN: true }), { minLength: 1, maxLength: 5 })], {
    numRuns: 60,
  })('ends where takeoff ends over a ground line with a profile', (run, slopes) => {
    const profile = { ends: slopes.map((_, i) => 150 * (i + 1)), slopes };
    const profiled = { ...run, profile };
    const whole = takeoff(profiled);
    if (whole.outcome !== 'reaches-screen') return;
    const last = pointsOf(profiled).at(-1) as TrajectoryPoint;
    expect(last.distance / whole.takeoffDistance).toBeCloseTo(1, 6);
    expect(last.time / (whole.groundRollTime + whole.airTime)).toBeCloseTo(1, 6);
  });

  it('rotates at the rotation speed, for its time', () => {
    const [figures] = fc.sample(easyFigures, { numRuns: 1, seed: 5 });
    if (figures === undefined) throw new Error('no figures');
    const base = runOf({ ...figures, headwindRatio: 0, rotationTime: 0 });
    const rotating = { ...base, rotationSpeed: base.liftOffSpeed * 0.9, rotationTime: 8 };
    const points = pointsOf(rotating);
    const held = points.filter(({ trueAirspeed }) => Math.abs(trueAirspeed - rotating.rotationSpeed) < 1e-9);
    expect(held.length).toBeGreaterThan(2);
    const length = (held.at(-1) as TrajectoryPoint).distance - (held[0] as TrajectoryPoint).distance;
    expect(length).toBeLessThanOrEqual(rotating.rotationSpeed * 8);
    expect(length + (2 * (points.at(-1) as TrajectoryPoint).distance) / steps).toBeGreaterThan(
      rotating.rotationSpeed * 8,
    );
  });

  it('stands still, without time, on the allowance of a rolling start', () => {
    const [figures] = fc.sample(easyFigures, { numRuns: 1, seed: 5 });
    if (figures === undefined) throw new Error('no figures');
    const run = runOf({ ...figures, headwindRatio: 0.1 });
    const points = pointsOf(run, 300);
    const standing = points.filter(({ distance }) => distance < 300);
    expect(standing.length).toBeGreaterThan(3);
    expect(standing.every(({ time, groundSpeed }) => time === 0 && groundSpeed === 0)).toBe(true);
  });

  test.prop([anyFigures.map(runOf)], { numRuns: 200 })('is there where takeoff reaches the screen', (run) => {
    const points = takeoff(run).outcome === 'reaches-screen' ? takeoffTrajectory(run, 0, 10) : [];
    expect(points).toBeDefined();
  });

  it('asks for a whole number of steps', () => {
    const [figures] = fc.sample(easyFigures, { numRuns: 1, seed: 5 });
    if (figures === undefined) throw new Error('no figures');
    expect(() => takeoffTrajectory(runOf(figures), 0, 0)).toThrow(/steps must be a whole number from 1: 0/);
  });
});
