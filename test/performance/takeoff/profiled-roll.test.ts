import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { overallSlope, slopeProfile, steepestFrom } from '../../../src/performance/slope-profile.ts';
import { groundRoll } from '../../../src/performance/takeoff/ground-roll.ts';
import { takeoff } from '../../../src/performance/takeoff/takeoff.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { lightSingle } from '../../support/light-single.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

const g = 9.80665;

function roll(run: TakeoffRun): number {
  const result = groundRoll(run);
  if (result.outcome !== 'lifts-off') throw new Error(result.outcome);
  return result.distance;
}

/** The roll by distance: d(V)/ds = a/(V - w), the slope looked up where the wheels are; forces written out again. */
function rollByDistance(run: TakeoffRun, slopeAt: (distance: number) => number): number {
  const phi = 1 - (1 - (1.32 * run.wingHeight) / run.span) / (1.05 + (7.4 * run.wingHeight) / run.span);
  const drag = run.groundDragCoefficient + phi * run.inducedDragFactor * run.groundLiftCoefficient ** 2;
  const acceleration = (airspeed: number, distance: number) => {
    const pressure = 0.5 * run.density * airspeed * Math.abs(airspeed) * run.wingArea;
    const load = Math.max(0, run.mass * g - pressure * run.groundLiftCoefficient);
    return (run.thrust.at(airspeed) - pressure * drag - run.rollingFriction * load) / run.mass - g * slopeAt(distance);
  };
  // plain fourth-order steps of 2 ms in time, then the last step cut where the speed is reached
  let distance = 0;
  let airspeed = run.headwind;
  const step = 0.002;
  for (;;) {
    const k1 = acceleration(airspeed, distance);
    const d1 = airspeed - run.headwind;
    const k2 = acceleration(airspeed + (k1 * step) / 2, distance + (d1 * step) / 2);
    const k3 = acceleration(airspeed + (k2 * step) / 2, distance + (d1 * step) / 2);
    const k4 = acceleration(airspeed + k3 * step, distance + d1 * step);
    const gain = ((k1 + 2 * k2 + 2 * k3 + k4) / 6) * step;
    const way = (airspeed + gain / 2 - run.headwind) * step;
    if (airspeed + gain >= run.liftOffSpeed) return distance + way * ((run.liftOffSpeed - airspeed) / gain);
    airspeed += gain;
    distance += way;
    if (distance > 20_000) throw new Error('the steps never lift off');
  }
}

const hump = slopeProfile([0, 120, 200, 1500], [100, 101.2, 104.4, 91.4], 0);

describe('a roll over a ground line with a profile', () => {
  it('equals the roll on its slope where the slope is the same throughout, for any cutting of it', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -0.05, max: 0.04, noNaN: true }),
        fc.array(fc.double({ min: 10, max: 300, noNaN: true }), { minLength: 1, maxLength: 6 }),
        fc.double({ min: -5, max: 10, noNaN: true }),
        (slope, lengths, headwind) => {
          const ends = lengths.map((_, i) => lengths.slice(0, i + 1).reduce((a, b) => a + b, 0));
          const run = { ...lightSingle(), slope, headwind };
          const profile = { ends, slopes: ends.map(() => slope) };
          expectRatio(roll({ ...run, profile }), roll(run), 1e-9);
        },
      ),
      { numRuns: 100 },
    );
  });

  it('agrees with fourth-order steps of 2 ms over a hump and down the far side, to 1 cm [forces written out again; computed]', () => {
    const slopeAt = (distance: number) => (distance < 120 ? 0.01 : distance < 200 ? 0.04 : -0.01);
    for (const headwind of [-3, 0, 6]) {
      const run = { ...lightSingle(), headwind, profile: hump, slope: overallSlope(hump) };
      expectNear(roll(run), rollByDistance(run, slopeAt), 0.01);
    }
  });

  it('is longer with the climb first than with the climb last: what is gained late is lost early', () => {
    const first = { ends: [150, 600], slopes: [0.03, 0] };
    const last = { ends: [450, 600], slopes: [0, 0.03] };
    const long = { ...lightSingle(), mass: lightSingle().mass * 1.2 };
    expect(roll({ ...long, profile: first })).toBeGreaterThan(roll({ ...long, profile: last }));
  });

  it('names never-reaches-lift-off-speed where a stretch stops the acceleration before it is left', () => {
    const wall = { ends: [50, 400], slopes: [0, 0.25] };
    const found = groundRoll({ ...lightSingle(), profile: wall });
    expect(found.outcome).toBe('never-reaches-lift-off-speed');
    expect('leastAccelerationRatio' in found && found.leastAccelerationRatio).toBeLessThan(0);
  });

  it('lets the air path see the steepest stretch from lift-off on', () => {
    const run = { ...lightSingle(), slope: 0 };
    const rising = { ends: [roll(run) + 1, 3000], slopes: [0, 0.02] };
    const found = takeoff({ ...run, profile: rising });
    const steep = takeoff({ ...run, slope: 0.02 });
    if (found.outcome !== 'reaches-screen' || steep.outcome !== 'reaches-screen') throw new Error('no screen');
    expectRatio(found.airDistance, steep.airDistance, 1e-12);
    expectRatio(found.groundRoll, roll(run), 1e-9);
  });
});

describe('slopeProfile', () => {
  it('measures from the start point and keeps rise over length', () => {
    expect(hump.ends).toEqual([120, 200, 1500]);
    expectNear(overallSlope(hump), (91.4 - 100) / 1500, 1e-15);
    // from the start point to a distance on the line, and on the last slope beyond it
    expectNear(overallSlope(hump, 160), (102.8 - 100) / 160, 1e-15);
    expectNear(overallSlope(hump, 120), 0.01, 1e-15);
    expectNear(overallSlope(hump, 2500), (91.4 - 10 - 100) / 2500, 1e-15);
    const later = slopeProfile([0, 120, 200, 1500], [100, 101.2, 104.4, 91.4], 150);
    expect(later.ends).toEqual([50, 1350]);
    expectNear(later.slopes[0] as number, 0.04, 1e-12);
    expect(steepestFrom(hump, 130)).toBeCloseTo(0.04, 12);
    expect(steepestFrom(hump, 5000)).toBeCloseTo(-0.01, 12);
  });
});
