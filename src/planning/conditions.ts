import type { Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { airAtRunway, chosenConfiguration, chosenRuleSet, isFault } from './chosen.ts';
import { type Fault, isRefused, type Refused } from './fault.ts';
import { atManualSpeeds } from './manual/at-manual-speeds.ts';
import { type ChosenMethod, chosenMethod } from './method.ts';
import type { LandingQuestion, TakeoffQuestion } from './question.ts';
import { type Ruled, ruledBy } from './ruled.ts';
import { type RunwayCondition, runwayCondition } from './runway-condition.ts';
import { type WindAlong, windAlong } from './wind-along.ts';
import { windCredit } from './wind-credit.ts';

/** What a takeoff and a landing begin with. */
export interface Conditions extends Ruled {
  readonly configuration: Configuration;
  readonly chosen: ChosenMethod;
  readonly air: Air;
  readonly wind: WindAlong;
  /** what lies on the runway */
  readonly condition: RunwayCondition;
  /** [m/s] */
  readonly creditedHeadwind: number;
}

/** Rule set, configuration, air and wind of a question, or every fault in them. */
export function conditionsOf(
  question: TakeoffQuestion | LandingQuestion,
  phase: 'takeoff' | 'landing',
): Conditions | Refused {
  const ruleSet = chosenRuleSet(question.ruleSet);
  const stated = chosenConfiguration(question, phase);
  const configuration = isFault(stated) ? stated : atManualSpeeds(stated, question);
  const chosen = isFault(configuration) ? undefined : chosenMethod(question, phase);
  const air = airAtRunway(question);
  const wind = windAlong(question.runway, question.weather.wind);
  if (
    isFault(ruleSet) ||
    isFault(configuration) ||
    isFault(air) ||
    isFault(wind) ||
    chosen === undefined ||
    isFault(chosen)
  ) {
    return {
      refused: [ruleSet, configuration, air, wind, chosen].filter(
        (one) => one !== undefined && isFault(one),
      ) as Fault[],
    };
  }
  const condition = runwayCondition(question);
  const ruled = ruledBy(ruleSet, question, phase, condition);
  if (isRefused(ruled)) return ruled;
  // member by member: spreading an object of this size costs more than an evaluation
  return {
    ruleSet: ruled.ruleSet,
    basedOn: ruled.basedOn,
    rules: ruled.rules,
    asked: ruled.asked,
    doesNotApply: ruled.doesNotApply,
    declared: ruled.declared,
    runwayFactors: ruled.runwayFactors,
    rulesAssumed: ruled.rulesAssumed,
    configuration,
    chosen,
    air,
    wind,
    condition,
    creditedHeadwind: windCredit(wind.headwind, ruled.rules.windCredit),
  };
}

/** What the rule set makes of the runs behind an answer; nothing where it does not apply. */
export function ruledRuns({ creditedHeadwind, wind, doesNotApply, runwayFactors, rules }: Conditions): {
  readonly creditedHeadwind: number;
  readonly needsReference: boolean;
  readonly slopeEarnsNothing: boolean;
} {
  return {
    creditedHeadwind: doesNotApply === undefined ? creditedHeadwind : wind.headwind,
    needsReference: runwayFactors !== undefined,
    slopeEarnsNothing: doesNotApply === undefined && rules.slope !== undefined,
  };
}
