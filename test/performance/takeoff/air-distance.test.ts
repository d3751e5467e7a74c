import { describe, expect, it } from 'vitest';
import { brent } from '../../../src/numerics/brent.ts';
import { airDistance } from '../../../src/performance/takeoff/air-distance.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { jetEnergyPaths, lightEnergyPaths } from '../../published/textbook-takeoffs.ts';
import { lightSingle } from '../../support/light-single.ts';
import { odex } from '../../support/odex.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

function air(run: TakeoffRun) {
  const result = airDistance(run);
  if (result.outcome !== 'reaches-screen') throw new Error(result.outcome);
  return result;
}

function twinJet(changes: Partial<TakeoffRun>): TakeoffRun {
  const stallSpeed = Math.sqrt((2 * 70_000 * 9.80665) / (1.225 * 122.4 * 2));
  const span = Math.sqrt(9.5 * 122.4);
  const at = (airspeed: number) => 236_000 * (1 - 0.49 * Math.sqrt(airspeed / 340.3));
  return plainRun({
    mass: 70_000,
    wingArea: 122.4,
    span,
    wingHeight: 0.1 * span,
    inducedDragFactor: 1 / (Math.PI * 9.5 * 0.8),
    airDragCoefficient: 0.03,
    density: 1.225,
    thrust: {
      at,
      fill: (airspeeds, n, out) => {
        for (let i = 0; i < n; i++) out[i] = at(airspeeds[i] as number);
      },
      kinks: [],
    },
    liftOffSpeed: 1.1 * stallSpeed,
    screenSpeed: 1.2 * stallSpeed,
    screenHeight: 10.668,
    ...changes,
  });
}

describe('airDistance', () => {
  it.each(lightEnergyPaths.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const found = air(lightSingle({ pullUpLoadFactor: inputs.loadFactor, headwind: inputs.headwind }));
      expect(Math.abs(found.distance - expected)).toBeLessThan(tolerance);
      expect(Math.abs(found.time - inputs.time)).toBeLessThan(6e-4);
    },
  );

  it.each(jetEnergyPaths.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const found = air(twinJet({ pullUpLoadFactor: inputs.loadFactor, headwind: inputs.headwind }));
      expect(Math.abs(found.distance - expected)).toBeLessThan(tolerance);
    },
  );

  it('over the ground is the still-air distance less the wind times the time, head or tail', () => {
    const still = air(lightSingle());
    for (const headwind of [-8, 3, 12]) {
      const windy = air(lightSingle({ headwind }));
      expect(windy.time).toBe(still.time);
      expect(windy.distance).toBeCloseTo(still.distance - headwind * still.time, 9);
    }
  });

  it('is the arc alone where it reaches the screen before the energy limits it', () => {
    const run = plainRun({ thrust: quadraticThrust(0.5 * 9.80665), pullUpLoadFactor: 1.05, liftOffSpeed: 40 });
    const radius = 1600 / (0.05 * 9.80665);
    const found = air(run);
    expect(found.distance).toBeCloseTo(Math.sqrt(radius ** 2 - (radius - 15.24) ** 2), 9);
    // constant speed on the arc
    expect(found.time).toBeCloseTo((radius * Math.acos(1 - 15.24 / radius)) / 40, 6);
  });

  it('is arc and straight at a constant gradient: R tan(gamma/2) + h/tan(gamma)', () => {
    const run = plainRun({ thrust: quadraticThrust(0.1 * 9.80665), pullUpLoadFactor: 1.2 });
    const radius = 900 / (0.2 * 9.80665);
    const gamma = Math.asin(0.1);
    expect(air(run).distance).toBeCloseTo(radius * Math.tan(gamma / 2) + 15.24 / Math.tan(gamma), 6);
  });

  it('spends the energy of the speed gained: kappa', () => {
    const run = plainRun({ thrust: quadraticThrust(0.1 * 9.80665), pullUpLoadFactor: 1.3, screenSpeed: 33 });
    const kappa = 1 + (33 ** 2 - 30 ** 2) / (2 * 9.80665 * 15.24);
    const radius = 900 / (0.3 * 9.80665);
    const gamma = Math.asin(0.1 / kappa);
    expect(air(run).distance).toBeCloseTo(radius * Math.tan(gamma / 2) + 15.24 / Math.tan(gamma), 6);
  });

  it('takes a screen speed below the lift-off speed as the lift-off speed', () => {
    const run = lightSingle();
    expect(air({ ...run, screenSpeed: 0.9 * run.liftOffSpeed })).toEqual(
      air({ ...run, screenSpeed: run.liftOffSpeed }),
    );
  });

  it('gives no credit for a falling runway, and lengthens 15 % at 2 % uphill (14 to 17) [independent computation; computed]', () => {
    const level = air(lightSingle()).distance;
    expect(air(lightSingle({ slope: -0.03 })).distance).toBe(level);
    const uphill = air(lightSingle({ slope: 0.02 })).distance / level - 1;
    expect(uphill).toBeGreaterThan(0.14);
    expect(uphill).toBeLessThan(0.17);
  });

  it('has no distance where the climb is not above what is needed, and says by how much', () => {
    const run = plainRun({ thrust: quadraticThrust(0.015 * 9.80665) });
    const result = airDistance(run);
    expect(result).toMatchObject({ outcome: 'never-reaches-screen-height', neededClimbGradient: 0.015 });
    if (result.outcome !== 'never-reaches-screen-height') throw new Error(result.outcome);
    expect(result.leastClimbGradient).toBeCloseTo(0.015, 12);
    expect(airDistance(run, 0).outcome).toBe('reaches-screen');
    expect(airDistance(plainRun({ thrust: quadraticThrust(0.01 * 9.80665) }), 0).outcome).toBe('reaches-screen');
    expect(airDistance(plainRun({ thrust: quadraticThrust(0) }), 0).outcome).toBe('never-reaches-screen-height');
  });

  it('is no distance backwards where a steep climb into a wind makes no way: ground-speed-not-positive', () => {
    // 45 degrees from a short arc on: forward speed 30 m/s at lift-off, 21.2 m/s soon after
    const steep = { thrust: quadraticThrust(9.80665), pullUpLoadFactor: 2, screenHeight: 30 };
    const still = air(plainRun(steep));
    const forward = still.distance / still.time;
    expect(forward).toBeGreaterThan(30 * Math.SQRT1_2);
    expect(forward).toBeLessThan(30);
    expect(air(plainRun({ ...steep, headwind: forward - 0.01 })).distance).toBeCloseTo(0.01 * still.time, 9);
    const result = airDistance(plainRun({ ...steep, headwind: forward + 0.01 }));
    expect(result).toEqual({ outcome: 'ground-speed-not-positive', headwind: forward + 0.01, climbSpeed: forward });
  });

  it('refuses an arc that does not pull up', () => {
    expect(() => airDistance(lightSingle({ pullUpLoadFactor: 1 }))).toThrow(/loadFactor/);
  });

  it('follows a gradient that nearly vanishes at the screen to 1e-9 [odex 2.0.4 at 1e-13; computed]', () => {
    // gradient linear in height from 0.5 at lift-off to 1e-5 above nothing at the screen
    const growth = (0.5 - 1e-5) / (60 ** 2 - 30 ** 2);
    const thrust = quadraticThrust((0.5 + growth * 900) * 9.80665, -growth * 9.80665);
    const run = plainRun({ thrust, screenSpeed: 60, pullUpLoadFactor: 1.3 });
    const found = airDistance(run, 0);
    if (found.outcome !== 'reaches-screen') throw new Error(found.outcome);
    const kappa = 1 + (60 ** 2 - 30 ** 2) / (2 * 9.80665 * 15.24);
    const radius = 900 / (0.3 * 9.80665);
    const sine = (height: number) => (0.5 - ((0.5 - 1e-5) * height) / 15.24) / kappa;
    const top = brent((h) => radius * (1 - Math.sqrt(1 - sine(h) ** 2)) - h, 0, 15.24, 1e-13);
    if (top.outcome !== 'root') throw new Error(top.outcome);
    const [rest] = odex((h) => [Math.sqrt(1 - sine(h) ** 2) / sine(h), 1], top.root, 15.24, 1e-13);
    expect(found.distance / (Math.sqrt(top.root * (2 * radius - top.root)) + rest)).toBeCloseTo(1, 8);
  });
});
