import type { RunwayConditionCode } from '../physics/runway-condition-code.ts';
import { filmAsWet } from '../physics/runway-surface.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumption, Factor } from './answer.ts';
import { type DeclaredDistances, declaredDistances } from './declared-distances.ts';
import type { Refused } from './fault.ts';
import type { LandingQuestion, TakeoffQuestion } from './question.ts';
import { applicability, doesNotApply } from './rules/applies.ts';
import { operatorFaults, operatorRuleSet, operatorRules } from './rules/operating/operator.ts';
import type { Asked, PhaseRules, RuleSet } from './rules/rule-set.ts';
import { runwayFactors } from './rules/runway-factors.ts';
import type { RunwayCondition } from './runway-condition.ts';

type AnyQuestion = TakeoffQuestion | LandingQuestion;
type Phase = 'takeoff' | 'landing';

/** What a rule set makes of a question. */
export interface Ruled {
  readonly ruleSet: RuleSet;
  /** id of the set that an operator's own rules are based on; absent where they are not the operator's */
  readonly basedOn: string | undefined;
  /** of this phase and stage */
  readonly rules: PhaseRules;
  readonly asked: Asked;
  /** why the rule set does not speak of the aeroplane; undefined where it does */
  readonly doesNotApply: string | undefined;
  readonly declared: DeclaredDistances;
  /** on the reference distance; undefined where the rules do not speak of the aeroplane or the surface, or the surface is refused */
  readonly runwayFactors: readonly Factor[] | undefined;
  /** what the rules decide by and the question does not say */
  readonly rulesAssumed: readonly Assumption[];
}

/**
 * The rules of a set for a question, at its stage; where that is not said, before departure.
 *
 * @param base - the set named, which an operator's own rules may make stricter
 * @param condition - what lies on the runway
 * @returns what they make of it, or every factor of the operator that is below the set's
 */
export function ruledBy(
  base: RuleSet,
  question: AnyQuestion,
  phase: Phase,
  condition: RunwayCondition,
): Ruled | Refused {
  const { aeroplane, runway, procedure, operatorRules: own } = question;
  const baseRules = rulesOf(base, phase, question.stage);
  const declared = declaredDistances(runway, base.takeoff.clearwayShare);
  const asked: Asked = {
    aeroplane,
    surface: filmAsWet(runway.surface),
    isSlippery: condition.isSlippery,
    conditionCode: condition.codes && (Math.min(...condition.codes) as RunwayConditionCode),
    slope: runway.slope,
    published: declared.published,
    reverse: procedure !== undefined && 'reverse' in procedure && procedure.reverse === true,
  };
  const why = doesNotApply(base, baseRules, aeroplane);
  const faults = own === undefined || why !== undefined ? [] : operatorFaults(baseRules, phase, asked, own);
  if (faults.length > 0) return { refused: faults };
  const rules = own === undefined ? baseRules : operatorRules(baseRules, phase, own);
  return {
    ruleSet: own === undefined ? base : operatorRuleSet(base, own),
    basedOn: own === undefined ? undefined : base.id,
    rules,
    asked,
    doesNotApply: why,
    declared,
    runwayFactors: why === undefined && condition.refusal === undefined ? runwayFactors(rules, asked) : undefined,
    rulesAssumed: rulesAssumed(base, baseRules, question, phase),
  };
}

function rulesOf(
  { takeoff, landing, landingInFlight }: RuleSet,
  phase: Phase,
  stage: AnyQuestion['stage'],
): PhaseRules {
  if (phase === 'takeoff') return takeoff;
  return stage === 'in-flight' && landingInFlight !== undefined ? landingInFlight : landing;
}

function rulesAssumed(
  ruleSet: RuleSet,
  rules: PhaseRules,
  { aeroplane, aeroplaneAt, stage }: AnyQuestion,
  phase: Phase,
): readonly Assumption[] {
  const assumed: Assumption[] = [];
  for (const { taken, because, source } of applicability(ruleSet, rules)) {
    const value = taken?.(aeroplane);
    if (value === undefined) continue;
    const at = aeroplanePointer(aeroplaneAt, '/passengerSeats');
    assumed.push({ at, value, because: `not stated; ${because}`, source });
  }
  if (stage === undefined && phase === 'landing' && ruleSet.landingInFlight !== undefined) {
    assumed.push({
      at: '/stage',
      value: 'dispatch',
      because: 'not stated; the rules know another figure for the time of arrival',
      source: ruleSet.landingInFlight.source,
    });
  }
  return assumed;
}
