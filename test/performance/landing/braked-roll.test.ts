import { describe, expect, it } from 'vitest';
import { brakedRoll } from '../../../src/performance/landing/braked-roll.ts';
import type { BrakedRun } from '../../../src/performance/landing/landing-run.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { andersonExample618, trainerStops } from '../../published/braking-and-landing.ts';

const g = 9.80665;
const trainer: BrakedRun = {
  mass: 1043,
  wingArea: 16.2,
  span: Math.sqrt(7.32 * 16.2),
  wingHeight: 0.2 * Math.sqrt(7.32 * 16.2),
  inducedDragFactor: 1 / (Math.PI * 7.32 * 0.72),
  groundDragCoefficient: 0.037,
  groundLiftCoefficient: 0.2,
  braking: constantBraking(0.3),
  idleThrust: 0,
  density: 1.225,
  headwind: 0,
  slope: 0,
};
const plain: BrakedRun = { ...trainer, groundDragCoefficient: 0, groundLiftCoefficient: 0 };

function stop(run: BrakedRun, airspeed: number) {
  const result = brakedRoll(run, airspeed);
  if (result.outcome !== 'stops') throw new Error(result.outcome);
  return result;
}

describe('brakedRoll', () => {
  it.each(trainerStops.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    const found = stop({ ...trainer, braking: constantBraking(inputs.friction) }, 26).distance;
    expect(Math.abs(found - expected)).toBeLessThan(tolerance);
  });

  const [anderson] = andersonExample618;
  it(anderson?.title ?? '', () => {
    const run = {
      ...plain,
      mass: 54_966.4 / 9.8,
      wingArea: 29.54,
      groundDragCoefficient: 1.1 * 0.022,
      braking: constantBraking((0.4 * 9.8) / g),
    };
    expect(Math.abs(stop(run, 45.317).distance - 257.26)).toBeLessThan(anderson?.tolerance ?? 0);
  });

  it('is V^2/(2 g (mu + slope)) without air, and V/(g (mu + slope)) in time', () => {
    for (const slope of [-0.02, 0, 0.02]) {
      const found = stop({ ...plain, slope }, 30);
      expect(found.distance).toBeCloseTo(900 / (2 * g * (0.3 + slope)), 9);
      expect(found.time).toBeCloseTo(30 / (g * (0.3 + slope)), 9);
      expect(found.leastDecelerationRatio).toBeCloseTo(0.3 + slope, 12);
    }
  });

  it('counts the wind twice: in the speed to stop from and in the air that helps', () => {
    expect(stop({ ...plain, headwind: 10 }, 30).distance).toBeCloseTo(400 / (2 * g * 0.3), 9);
    // a tailwind pushes at the end: the last of the stop is from V = 0 to V = -5 of airspeed
    const tail = stop({ ...trainer, groundLiftCoefficient: 0, headwind: -5 }, 1e-9).distance;
    const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043;
    const a = 0.3 * g;
    const expected = (5 / Math.sqrt(a * k)) * Math.atanh(5 * Math.sqrt(k / a)) + Math.log1p((-25 * k) / a) / (2 * k);
    expect(tail).toBeCloseTo(expected, 6);
  });

  it('takes idle thrust off and reverse thrust as help', () => {
    const thrust = 0.05 * 1043 * g;
    expect(stop({ ...plain, idleThrust: thrust }, 30).distance).toBeCloseTo(900 / (2 * g * 0.25), 9);
    expect(stop({ ...plain, idleThrust: -thrust }, 30).distance).toBeCloseTo(900 / (2 * g * 0.35), 9);
  });

  it('follows a friction that depends on ground speed, split at its kinks, to 1e-9', () => {
    const braking = { at: (speed: number) => (speed < 12 ? 0.2 : 0.1), kinks: [12] };
    const found = stop({ ...plain, braking, headwind: 4 }, 34).distance;
    expect(found).toBeCloseTo((900 - 144) / (2 * g * 0.1) + 144 / (2 * g * 0.2), 7);
  });

  it('never stops where thrust and slope outweigh the brakes, and says from which ground speed', () => {
    expect(brakedRoll({ ...plain, braking: constantBraking(0.05), slope: -0.05 }, 30)).toMatchObject({
      outcome: 'never-stops',
      atGroundSpeed: 30,
    });
    const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043 / g;
    const result = brakedRoll(
      {
        ...trainer,
        groundLiftCoefficient: 0,
        headwind: 3,
        braking: constantBraking(0),
        idleThrust: 400 * k * 1043 * g,
      },
      30,
    );
    if (result.outcome !== 'never-stops') throw new Error(result.outcome);
    // drag balances idle thrust at an airspeed of 20
    expect(Math.abs(result.atGroundSpeed - 17)).toBeLessThan(0.03);
    expect(result.leastDecelerationRatio).toBeLessThan(0);
  });

  it('follows a deceleration that nearly vanishes', () => {
    for (const left of [1e-3, 1e-5]) {
      const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043;
      const run = { ...trainer, groundLiftCoefficient: 0, braking: constantBraking(left) };
      expect(stop(run, 26).distance / (Math.log1p((k * 676) / (left * g)) / (2 * k))).toBeCloseTo(1, 7);
    }
  });

  it('asks for a speed to stop from', () => {
    expect(() => brakedRoll({ ...plain, headwind: 30 }, 30)).toThrow(/airspeed/);
  });
});
