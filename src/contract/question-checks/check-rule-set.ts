import type { Fault } from '../../planning/fault.ts';
import type { RuleSet } from '../../planning/rules/rule-set.ts';
import { ruleSetOf, ruleSets } from '../../planning/rules/rule-sets.ts';
import type { RuleSetChoice } from '../rule-set-choice.ts';
import { unknownId } from '../unknown-id.ts';

/** The rule set must be known, and so must every check that an operator has a factor for, each once. */
export function checkRuleSet(given: RuleSetChoice): Fault[] {
  if (typeof given === 'string') return ruleSetOf(given) === undefined ? [unknown('/ruleSet', given)] : [];
  const base = ruleSetOf(given.basedOn);
  if (base === undefined) return [unknown('/ruleSet/basedOn', given.basedOn)];
  const codes = checkCodes(base);
  const seen = new Set<string>();
  return given.factors.flatMap((factor, index) => {
    const at = `/ruleSet/factors/${index}`;
    const key = 'check' in factor ? factor.check : `${factor.phase} ${factor.kind} ${factor.state}`;
    if (seen.has(key)) {
      return [{ pointer: at, code: 'contradiction' as const, message: `There is a factor for ${key} already.` }];
    }
    seen.add(key);
    if (!('check' in factor) || codes.includes(factor.check)) return [];
    return [unknownId(`${at}/check`, `check of ${base.id} that is computed`, factor.check, codes)];
  });
}

function unknown(pointer: string, given: string): Fault {
  const fault = unknownId(
    pointer,
    'rule set',
    given,
    ruleSets.map(({ id }) => id),
  );
  return given === 'operator'
    ? { ...fault, hint: 'Give your own as {"basedOn", "name", "factors"}, stricter than one of these.' }
    : fault;
}

/** Codes of the checks of a set that are computed. */
function checkCodes({ takeoff, landing, landingInFlight }: RuleSet): string[] {
  const codes = [takeoff, landing, ...(landingInFlight === undefined ? [] : [landingInFlight])]
    .flatMap(({ readings }) => readings)
    .flatMap(({ requirements }) => requirements)
    .filter(({ notAssessed }) => notAssessed === undefined)
    .map(({ code }) => code);
  return [...new Set(codes)];
}
