/**
 * The lower triangle L of a symmetric positive definite matrix, A = L L'.
 *
 * @param matrix - n x n, row after row; its lower triangle is read
 * @param n - 1 or more
 * @returns L in the same layout, zero above the diagonal; undefined where A is not positive definite to rounding
 * @see references.GolubVanLoan, sec. 4.2
 */
export function cholesky(matrix: Float64Array, n: number): Float64Array | undefined {
  const lower = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j] as number;
      for (let k = 0; k < j; k++) sum -= (lower[i * n + k] as number) * (lower[j * n + k] as number);
      if (i !== j) lower[i * n + j] = sum / (lower[j * n + j] as number);
      else if (sum > smallest * (matrix[i * n + i] as number)) lower[i * n + i] = Math.sqrt(sum);
      else return undefined;
    }
  }
  return lower;
}

/** What must be left of a diagonal element: below it the columns are dependent to rounding. */
const smallest = 16 * Number.EPSILON;

/** Solution of L L' x = b. */
export function choleskySolution(lower: Float64Array, n: number, right: Float64Array): Float64Array {
  const x = Float64Array.from(right);
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < i; k++) x[i] = (x[i] as number) - (lower[i * n + k] as number) * (x[k] as number);
    x[i] = (x[i] as number) / (lower[i * n + i] as number);
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) x[i] = (x[i] as number) - (lower[k * n + i] as number) * (x[k] as number);
    x[i] = (x[i] as number) / (lower[i * n + i] as number);
  }
  return x;
}

/** Inverse of L L', row after row. */
export function choleskyInverse(lower: Float64Array, n: number): Float64Array {
  const inverse = new Float64Array(n * n);
  const unit = new Float64Array(n);
  for (let j = 0; j < n; j++) {
    unit.fill(0);
    unit[j] = 1;
    const column = choleskySolution(lower, n, unit);
    for (let i = 0; i < n; i++) inverse[i * n + j] = column[i] as number;
  }
  return inverse;
}
