import type { Factor } from '../../answer.ts';
import type { Fault } from '../../fault.ts';
import type { OperatorFactor, OperatorRules } from '../../question.ts';
import { numberText } from '../../sentences/measure-text.ts';
import { requirements } from '../requirements.ts';
import type { Asked, PhaseRules, Requirement, RuleSet, SurfaceRule } from '../rule-set.ts';

type Phase = 'takeoff' | 'landing';
type OverallFactor = Extract<OperatorFactor, { check: string }>;
type SurfaceFactor = Extract<OperatorFactor, { surfaceFactor: number }>;

/** A rule set under the name of an operator whose factors stand in for some of it. */
export function operatorRuleSet(base: RuleSet, { name }: OperatorRules): RuleSet {
  return {
    ...base,
    id: 'operator',
    title: `${name}, an operator's own, based on: ${base.title}`,
    phrase: `under the factors of ${name}`,
  };
}

/**
 * Rules with an operator's factors in place of their own: overall factors by the code of the check, surface factors by kind and
 * state of firm ground without contaminant.
 *
 * @param rules - of one phase and stage, whose own factors are nowhere larger where they are asked for: see operatorFaults
 */
export function operatorRules(rules: PhaseRules, phase: Phase, { name, factors }: OperatorRules): PhaseRules {
  const overall = new Map(factors.filter(isOverall).map(({ check, overallFactor }) => [check, overallFactor]));
  const own = (code: string, value: number): Factor => ({
    code,
    value,
    because: `own factor of ${name}`,
    source: 'OperatorsOwn',
    status: 'judgement',
  });
  return {
    ...rules,
    surfaces: [
      ...factors
        .filter(isOfSurface)
        .filter((one) => one.phase === phase)
        .map((one) => ownSurface(one, own)),
      ...rules.surfaces,
    ],
    readings: rules.readings.map(({ requirements: asks, ...rest }) => ({
      ...rest,
      requirements: asks.map((requirement) => {
        const value = overall.get(requirement.code);
        return value === undefined ? requirement : stricter(requirement, own('overall', value));
      }),
    })),
  };
}

/** Every factor of the operator that is below what the rules themselves ask in this case, by name. */
export function operatorFaults(rules: PhaseRules, phase: Phase, asked: Asked, { factors }: OperatorRules): Fault[] {
  return factors.flatMap((one, index) => {
    const found = isOverall(one) ? leastOverall(rules, asked, one) : leastOnSurface(rules, phase, asked, one);
    if (found === undefined) return [];
    const given = isOverall(one) ? one.overallFactor : one.surfaceFactor;
    if (given >= found.value - 1e-9) return [];
    return [
      {
        pointer: `/ruleSet/factors/${index}/${isOverall(one) ? 'overallFactor' : 'surfaceFactor'}`,
        code: 'out-of-range' as const,
        message: `The operator's factor ${numberText(given)} is below ${numberText(rounded(found.value))} of the rules it is based on: ${found.because}.`,
        received: given,
        allowed: `${numberText(roundedUp(found.value))} or more`,
      },
    ];
  });
}

function isOverall(factor: OperatorFactor): factor is OverallFactor {
  return 'check' in factor;
}
function isOfSurface(factor: OperatorFactor): factor is SurfaceFactor {
  return 'surfaceFactor' in factor;
}

/** A requirement with the operator's overall factor wherever the rule's own is smaller. */
function stricter(requirement: Requirement, own: Factor): Requirement {
  const { factor, onRunway, alternatives } = requirement;
  const larger = (one: Factor) => (one.value > own.value ? one : own);
  return {
    ...requirement,
    factor: factor === undefined ? own : larger(factor),
    ...(onRunway === undefined ? {} : { onRunway: larger(onRunway) }),
    ...(alternatives === undefined
      ? {}
      : { alternatives: alternatives.filter((one) => one.factor.code !== 'overall' || one.factor.value > own.value) }),
  };
}

function ownSurface(given: SurfaceFactor, own: (code: string, value: number) => Factor): SurfaceRule {
  return {
    when: `${given.state} ${given.kind} on firm ground`,
    holds: ({ surface }) => isOf(surface, given),
    factors: [own('surface', given.surfaceFactor)],
  };
}

function isOf({ kind, state, firmness, contaminant }: Asked['surface'], given: SurfaceFactor): boolean {
  return kind === given.kind && state === given.state && firmness !== 'soft' && contaminant === undefined;
}

interface Least {
  readonly value: number;
  readonly because: string;
}

/** The smaller of the rule's overall factors on the reference and on the runway as it is: below it nothing would be stricter. */
function leastOverall(rules: PhaseRules, asked: Asked, { check }: OverallFactor): Least | undefined {
  const requirement = requirements(rules, asked).find(({ code }) => code === check);
  if (requirement === undefined) return undefined;
  const { factor, onRunway = factor } = requirement;
  const least = factor === undefined || onRunway === undefined || factor.value <= onRunway.value ? factor : onRunway;
  return least ?? { value: 1, because: 'the distance itself' };
}

function leastOnSurface(rules: PhaseRules, phase: Phase, asked: Asked, given: SurfaceFactor): Least | undefined {
  if (given.phase !== phase || !isOf(asked.surface, given)) return undefined;
  const found = rules.surfaces.find(({ holds }) => holds(asked));
  if (found === undefined) return undefined;
  return {
    value: found.factors.reduce((product, { value }) => product * value, 1),
    because: found.factors.map(({ because }) => because).join(', ') || found.when,
  };
}

function rounded(value: number): number {
  return Math.round(value * 10_000) / 10_000;
}
function roundedUp(value: number): number {
  return Math.ceil(value * 10_000 - 1e-6) / 10_000;
}
