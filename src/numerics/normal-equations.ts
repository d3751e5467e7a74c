import type { LeastSquaresParameter } from './least-squares.ts';

/**
 * J'J and J'r, the priors' rows among the residuals.
 *
 * @param jacobian - derivatives of the residuals, one row a parameter
 * @returns J'J row after row, and J'r
 * @see references.GolubVanLoan, sec. 5.3
 */
export function normalEquations(
  parameters: readonly LeastSquaresParameter[],
  x: Float64Array,
  r: Float64Array,
  jacobian: Float64Array,
): { readonly normal: Float64Array; readonly gradient: Float64Array } {
  const n = parameters.length;
  const count = r.length;
  const normal = new Float64Array(n * n);
  const gradient = new Float64Array(n);
  for (let j = 0; j < n; j++) {
    const { prior } = parameters[j] as LeastSquaresParameter;
    for (let k = 0; k <= j; k++) {
      let sum = 0;
      for (let i = 0; i < count; i++) sum += (jacobian[j * count + i] as number) * (jacobian[k * count + i] as number);
      if (j === k && prior !== undefined) sum += 1 / prior.sd ** 2;
      normal[j * n + k] = sum;
      normal[k * n + j] = sum;
    }
    let sum = prior === undefined ? 0 : ((x[j] as number) - prior.mean) / prior.sd ** 2;
    for (let i = 0; i < count; i++) sum += (jacobian[j * count + i] as number) * (r[i] as number);
    gradient[j] = sum;
  }
  return { normal, gradient };
}

/** Sum of the squares of residuals and of the priors' rows. */
export function sumOfSquares(parameters: readonly LeastSquaresParameter[], x: Float64Array, r: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < r.length; i++) sum += (r[i] as number) ** 2;
  for (let j = 0; j < parameters.length; j++) {
    const { prior } = parameters[j] as LeastSquaresParameter;
    if (prior !== undefined) sum += (((x[j] as number) - prior.mean) / prior.sd) ** 2;
  }
  return sum;
}
