/**
 * The ends of the smooth pieces of an interval, in rising order.
 *
 * @param from - lower end
 * @param to - upper end, above from
 * @param jumps - where the integrand or its slope may jump, in any order; those outside or at an end do not count
 * @returns from, the jumps inside, to
 */
export function splitPoints(from: number, to: number, jumps: readonly number[]): number[] {
  const points = [from];
  for (let i = 0; i < jumps.length; i++) {
    const point = jumps[i] as number;
    if (!(point > from && point < to)) continue;
    let place = points.length;
    points.push(point);
    // insertion: the lists are short and mostly in order
    while (place > 1 && (points[place - 1] as number) > point) {
      points[place] = points[place - 1] as number;
      place--;
    }
    points[place] = point;
  }
  points.push(to);
  return points;
}
