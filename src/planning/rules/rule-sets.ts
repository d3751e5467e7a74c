import { euClassA } from './operating/eu-class-a.ts';
import { euClassB } from './operating/eu-class-b.ts';
import { euClassC } from './operating/eu-class-c.ts';
import { ukPrivateFactors } from './operating/uk-private-factors.ts';
import { unfactored } from './operating/unfactored.ts';
import { usLandingByConditionCode } from './operating/us-landing-by-condition-code.ts';
import { usPart91 } from './operating/us-part-91.ts';
import { usPart121 } from './operating/us-part-121.ts';
import { usPart135 } from './operating/us-part-135.ts';
import type { RuleSet } from './rule-set.ts';

/** Every set of operating rules that can be asked for by its id, in the order in which it is listed to users. */
export const ruleSets: readonly RuleSet[] = [
  unfactored,
  ukPrivateFactors,
  euClassA,
  euClassB,
  euClassC,
  usPart91,
  usPart121,
  usPart135,
  usLandingByConditionCode,
];

/** The rule set with this id, or undefined where there is none. */
export function ruleSetOf(id: string): RuleSet | undefined {
  return ruleSets.find((set) => set.id === id);
}
