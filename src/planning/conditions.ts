import type { Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { filmAsWet } from '../physics/runway-surface.ts';
import { airAtRunway, chosenConfiguration, chosenRuleSet, isFault } from './chosen.ts';
import type { Refused } from './fault.ts';
import type { Question } from './question.ts';
import type { PhaseRules, RuleSet } from './rules/rule-set.ts';
import { type RunwayCondition, runwayCondition } from './runway-condition.ts';
import { type WindAlong, windAlong } from './wind-along.ts';
import { windCredit } from './wind-credit.ts';

/** What a takeoff and a landing begin with. */
export interface Conditions {
  readonly ruleSet: RuleSet;
  readonly configuration: Configuration;
  readonly air: Air;
  readonly wind: WindAlong;
  /** what lies on the runway */
  readonly condition: RunwayCondition;
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** why the rule set does not speak of the aeroplane; undefined where it does */
  readonly doesNotApply: string | undefined;
}

/** Rule set, configuration, air and wind of a question, or every fault in them. */
export function conditionsOf(question: Question, phase: 'takeoff' | 'landing'): Conditions | Refused {
  const ruleSet = chosenRuleSet(question.ruleSet);
  const configuration = chosenConfiguration(question, phase);
  const air = airAtRunway(question);
  const wind = windAlong(question.runway, question.weather.wind);
  if (isFault(ruleSet) || isFault(configuration) || isFault(air) || isFault(wind)) {
    return { refused: [ruleSet, configuration, air, wind].filter(isFault) };
  }
  return {
    ruleSet,
    configuration,
    air,
    wind,
    condition: runwayCondition(question),
    creditedHeadwind: windCredit(wind.headwind, ruleSet.windCredit),
    doesNotApply: ruleSet.doesNotApply(question.aeroplane),
  };
}

/** What the rule set makes of the runs behind an answer; nothing where it does not apply. */
export function ruledRuns(
  { creditedHeadwind, wind, condition, doesNotApply }: Conditions,
  { startsFrom, runwayFactors }: PhaseRules,
  { surface, slope }: Question['runway'],
): { readonly creditedHeadwind: number; readonly needsReference: boolean } {
  if (doesNotApply !== undefined) return { creditedHeadwind: wind.headwind, needsReference: false };
  const isAnswered = condition.refusal === undefined && startsFrom === 'reference';
  return {
    creditedHeadwind,
    needsReference: isAnswered && runwayFactors(filmAsWet(surface), slope) !== undefined,
  };
}
