import { euClassB } from './operating/eu-class-b.ts';
import { unfactored } from './operating/unfactored.ts';
import type { RuleSet } from './rule-set.ts';

/** Every set of operating rules that can be asked for, in the order in which it is listed to users. */
export const ruleSets: readonly RuleSet[] = [unfactored, euClassB];

/** The rule set with this id, or undefined where there is none. */
export function ruleSetOf(id: string): RuleSet | undefined {
  return ruleSets.find((set) => set.id === id);
}
