import type { ClimbDemand, PhaseRules, Requirement, RuleSet, TakeoffRules } from '../planning/rules/rule-set.ts';
import { references } from '../references.ts';
import type { RuleSetList } from './rule-set-list.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import { toFactor } from './to-assessment.ts';

type Listed = RuleSetList['ruleSets'][number];

/** Lists show figures as they are. */
const exact: Presentation = { units: 'm-kt-kg', rounding: 'none' };

/** Every rule set as data, and the form of an operator's own. */
export function toRuleSetList(ruleSets: readonly RuleSet[]): RuleSetList {
  return {
    ruleSets: ruleSets.map(toListed),
    operator: {
      id: 'operator',
      form: '{"basedOn": id, "name": text, "factors": [{"check", "overallFactor"} | {"phase", "kind", "state", "surfaceFactor"}]}; a factor below the one of the rule set it is based on is refused',
    },
  };
}

function toListed(ruleSet: RuleSet): Listed {
  const { id, title, source, operations, appliesTo, thinMargin, takeoff, landing, landingInFlight } = ruleSet;
  return {
    id,
    title,
    source,
    sourceTitle: references[source].title,
    operations: [...operations],
    appliesTo: appliesTo.map(({ because }) => because),
    thinMargin: { percent: thinMargin.ratio * 100, because: thinMargin.because, source: thinMargin.source },
    takeoff: toTakeoff(takeoff),
    landing: toPhase(landing),
    ...(landingInFlight === undefined ? {} : { landingInFlight: toPhase(landingInFlight) }),
  };
}

function toTakeoff(rules: TakeoffRules): Listed['takeoff'] {
  return { ...toPhase(rules), clearwayRatio: rules.clearwayShare, nothingBeyond: rules.nothingBeyond };
}

function toPhase(rules: PhaseRules): Listed['landing'] {
  const { source, stage, appliesTo = [], windCredit, surfaces, slope, readings, demands = [], notApplied = [] } = rules;
  return {
    source,
    ...(stage === undefined ? {} : { stage }),
    appliesTo: appliesTo.map(({ because }) => because),
    wind: windCredit,
    surfaces: surfaces.map(({ when, factors }) => ({
      when,
      multiplies: 'reference' as const,
      factors: factors.map((factor) => toFactor(exact, factor)),
    })),
    ...(slope === undefined
      ? {}
      : {
          slope: {
            unfavourable: slope.unfavourable,
            step: shownQuantity(exact, 'gradient', slope.step),
            factor: toFactor(exact, slope.factor),
            growth: slope.growth,
            multiplies: 'reference' as const,
          },
        }),
    cases: readings.map(({ when, requirements }) => ({ when, checks: requirements.map(toCheck) })),
    demands: demands.map(toDemand),
    notApplied: notApplied.map(({ factor, why }) => ({ factor: toFactor(exact, factor), why })),
  };
}

function toCheck(requirement: Requirement): Listed['landing']['cases'][number]['checks'][number] {
  const { code, of, against, factor, onRunway, alternatives, runwayDecides, notAssessed, source } = requirement;
  return {
    code,
    of,
    against,
    ...(factor === undefined ? {} : { factor: toFactor(exact, factor) }),
    ...(onRunway === undefined ? {} : { onRunway: toFactor(exact, onRunway) }),
    ...(alternatives === undefined
      ? {}
      : { alternatives: alternatives.map((one) => ({ factor: toFactor(exact, one.factor), because: one.because })) }),
    decides: runwayDecides === undefined ? 'longer' : 'runway',
    ...(notAssessed === undefined ? {} : { notAssessed }),
    source,
  };
}

function toDemand(demand: ClimbDemand): Listed['landing']['demands'][number] {
  const { code, of, engines, gradient, positive, atHeight, configuration, when, source, status } = demand;
  return {
    code,
    of,
    engines,
    gradient: shownQuantity(exact, 'gradient', gradient),
    ...(positive === true ? { positive } : {}),
    ...(atHeight === undefined ? {} : { atHeight: shownQuantity(exact, 'altitude', atHeight) }),
    configuration,
    when,
    source,
    status,
  };
}
