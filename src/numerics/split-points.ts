/**
 * The ends of the smooth pieces of an interval, in rising order.
 *
 * @param from - lower end
 * @param to - upper end, above from
 * @param jumps - where the integrand or its slope may jump, in any order; those outside or at an end do not count
 * @param others - one more such place each
 * @returns from, the places inside, to
 */
export function splitPoints(from: number, to: number, jumps: readonly number[], ...others: number[]): number[] {
  const points = [from];
  for (const point of jumps) if (point > from && point < to) points.push(point);
  for (const point of others) if (point > from && point < to) points.push(point);
  if (points.length > 2) points.sort((a, b) => a - b);
  points.push(to);
  return points;
}
