import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type LeastSquaresParameter, leastSquares, type Residuals } from '../../src/numerics/least-squares.ts';
import { completed } from '../../src/numerics/work.ts';
import { type NistProblem, nistStrd } from '../published/nist-strd.ts';

const unbounded = { low: -1e12, high: 1e12 };
const solve = (residuals: Residuals, count: number, parameters: readonly LeastSquaresParameter[]) =>
  completed(leastSquares(residuals, count, parameters));
const solution = (residuals: Residuals, count: number, parameters: readonly LeastSquaresParameter[]) => {
  const found = solve(residuals, count, parameters);
  if (found.outcome !== 'solution') throw new Error(found.outcome);
  return found;
};

/** y = a + b x at x = 0, 1, 2, 3 with y = 1, 3, 2, 5: a = 1.1, b = 1.1 by hand. */
const line: Residuals = ([a = 0, b = 0], out) => {
  [1, 3, 2, 5].forEach((y, x) => {
    out[x] = a + b * x - y;
  });
  return true;
};
const plain = { ...unbounded, start: 0, scale: 1 };

describe('leastSquares', () => {
  for (const problem of nistStrd.problems as readonly NistProblem[]) {
    for (const start of problem.starts) {
      it(`gives ${problem.name} from ${start}: parameters to 1e-7, their sd to 1e-6 [${nistStrd.source}]`, () => {
        const { x, y, certified, model } = problem;
        const residuals: Residuals = (b, out) => {
          x.forEach((at, i) => {
            out[i] = model(at, b) - (y[i] as number);
          });
          return out.every(Number.isFinite);
        };
        const found = solution(
          residuals,
          x.length,
          start.map((value) => ({ ...unbounded, start: value, scale: Math.abs(value) })),
        );
        const variance = found.sumOfSquares / (x.length - start.length);
        expect(Math.abs(found.sumOfSquares / problem.residualSumOfSquares - 1)).toBeLessThan(1e-9);
        certified.forEach(({ value, sd }, j) => {
          expect(Math.abs((found.parameters[j] as number) / value - 1)).toBeLessThan(1e-7);
          const ours = Math.sqrt(variance * (found.covariance[j * start.length + j] as number));
          expect(Math.abs(ours / sd - 1)).toBeLessThan(1e-6);
        });
      });
    }
  }

  it('gives a straight line by hand: 1.1, 1.1; covariance (0.7, -0.3, 0.2)', () => {
    const found = solution(line, 4, [plain, plain]);
    expect([...found.parameters].map((value) => Number(value.toFixed(9)))).toEqual([1.1, 1.1]);
    // J'J = [4 6; 6 14], its inverse [14 -6; -6 4]/20
    expect([...found.covariance].map((value) => Number(value.toFixed(9)))).toEqual([0.7, -0.3, -0.3, 0.2]);
  });

  it('weighs a prior as a residual: the mean of 4 values of variance 1 and a prior of 10 with sd 0.5, by hand 6', () => {
    // (1 + 3 + 2 + 2 + 10/0.25)/(4 + 1/0.25) = 48/8
    const found = solution(
      ([a = 0], out) => {
        [1, 3, 2, 2].forEach((y, i) => {
          out[i] = a - y;
        });
        return true;
      },
      4,
      [{ ...plain, prior: { mean: 10, sd: 0.5 } }],
    );
    expect(found.parameters[0]).toBeCloseTo(6, 8);
    expect(found.covariance[0]).toBeCloseTo(1 / 8, 8);
  });

  it('keeps a parameter on its bound, says so, and gives the others their best: b 0.5 leaves a 2', () => {
    const found = solution(line, 4, [plain, { ...plain, high: 0.5 }]);
    expect(found.atBound).toEqual([undefined, 'high']);
    expect(found.parameters[1]).toBe(0.5);
    expect(found.parameters[0]).toBeCloseTo(2.75 - 0.75, 9);
    expect([...found.covariance].map((value) => Number(value.toFixed(9)))).toEqual([0.25, 0, 0, 0]);
  });

  it('finds the least in any box: no point of the box is better', () => {
    const bounds = fc.tuple(fc.double({ min: -2, max: 2, noNaN: true }), fc.double({ min: 0.1, max: 3, noNaN: true }));
    fc.assert(
      fc.property(bounds, bounds, ([lowA, widthA], [lowB, widthB]) => {
        const box = [
          { low: lowA, high: lowA + widthA },
          { low: lowB, high: lowB + widthB },
        ];
        const found = solution(
          line,
          4,
          box.map(({ low, high }) => ({ start: (low + high) / 2, low, high, scale: 1 })),
        );
        const out = new Float64Array(4);
        for (let i = 0; i <= 20; i++) {
          for (let k = 0; k <= 20; k++) {
            line(Float64Array.of(lowA + (widthA * i) / 20, lowB + (widthB * k) / 20), out);
            expect(out.reduce((sum, value) => sum + value * value, 0)).toBeGreaterThan(found.sumOfSquares - 1e-9);
          }
        }
      }),
      { numRuns: 40 },
    );
  });

  it('walks round a region without residuals, and says where it cannot start', () => {
    const logarithm: Residuals = ([a = 0], out) => {
      if (a <= 0) return false;
      out[0] = Math.log(a) + 5;
      return true;
    };
    const parameter = { start: 20, low: -100, high: 100, scale: 1 };
    expect(solution(logarithm, 1, [parameter]).parameters[0]).toBeCloseTo(Math.exp(-5), 10);
    expect(solve(logarithm, 1, [{ ...parameter, start: -1 }]).outcome).toBe('no-residuals');
  });

  it('says what does not tell parameters apart', () => {
    const product: Residuals = ([a = 0, b = 0], out) => {
      out[0] = a + b - 3;
      return true;
    };
    expect(solve(product, 1, [plain, plain]).outcome).toBe('undetermined');
    const idle: Residuals = ([a = 0], out) => {
      out[0] = a - 3;
      return true;
    };
    expect(solve(idle, 1, [plain, plain]).outcome).toBe('undetermined');
  });

  it('yields once an iteration', () => {
    const work = leastSquares(line, 4, [plain, plain]);
    expect(work.next()).toEqual({ done: false, value: undefined });
  });
});
