import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { closedFormRoll } from '../../../src/performance/takeoff/closed-form-roll.ts';
import { groundRoll } from '../../../src/performance/takeoff/ground-roll.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import {
  andersonExample66,
  andersonExample617,
  closedFormRolls,
  meriamKraige,
  windOnRoll,
} from '../../published/textbook-takeoffs.ts';
import { executiveJet } from '../../support/executive-jet.ts';
import { lightSingle } from '../../support/light-single.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

const foot = 0.3048;

function roll(run: TakeoffRun) {
  const result = groundRoll(run);
  if (result.outcome !== 'lifts-off') throw new Error(result.outcome);
  return result;
}

const businessJet = plainRun({
  mass: 73_000 * 0.45359237,
  wingArea: 950 * foot * foot,
  groundDragCoefficient: 0.015 + 0.0177 + (0.02 + 0.588 / (Math.PI * 0.9 * 5.92)) * 0.01,
  groundLiftCoefficient: 0.1,
  rollingFriction: 0.04,
  thrust: quadraticThrust(0.341 * 73_000 * 0.45359237 * 9.80665),
  density: 0.002377 * 515.378818,
  liftOffSpeed: 205.1 * foot,
  rotationTime: 3,
});

describe('groundRoll', () => {
  const [anderson] = andersonExample66;
  it(anderson?.title ?? '', () => {
    const found = roll(businessJet).distance / foot;
    expect(Math.abs(found - 2857)).toBeLessThan(anderson?.tolerance ?? 0);
  });

  const exact = andersonExample617[1];
  it(`${exact?.title}; ours is 0.5 % longer: that integral lets lift beyond the weight pull the wheels forward`, () => {
    const found = roll(executiveJet);
    const closed = closedFormRoll(executiveJet, { atRest: 32_485, perSquare: 0 });
    if (typeof closed === 'string') throw new Error(closed);
    expect(Math.abs(closed.distance - 1106.4)).toBeLessThan(exact?.tolerance ?? 0);
    expect(found.distance / closed.distance).toBeGreaterThan(1.004);
    expect(found.distance / closed.distance).toBeLessThan(1.006);
  });

  it.each(meriamKraige.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    const run = plainRun({ groundDragCoefficient: 2 * inputs.k, liftOffSpeed: 250 / 3.6 });
    expect(Math.abs(roll(run).distance - expected)).toBeLessThan(tolerance);
  });

  it.each(windOnRoll.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    const still = roll(plainRun({})).distance;
    const windy = roll(plainRun({ headwind: 30 * inputs.windShare })).distance;
    expect(Math.abs(100 * (windy / still - 1) - expected)).toBeLessThan(tolerance);
  });

  it.each(closedFormRolls.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const still = lightSingle();
      const run = lightSingle({ headwind: inputs.windShare * still.liftOffSpeed });
      expect(Math.abs(roll(run).distance - expected)).toBeLessThan(tolerance);
    },
  );

  it('SCALE-1: without drag, speed as m^0.5, roll as m^2, time as m^1.5, to 0.1 % [constant acceleration; computed]', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.2, max: 5, noNaN: true }), (r) => {
        const one = roll(plainRun({}));
        const other = roll(plainRun({ mass: r, liftOffSpeed: 30 * Math.sqrt(r) }));
        expect(other.distance / one.distance / r ** 2).toBeCloseTo(1, 10);
        expect(other.time / one.time / r ** 1.5).toBeCloseTo(1, 10);
      }),
    );
  });

  it('adds the rotation at the rotation speed over the ground, after the whole acceleration', () => {
    const without = roll(lightSingle({ headwind: 4 }));
    const { liftOffSpeed } = lightSingle();
    for (const rotationSpeed of [liftOffSpeed, 0.9 * liftOffSpeed]) {
      const rotating = roll(lightSingle({ headwind: 4, rotationSpeed, rotationTime: 2 }));
      expect(rotating.distance - without.distance).toBeCloseTo(2 * (rotationSpeed - 4), 9);
      expect(rotating.time - without.time).toBeCloseTo(2, 9);
    }
    expect(roll(lightSingle({ headwind: 20, rotationSpeed: 15, rotationTime: 2 })).distance).toBe(
      roll(lightSingle({ headwind: 20 })).distance,
    );
  });

  it('follows an acceleration that nearly vanishes: a = a0 - k v^2 down to 2e-6 g, closed form to 1e-7', () => {
    for (const left of [1e-2, 1e-3, 1e-4, 1e-5, 2e-5 / 9.80665]) {
      const k = (2 - left * 9.80665) / 900;
      const found = roll(plainRun({ groundDragCoefficient: 2 * k }));
      const expected = -Math.log1p((-k * 900) / 2) / (2 * k);
      expect(Math.abs(found.distance / expected - 1)).toBeLessThan(1e-7);
      expect(found.leastAccelerationRatio).toBeCloseTo(left, 8);
    }
  });

  it('names the first airspeed at which the acceleration is gone', () => {
    const result = groundRoll(plainRun({ groundDragCoefficient: (2 * 2) / 20 ** 2 }));
    if (result.outcome !== 'never-reaches-lift-off-speed') throw new Error(result.outcome);
    expect(Math.abs(result.atAirspeed - 20)).toBeLessThan(0.04);
    expect(result.leastAccelerationRatio).toBeLessThan(0);
    const stuck = groundRoll(plainRun({ rollingFriction: 0.3 }));
    expect(stuck).toMatchObject({ outcome: 'never-reaches-lift-off-speed', atAirspeed: 0 });
  });

  it('is not a roll of 0 where the wind is the lift-off speed: ground-speed-not-positive', () => {
    expect(groundRoll(plainRun({ headwind: 30 }))).toEqual({
      outcome: 'ground-speed-not-positive',
      headwind: 30,
      liftOffSpeed: 30,
    });
  });

  it('lets the wheels go where lift reaches the weight: friction beyond that airspeed is worth nothing', () => {
    const lift = { groundLiftCoefficient: (2 * 9.80665) / 15 ** 2, headwind: 15.001, thrust: quadraticThrust(5) };
    const free = roll(plainRun(lift)).distance;
    expect(roll(plainRun({ ...lift, rollingFriction: 0.3 })).distance).toBeCloseTo(free, 12);
  });

  it('gains from a tailwind at rest what the air behind pushes', () => {
    const drag = { groundDragCoefficient: 0.004 };
    const behind = roll(plainRun({ ...drag, headwind: -10, liftOffSpeed: 1e-9 })).distance;
    // from V = -10 to 0: the integral of (V + 10)/(2 + 0.002 V^2)
    const k = 0.002;
    const expected = (10 / Math.sqrt(2 * k)) * Math.atan(10 * Math.sqrt(k / 2)) - Math.log1p((100 * k) / 2) / (2 * k);
    expect(behind).toBeCloseTo(expected, 6);
  });

  it('takes a tailwind of no size as none where the acceleration is small', () => {
    const weak = { groundDragCoefficient: (2 * (2 - 0.01)) / 900 };
    const still = roll(plainRun(weak)).distance;
    expect(roll(plainRun({ ...weak, headwind: -4e-323 })).distance).toBeCloseTo(still, 6);
  });
});
