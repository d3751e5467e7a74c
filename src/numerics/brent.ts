/** A root, or why there is none to give. */
export type BrentResult =
  | { readonly outcome: 'root'; readonly root: number; readonly evaluations: number }
  | { readonly outcome: 'not-bracketed'; readonly atLow: number; readonly atHigh: number }
  | { readonly outcome: 'no-convergence'; readonly root: number };

/**
 * A root of a continuous function inside a bracket, by Brent's method.
 *
 * Inverse quadratic or linear interpolation where it stays inside and shrinks fast enough, bisection otherwise.
 *
 * @param f - continuous on the bracket, finite
 * @param low - one end
 * @param high - the other end; f changes sign between them
 * @param tolerance - on the root, in its unit, above 0
 * @returns the root, or 'not-bracketed' with the two values
 * @see references.Brent1973, ch. 4
 */
export function brent(f: (x: number) => number, low: number, high: number, tolerance: number): BrentResult {
  if (!(tolerance > 0)) throw new RangeError(`tolerance must be above 0: ${tolerance}`);
  let a = low;
  let b = high;
  let fa = f(a);
  let fb = f(b);
  let evaluations = 2;
  if (fa === 0) return { outcome: 'root', root: a, evaluations };
  if (fb === 0) return { outcome: 'root', root: b, evaluations };
  if (!(fa < 0 !== fb < 0) || Number.isNaN(fa) || Number.isNaN(fb)) {
    return { outcome: 'not-bracketed', atLow: fa, atHigh: fb };
  }
  let c = a;
  let fc = fa;
  let step = b - a;
  let last = step;
  for (let i = 0; i < 200; i++) {
    if (fb < 0 === fc < 0) {
      c = a;
      fc = fa;
      step = b - a;
      last = step;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      a = b;
      b = c;
      c = a;
      fa = fb;
      fb = fc;
      fc = fa;
    }
    const least = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
    const half = (c - b) / 2;
    if (Math.abs(half) <= least || fb === 0) return { outcome: 'root', root: b, evaluations };
    if (Math.abs(last) >= least && Math.abs(fa) > Math.abs(fb)) {
      const s = fb / fa;
      let p: number;
      let q: number;
      if (a === c) {
        p = 2 * half * s;
        q = 1 - s;
      } else {
        const t = fa / fc;
        const r = fb / fc;
        p = s * (2 * half * t * (t - r) - (b - a) * (r - 1));
        q = (t - 1) * (r - 1) * (s - 1);
      }
      if (p > 0) q = -q;
      else p = -p;
      if (2 * p < Math.min(3 * half * q - Math.abs(least * q), Math.abs(last * q))) {
        last = step;
        step = p / q;
      } else {
        step = half;
        last = half;
      }
    } else {
      step = half;
      last = half;
    }
    a = b;
    fa = fb;
    b += Math.abs(step) > least ? step : half > 0 ? least : -least;
    fb = f(b);
    evaluations++;
  }
  return { outcome: 'no-convergence', root: b };
}
