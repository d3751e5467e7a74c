import type { Answer } from './answer.ts';

/** What a choice is ranked by. */
export type Ranked = Pick<Answer, 'outcome' | 'assessment'>;

/**
 * The order in which choices are worth looking at, best first, as indices.
 *
 * Enough ones come first, by the largest least margin as per cent of what is required; then those that are not enough, by the
 * least shortfall of runway (a climb or a clearance is no length and does not rank); one whose checks are not all assessed stands before those that fail and after those that pass; last
 * those without distances. Ties keep the order in which they were asked.
 */
export function rankChoices(answers: readonly Ranked[]): number[] {
  const keys = answers.map(keyOf);
  return answers.map((_, index) => index).sort((a, b) => compare(keys[a] as Key, keys[b] as Key) || a - b);
}

type Key = readonly [group: number, merit: number];

function compare([groupA, meritA]: Key, [groupB, meritB]: Key): number {
  return groupA - groupB || meritB - meritA;
}

function keyOf({ outcome, assessment }: Ranked): Key {
  const checks = (assessment?.checks ?? []).filter(({ result }) => result !== 'not-assessed');
  if (outcome === 'enough' || outcome === 'enough-but-thin') {
    return [0, least(checks.map(({ marginRatio }) => marginRatio))];
  }
  if (checks.length === 0) return [3, 0];
  if (outcome === 'nothing-to-compare') return [1, least(checks.map(({ marginRatio }) => marginRatio))];
  return [2, least(checks.filter(({ unit }) => unit === 'distance').map(({ margin }) => margin))];
}

function least(numbers: readonly (number | undefined)[]): number {
  return numbers.reduce<number>((low, number) => Math.min(low, number ?? low), Number.POSITIVE_INFINITY);
}
