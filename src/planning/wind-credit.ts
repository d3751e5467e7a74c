import type { WindCredit } from './rules/rule-set.ts';

/**
 * The wind along the runway that a rule set lets be taken into account.
 *
 * @param headwind - component as given [m/s], on the nose positive
 * @param credit - share of a headwind and multiple of a tailwind
 * @returns [m/s], on the nose positive
 * @see references.EuAirOps305, (c)(6)
 */
export function windCredit(headwind: number, credit: WindCredit): number {
  return headwind > 0 ? headwind * credit.headwind : headwind * credit.tailwind;
}
