import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { groundEffect, heightRatioWithoutEffect } from '../../src/physics/ground-effect.ts';
import { groundEffectFactors } from '../published/ground-effect.ts';

describe('groundEffect', () => {
  it.each(groundEffectFactors.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      expect(Math.abs(groundEffect(inputs.heightRatio) - expected)).toBeLessThanOrEqual(tolerance);
    },
  );

  it('never falls with height, stays in 0.25 to 1 and is 1 from h/b = 0.758 up', () => {
    const ratio = fc.double({ min: 0, max: 5, noNaN: true });
    fc.assert(
      fc.property(ratio, ratio, (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(groundEffect(low)).toBeLessThanOrEqual(groundEffect(high));
        expect(groundEffect(a)).toBeGreaterThan(0.24);
        expect(groundEffect(a)).toBeLessThanOrEqual(1);
      }),
    );
    expect(groundEffect(heightRatioWithoutEffect)).toBe(1);
    expect(groundEffect(heightRatioWithoutEffect - 1e-9)).toBeCloseTo(1, 8);
  });
});
