import type { LeastSquaresParameter, Residuals } from './least-squares.ts';

/** Step of a central difference over the parameter: the cube root of the rounding. */
const differenceStep = Math.cbrt(Number.EPSILON);

/**
 * Derivatives of residuals by central differences, one-sided at a bound or where one side has no residuals.
 *
 * @param residuals - as in a fit
 * @param parameters - bounds, and the scale to which a step is in proportion
 * @param x - where
 * @param r - residuals there
 * @param jacobian - receives them, one row a parameter
 * @returns false where neither side of a parameter has residuals
 * @see references.More1978
 */
export function differenceJacobian(
  residuals: Residuals,
  parameters: readonly Omit<LeastSquaresParameter, 'start' | 'prior'>[],
  x: Float64Array,
  r: Float64Array,
  jacobian: Float64Array,
): boolean {
  const count = r.length;
  const above = new Float64Array(count);
  const below = new Float64Array(count);
  const at = Float64Array.from(x);
  for (let j = 0; j < parameters.length; j++) {
    const { low, high, scale } = parameters[j] as LeastSquaresParameter;
    const here = x[j] as number;
    const step = differenceStep * Math.max(scale, Math.abs(here));
    let up = Math.min(high, here + step);
    let down = Math.max(low, here - step);
    at[j] = up;
    if (up === here || !residuals(at, above)) {
      up = here;
      above.set(r);
    }
    at[j] = down;
    if (down === here || !residuals(at, below)) {
      down = here;
      below.set(r);
    }
    at[j] = here;
    if (!(up > down)) return false;
    for (let i = 0; i < count; i++) {
      jacobian[j * count + i] = ((above[i] as number) - (below[i] as number)) / (up - down);
    }
  }
  return true;
}
