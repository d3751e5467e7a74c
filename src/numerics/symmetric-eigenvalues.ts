/**
 * Eigenvalues of a small symmetric matrix by Jacobi's rotations, in rising order.
 *
 * @param matrix - n x n, row after row, symmetric
 * @param n - up to about 10
 * @see references.GolubVanLoan, sec. 8.5
 */
export function symmetricEigenvalues(matrix: Float64Array, n: number): number[] {
  const a = Float64Array.from(matrix);
  for (let sweep = 0; sweep < 50; sweep++) {
    let off = 0;
    let whole = 0;
    for (let i = 0; i < n; i++) {
      for (let j = 0; j < n; j++) {
        whole += (a[i * n + j] as number) ** 2;
        if (i !== j) off += (a[i * n + j] as number) ** 2;
      }
    }
    if (off <= 1e-30 * whole) break;
    for (let p = 0; p < n; p++) for (let q = p + 1; q < n; q++) rotate(a, n, p, q);
  }
  return Array.from({ length: n }, (_, i) => a[i * n + i] as number).sort((x, y) => x - y);
}

/** One rotation that takes the element (p, q) away. */
function rotate(a: Float64Array, n: number, p: number, q: number): void {
  const apq = a[p * n + q] as number;
  if (apq === 0) return;
  const theta = ((a[q * n + q] as number) - (a[p * n + p] as number)) / (2 * apq);
  const t = (theta >= 0 ? 1 : -1) / (Math.abs(theta) + Math.sqrt(theta * theta + 1));
  const c = 1 / Math.sqrt(t * t + 1);
  const s = t * c;
  for (let k = 0; k < n; k++) {
    const akp = a[k * n + p] as number;
    const akq = a[k * n + q] as number;
    a[k * n + p] = c * akp - s * akq;
    a[k * n + q] = s * akp + c * akq;
  }
  for (let k = 0; k < n; k++) {
    const apk = a[p * n + k] as number;
    const aqk = a[q * n + k] as number;
    a[p * n + k] = c * apk - s * aqk;
    a[q * n + k] = s * apk + c * aqk;
  }
}
