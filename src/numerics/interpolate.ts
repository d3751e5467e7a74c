/**
 * Piecewise-linear interpolation of rows on a rising axis; never beyond the rows.
 *
 * y = y_i + (x - x_i) (y_i+1 - y_i) / (x_i+1 - x_i) for x_i <= x <= x_i+1; a row itself is met exactly.
 *
 * @param axis - strictly rising, at least one row
 * @param values - one for each row of the axis
 * @param x - in the axis's unit
 * @returns the value in the values' unit, or 'outside' where x is beyond the first or last row
 */
export function interpolate(axis: readonly number[], values: readonly number[], x: number): number | 'outside' {
  requireRows(axis, values, x);
  const last = axis.length - 1;
  if (x < (axis[0] as number) || x > (axis[last] as number)) return 'outside';
  return between(axis, values, x);
}

/**
 * The same with the first and last values held beyond the rows: only where the source of the rows allows it.
 *
 * @param axis - strictly rising, at least one row
 * @param values - one for each row of the axis
 * @param x - in the axis's unit
 * @returns the value in the values' unit
 */
export function interpolateHeld(axis: readonly number[], values: readonly number[], x: number): number {
  requireRows(axis, values, x);
  const last = axis.length - 1;
  if (x <= (axis[0] as number)) return values[0] as number;
  if (x >= (axis[last] as number)) return values[last] as number;
  return between(axis, values, x);
}

function between(axis: readonly number[], values: readonly number[], x: number): number {
  let below = 0;
  let above = axis.length - 1;
  while (above - below > 1) {
    const middle = (below + above) >> 1;
    if ((axis[middle] as number) <= x) below = middle;
    else above = middle;
  }
  const x0 = axis[below] as number;
  const y0 = values[below] as number;
  if (x === x0) return y0;
  const x1 = axis[above] as number;
  const y1 = values[above] as number;
  if (x === x1) return y1;
  const share = (x - x0) / (x1 - x0);
  return y0 * (1 - share) + y1 * share;
}

function requireRows(axis: readonly number[], values: readonly number[], x: number): void {
  if (axis.length === 0 || axis.length !== values.length) {
    throw new RangeError(
      `axis and values must have the same number of rows, at least one: ${axis.length}, ${values.length}`,
    );
  }
  if (Number.isNaN(x)) throw new RangeError('x must be a number');
}
