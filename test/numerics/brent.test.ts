import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brent } from '../../src/numerics/brent.ts';

describe('brent', () => {
  it('finds the real root of x^3 - 2x - 5, 2.0945514815423265 to 1e-12 [Wallis 1685; memory]', () => {
    const found = brent((x) => x ** 3 - 2 * x - 5, 2, 3, 1e-13);
    expect(found.outcome === 'root' && found.root).toBeCloseTo(2.0945514815423265, 12);
  });

  it('finds any bracketed root of a monotone function, in few evaluations', () => {
    fc.assert(
      fc.property(fc.double({ min: -9, max: 9, noNaN: true }), fc.constantFrom(1, 3, 5), (root, power) => {
        let calls = 0;
        const found = brent(
          (x) => {
            calls++;
            return (x - root) ** power * (1 + x * x);
          },
          -10,
          10,
          1e-9,
        );
        expect(found.outcome).toBe('root');
        if (found.outcome === 'root') expect(Math.abs(found.root - root)).toBeLessThan(1e-8);
        expect(calls).toBeLessThan(power === 1 ? 20 : 150);
      }),
    );
  });

  it('meets a root at either end', () => {
    expect(brent((x) => x, 0, 1, 1e-9)).toMatchObject({ outcome: 'root', root: 0 });
    expect(brent((x) => x - 1, 0, 1, 1e-9)).toMatchObject({ outcome: 'root', root: 1 });
  });

  it('says so where the ends do not bracket a root', () => {
    expect(brent((x) => x * x + 1, -1, 2, 1e-9)).toEqual({ outcome: 'not-bracketed', atLow: 2, atHigh: 5 });
    expect(brent(() => Number.NaN, -1, 2, 1e-9).outcome).toBe('not-bracketed');
  });

  it('refuses a tolerance of 0', () => {
    expect(() => brent((x) => x, -1, 1, 0)).toThrow(/tolerance/);
  });
});
