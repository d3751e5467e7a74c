import type { ReferenceKey } from '../../references.ts';
import type { WindCredit } from './rule-set.ts';

/**
 * Not more than half of a headwind, not less than one and a half times a tailwind.
 *
 * @param source - the rule that says so
 * @param paragraph - of it: ', (c)(6)'
 */
export function halfAndOneAndAHalf(source: ReferenceKey, paragraph = ''): WindCredit {
  const because = `not more than 50 % of a headwind, not less than 150 % of a tailwind${paragraph}`;
  return { headwind: 0.5, tailwind: 1.5, because, source };
}

/** The wind as it is. */
export const windAsGiven: WindCredit = {
  headwind: 1,
  tailwind: 1,
  because: 'the wind is taken as given',
  source: 'Judgement',
};
