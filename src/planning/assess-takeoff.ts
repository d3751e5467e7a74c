import type { Check } from './answer.ts';
import type { DeclaredDistances } from './declared-distances.ts';
import { checkOf } from './margins.ts';
import type { Runway } from './question.ts';
import type { TakeoffRules } from './rules/rule-set.ts';
import { reached, type TakeoffRuns } from './takeoff-runs.ts';

/**
 * Every check of a rule set, in its order.
 *
 * @param runs - each of them reached the screen, or is absent; reference or credited exists
 * @param declared - of the runway
 */
export function assessTakeoff(
  rules: TakeoffRules,
  { credited, reference }: TakeoffRuns,
  { surface, slope }: Pick<Runway, 'surface' | 'slope'>,
  declared: DeclaredDistances,
): readonly Check[] {
  const factors = rules.runwayFactors(surface, slope);
  return rules.requirements(declared).map((requirement) => {
    const from = {
      reference: reached(reference)?.[requirement.of],
      credited: reached(credited)?.[requirement.of],
    };
    return checkOf(requirement, from, factors, declared);
  });
}
