import type { Check, Factor, TakeoffAnswer } from '../planning/answer.ts';
import { type Presentation, shownPercent, shownQuantity, shownRatio } from './shown-quantity.ts';

/** The checks of the rule set: what is required rounded up, what is available and what is spare rounded down. */
export function toAssessment(how: Presentation, given: NonNullable<TakeoffAnswer['assessment']>) {
  const { ruleSet, governing } = given;
  const checks = given.checks.map((check) => toCheck(how, check));
  return governing === undefined ? { ruleSet, checks } : { ruleSet, checks, governing };
}

function toCheck(how: Presentation, check: Check) {
  const { unit, distance, alternative, required, available, margin, marginRatio, why } = check;
  return {
    code: check.code,
    of: check.of,
    startsFrom: check.startsFrom,
    ...(distance === undefined ? {} : { distance: shownQuantity(how, unit, distance, 'up') }),
    factors: check.factors.map((factor) => toFactor(how, factor)),
    ...(alternative === undefined
      ? {}
      : {
          alternative: {
            startsFrom: alternative.startsFrom,
            distance: shownQuantity(how, unit, alternative.distance, 'up'),
            factors: alternative.factors.map((factor) => toFactor(how, factor)),
            required: shownQuantity(how, unit, alternative.required, 'up'),
            because: alternative.because,
          },
        }),
    ...(required === undefined ? {} : { required: shownQuantity(how, unit, required, 'up') }),
    ...(available === undefined ? {} : { available: shownQuantity(how, unit, available, 'down') }),
    ...(margin === undefined ? {} : { margin: shownQuantity(how, unit, margin, 'down') }),
    ...(marginRatio === undefined ? {} : { marginPercent: shownPercent(how, marginRatio, 'down') }),
    result: check.result,
    ...(why === undefined ? {} : { why }),
    source: check.source,
  };
}

function toFactor(how: Presentation, { code, value, because, source, status }: Factor) {
  return { code, value: shownRatio(how, value), because, source, status };
}
