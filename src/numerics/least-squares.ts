import { cholesky, choleskyInverse, choleskySolution } from './cholesky.ts';
import { differenceJacobian } from './difference-jacobian.ts';
import { normalEquations, sumOfSquares } from './normal-equations.ts';
import type { Work } from './work.ts';

/** One parameter of a fit. */
export interface LeastSquaresParameter {
  readonly start: number;
  readonly low: number;
  readonly high: number;
  /** a change that matters, above 0: finite differences are taken in proportion to it or to the parameter, the larger */
  readonly scale: number;
  /** what is known beforehand: one residual more, (x - mean)/sd */
  readonly prior?: { readonly mean: number; readonly sd: number };
}

/**
 * Writes the residuals, each over its standard deviation.
 *
 * @returns false where there are none to give at these parameters
 */
export type Residuals = (parameters: Float64Array, out: Float64Array) => boolean;

export type LeastSquares =
  | LeastSquaresSolution
  | {
      /** no residuals where the search starts, or nowhere near it */
      readonly outcome: 'no-residuals';
      readonly parameters: Float64Array;
    }
  | {
      /** the residuals do not tell the parameters apart */
      readonly outcome: 'undetermined';
      readonly parameters: Float64Array;
    }
  | { readonly outcome: 'no-convergence'; readonly parameters: Float64Array; readonly sumOfSquares: number };

export interface LeastSquaresSolution {
  readonly outcome: 'solution';
  readonly parameters: Float64Array;
  readonly residuals: Float64Array;
  /** of residuals and priors */
  readonly sumOfSquares: number;
  /** n x n, row after row: the inverse of J'J, priors included; zero in the rows and columns of parameters at a bound */
  readonly covariance: Float64Array;
  /** derivatives of the residuals, one row a parameter */
  readonly jacobian: Float64Array;
  readonly atBound: readonly ('low' | 'high' | undefined)[];
  readonly iterations: number;
}

/** Cosine where no further descent can be seen for rounding. */
const flatToRounding = 1e-5;

/** How far to search. */
export interface Search {
  /** cosine between the residuals and each column of the Jacobian below which a point is a minimum */
  readonly flatness: number;
  readonly greatestIterations: number;
}

const thorough: Search = { flatness: 1e-8, greatestIterations: 60 };

/**
 * Parameters inside bounds at which the sum of squares of residuals is least, by damped Gauss-Newton steps.
 *
 * (J'J + lambda diag(J'J)) step = -J'r; a parameter at a bound towards which the sum falls is held there; lambda falls where a
 * step keeps what it promised and rises where it does not.
 *
 * @param residuals - r, each over its standard deviation
 * @param count - how many, at least one
 * @param parameters - start inside the bounds
 * @param search - how far; absent: to the minimum
 * @returns work that yields once an iteration, and then the solution or the name of why there is none
 * @remarks A local minimum: one start. Covariance holds for residuals of unit variance near a linear problem.
 * @see references.Marquardt1963; references.More1978
 */
export function* leastSquares(
  residuals: Residuals,
  count: number,
  parameters: readonly LeastSquaresParameter[],
  { flatness, greatestIterations } = thorough,
): Work<LeastSquares> {
  const n = parameters.length;
  let x: Float64Array = Float64Array.from(parameters, ({ start, low, high }) => Math.min(high, Math.max(low, start)));
  let r: Float64Array = new Float64Array(count);
  if (!residuals(x, r)) return { outcome: 'no-residuals', parameters: x };
  let sum = sumOfSquares(parameters, x, r);
  const jacobian = new Float64Array(n * count);
  let damping = 1e-3;
  for (let iteration = 1; iteration <= greatestIterations; iteration++) {
    if (!differenceJacobian(residuals, parameters, x, r, jacobian)) return { outcome: 'no-residuals', parameters: x };
    const { normal, gradient } = normalEquations(parameters, x, r, jacobian);
    const held = parameters.map(
      ({ low, high }, j) =>
        ((x[j] as number) <= low && (gradient[j] as number) > 0) ||
        ((x[j] as number) >= high && (gradient[j] as number) < 0),
    );
    const done = (): LeastSquares => {
      const covariance = covarianceOf(normal, held);
      if (covariance === undefined) return { outcome: 'undetermined', parameters: x };
      const atBound = parameters.map(({ low, high }, j) =>
        (x[j] as number) <= low ? 'low' : (x[j] as number) >= high ? 'high' : undefined,
      );
      return {
        outcome: 'solution',
        parameters: x,
        residuals: r,
        sumOfSquares: sum,
        covariance,
        jacobian,
        atBound,
        iterations: iteration,
      };
    };
    if (normal.some((value, i) => i % (n + 1) === 0 && !(value > 0))) return { outcome: 'undetermined', parameters: x };
    const slope = steepness(normal, gradient, held, sum);
    if (slope <= flatness) return done();
    for (;;) {
      const next = stepped(parameters, x, normal, gradient, held, damping);
      const nextResiduals = new Float64Array(count);
      if (next !== undefined && residuals(next, nextResiduals)) {
        const nextSum = sumOfSquares(parameters, next, nextResiduals);
        if (nextSum < sum) {
          const small = parameters.every(
            ({ scale }, j) =>
              Math.abs((next[j] as number) - (x[j] as number)) <= 1e-12 * Math.max(scale, Math.abs(x[j] as number)),
          );
          x = next;
          r = nextResiduals;
          sum = nextSum;
          damping = Math.max(damping / 10, 1e-15);
          if (small) damping = 1e-15;
          break;
        }
      }
      damping *= 10;
      if (damping > 1e14) {
        return slope <= Math.max(flatness, flatToRounding)
          ? done()
          : { outcome: 'no-convergence', parameters: x, sumOfSquares: sum };
      }
    }
    yield;
  }
  return { outcome: 'no-convergence', parameters: x, sumOfSquares: sum };
}

/** Greatest cosine between the residuals and a column of the Jacobian, of parameters that are not held. */
function steepness(normal: Float64Array, gradient: Float64Array, held: readonly boolean[], sum: number): number {
  const n = gradient.length;
  let greatest = 0;
  for (let j = 0; j < n; j++) {
    const length = Math.sqrt((normal[j * n + j] as number) * sum);
    if (held[j] !== true && length > 0) greatest = Math.max(greatest, Math.abs(gradient[j] as number) / length);
  }
  return greatest;
}

/** One damped step inside the bounds: parameters that would leave are put on their bound, and the others step again. */
function stepped(
  parameters: readonly LeastSquaresParameter[],
  x: Float64Array,
  normal: Float64Array,
  gradient: Float64Array,
  held: readonly boolean[],
  damping: number,
): Float64Array | undefined {
  const n = parameters.length;
  const step = new Float64Array(n);
  const next = Float64Array.from(x);
  const fixed = [...held];
  for (let round = 0; round <= n; round++) {
    const free = indices(fixed);
    if (free.length === 0) break;
    const matrix = part(normal, n, free);
    const right = Float64Array.from(free, (j) => {
      let sum = -(gradient[j] as number);
      for (let k = 0; k < n; k++) if (fixed[k] === true) sum -= (normal[j * n + k] as number) * (step[k] as number);
      return sum;
    });
    for (let i = 0; i < free.length; i++) {
      const at = i * free.length + i;
      matrix[at] = (matrix[at] as number) * (1 + damping);
    }
    const lower = cholesky(matrix, free.length);
    if (lower === undefined) return undefined;
    const solution = choleskySolution(lower, free.length, right);
    let left = false;
    free.forEach((j, i) => {
      const { low, high } = parameters[j] as LeastSquaresParameter;
      const wanted = (x[j] as number) + (solution[i] as number);
      next[j] = Math.min(high, Math.max(low, wanted));
      if (wanted >= low && wanted <= high) return;
      step[j] = (next[j] as number) - (x[j] as number);
      fixed[j] = true;
      left = true;
    });
    if (!left) break;
  }
  return next;
}

function covarianceOf(normal: Float64Array, held: readonly boolean[]): Float64Array | undefined {
  const n = held.length;
  const free = indices(held);
  const covariance = new Float64Array(n * n);
  if (free.length === 0) return covariance;
  const lower = cholesky(part(normal, n, free), free.length);
  if (lower === undefined) return undefined;
  const inverse = choleskyInverse(lower, free.length);
  free.forEach((j, row) => {
    free.forEach((k, column) => {
      covariance[j * n + k] = inverse[row * free.length + column] as number;
    });
  });
  return covariance;
}

function indices(fixed: readonly boolean[]): number[] {
  return fixed.flatMap((isFixed, j) => (isFixed ? [] : [j]));
}

function part(matrix: Float64Array, n: number, chosen: readonly number[]): Float64Array {
  return Float64Array.from(chosen.flatMap((j) => chosen.map((k) => matrix[j * n + k] as number)));
}
