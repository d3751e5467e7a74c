import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { antiSkidEfficiency, groovedBrakingCurve, wetBrakingCurve } from '../../src/physics/wet-braking.ts';
import {
  fullyModulatingCoefficients,
  groovedBrakingCoefficients,
  wetBrakingCoefficients,
} from '../published/braking-and-landing.ts';

const psi = 6894.757293168361;
const knot = 1852 / 3600;

describe('wetBrakingCurve', () => {
  it.each(wetBrakingCoefficients.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const found = wetBrakingCurve(inputs.tyre_psi * psi)(inputs.ground_speed_kt * knot);
      expect(Math.abs(found - expected)).toBeLessThan(tolerance);
    },
  );

  it.each(fullyModulatingCoefficients.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const found = antiSkidEfficiency('fully-modulating') * wetBrakingCurve(100 * psi)(inputs.ground_speed_kt * knot);
      expect(Math.abs(found - expected)).toBeLessThan(tolerance);
    },
  );

  it('is linear in tyre pressure between the curves and held beyond 50 and 300 psi and 200 kt', () => {
    for (const speed of [0, 20, 60]) {
      const at = (pressure: number) => wetBrakingCurve(pressure * psi)(speed);
      expect(at(150)).toBeCloseTo((at(100) + at(200)) / 2, 12);
      expect(at(30)).toBe(at(50));
      expect(at(400)).toBe(at(300));
    }
    // -0.0331 x 8 + 0.252 x 4 - 0.658 x 2 + 0.692
    expect(wetBrakingCurve(200 * psi)(200 * knot)).toBeCloseTo(0.1192, 12);
    expect(wetBrakingCurve(200 * psi)(300 * knot)).toBe(wetBrakingCurve(200 * psi)(200 * knot));
  });

  it('never rises with speed nor pressure up to 150 kt, and stays in 0.05 to 0.883', () => {
    const speed = fc.double({ min: 0, max: 150 * knot, noNaN: true });
    const pressure = fc.double({ min: 20 * psi, max: 400 * psi, noNaN: true });
    fc.assert(
      fc.property(speed, speed, pressure, pressure, (a, b, p, q) => {
        const curve = wetBrakingCurve(p);
        expect(curve(Math.max(a, b))).toBeLessThanOrEqual(curve(Math.min(a, b)));
        expect(wetBrakingCurve(Math.max(p, q))(a)).toBeLessThanOrEqual(wetBrakingCurve(Math.min(p, q))(a) + 1e-12);
        expect(curve(a)).toBeGreaterThanOrEqual(0.05);
        expect(curve(a)).toBeLessThanOrEqual(0.883);
      }),
    );
  });
});

describe('groovedBrakingCurve', () => {
  it.each(groovedBrakingCoefficients.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const found = groovedBrakingCurve(inputs.tyre_psi * psi)(inputs.ground_speed_kt * knot);
      expect(Math.abs(found - expected)).toBeLessThan(tolerance);
    },
  );

  it('is never below the smooth curve: at 50 psi its own line starts under it, at 0.859 against 0.883', () => {
    expect(groovedBrakingCurve(50 * psi)(0)).toBeCloseTo(0.883, 12);
    const speed = fc.double({ min: 0, max: 220 * knot, noNaN: true });
    const pressure = fc.double({ min: 20 * psi, max: 400 * psi, noNaN: true });
    fc.assert(
      fc.property(speed, pressure, (v, p) => {
        expect(groovedBrakingCurve(p)(v)).toBeGreaterThanOrEqual(wetBrakingCurve(p)(v));
      }),
    );
  });

  it('rises up to 9 kt at 50 psi, and falls from there on', () => {
    const at = (speed: number) => groovedBrakingCurve(50 * psi)(speed * knot);
    expect(at(8.5)).toBeGreaterThan(at(4));
    for (let speed = 9; speed < 200; speed += 5) expect(at(speed + 5)).toBeLessThan(at(speed));
  });

  it('asks for a pressure', () => {
    expect(() => groovedBrakingCurve(Number.NaN)).toThrow(/tyrePressure/);
  });
});

describe('antiSkidEfficiency', () => {
  it('is 0.30 on-off, 0.50 quasi-modulating, 0.80 fully modulating [14 CFR 25.109(c)(2); read], 0.30 without [judgement]', () => {
    const kinds = ['none', 'on-off', 'quasi-modulating', 'fully-modulating'] as const;
    expect(kinds.map(antiSkidEfficiency)).toEqual([0.3, 0.3, 0.5, 0.8]);
  });
});
