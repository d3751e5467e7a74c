import type { Applicability, PhaseRules, RuledAeroplane, RuleSet } from './rule-set.ts';

/** Everything that a set and one side of it ask of an aeroplane. */
export function applicability(ruleSet: RuleSet, rules: PhaseRules): readonly Applicability[] {
  return [...ruleSet.appliesTo, ...(rules.appliesTo ?? [])];
}

/** Why the rules do not speak of the aeroplane: the first condition that is not met; undefined where they do. */
export function doesNotApply(ruleSet: RuleSet, rules: PhaseRules, aeroplane: RuledAeroplane): string | undefined {
  return applicability(ruleSet, rules).find(({ holds }) => !holds(aeroplane))?.because;
}
