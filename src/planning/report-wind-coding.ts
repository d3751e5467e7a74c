import type { WindComponents } from './answer.ts';
import type { ReportRead } from './question.ts';

/**
 * Standard deviation of the wind along the runway [m/s] from what a report rounds: ten degrees and whole knots, each value as
 * likely as another within its step.
 *
 * With h = V cos a and c = V sin a, dh = c da and dh = (h/V) dV; a step from -d to d has the standard deviation d/sqrt(3).
 *
 * @returns 0 where the wind is not of a report
 * @see references.Wmo306, reg. 15.5, for the steps
 */
export function reportWindCoding(
  report: ReportRead | undefined,
  { headwind, crosswind = 0 }: Pick<WindComponents, 'headwind' | 'crosswind'>,
): number {
  const { direction = 0, speed = 0 } = report?.rounding ?? {};
  const total = Math.hypot(headwind, crosswind);
  if (total === 0) return 0;
  return Math.hypot(crosswind * direction, (headwind / total) * speed) / Math.sqrt(3);
}
