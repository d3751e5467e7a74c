import { describe, expect, it } from 'vitest';
import { gaussLegendre } from '../../src/numerics/gauss-legendre.ts';
import { type AddPiece, addSettled, newPathIntegral } from '../../src/performance/path-integral.ts';

const rule = gaussLegendre(6);

/** Integrals of x/f and 1/f by six nodes. */
function pieceOf(f: (x: number) => number): AddPiece {
  return (from, to, sum) => {
    const half = (to - from) / 2;
    for (let i = 0; i < rule.order; i++) {
      const x = from + half * (1 + (rule.nodes[i] as number));
      const value = f(x);
      if (value < sum.least) {
        sum.least = value;
        sum.leastAt = x;
      }
      sum.most = Math.max(sum.most, value);
      sum.distance += (half * (rule.weights[i] as number) * x) / value;
      sum.time += (half * (rule.weights[i] as number)) / value;
    }
  };
}

describe('addSettled', () => {
  it.each([1e-2, 1e-5, 1e-7])('integrates 1/(1 + %f - x) to 1e-9 of the logarithm', (rest) => {
    const sum = newPathIntegral();
    expect(
      addSettled(
        pieceOf((x) => 1 + rest - x),
        0,
        1,
        sum,
      ),
    ).toBe(true);
    const time = Math.log((1 + rest) / rest);
    expect(sum.time / time).toBeCloseTo(1, 9);
    expect(sum.distance / ((1 + rest) * time - 1)).toBeCloseTo(1, 9);
    expect(sum.most).toBeGreaterThan(0.97);
  });

  it('does not settle on a pole, nor on a sign change', () => {
    expect(
      addSettled(
        pieceOf((x) => 1 - x),
        0,
        1,
        newPathIntegral(),
      ),
    ).toBe(false);
    const sum = newPathIntegral();
    expect(
      addSettled(
        pieceOf((x) => 0.5 - x),
        0,
        1,
        sum,
      ),
    ).toBe(false);
    expect(sum.least).toBeLessThan(0);
  });

  it('gives up after a bounded effort where rounding or noise never lets the halves agree', () => {
    let calls = 0;
    const noisy: AddPiece = (from, to, sum) => {
      calls++;
      sum.least = Math.min(sum.least, 1);
      sum.distance += (to - from) * (1 + 1e-3 * Math.sin(1e6 * calls));
      sum.time += to - from;
    };
    expect(addSettled(noisy, 0, 1, newPathIntegral())).toBe(false);
    expect(calls).toBeLessThan(1500);
  });
});
