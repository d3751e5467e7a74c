import type { AlternativeReading, Answer, Check, Factor } from '../planning/answer.ts';
import type { AssessmentOnWire } from './assessment.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownPercent, shownQuantity, shownRatio } from './shown-quantity.ts';

type ShownCheck = AssessmentOnWire['checks'][number];

/** The checks of the rule set: what is required rounded up, what is available and what is spare rounded down. */
export function toAssessment(how: Presentation, given: NonNullable<Answer['assessment']>) {
  const { ruleSet, basedOn, governing } = given;
  const checks = given.checks.map((check) => toCheck(how, check));
  return {
    ruleSet,
    ...(basedOn === undefined ? {} : { basedOn }),
    checks,
    ...(governing === undefined ? {} : { governing }),
  };
}

function toCheck(how: Presentation, check: Check) {
  const { unit, distance, alternative, furtherAlternatives, required, available, margin, marginRatio, why } = check;
  const shown = { code: check.code, of: check.of } as Draft<ShownCheck>;
  if (check.startsFrom !== undefined) shown.startsFrom = check.startsFrom;
  if (distance !== undefined) shown.distance = shownQuantity(how, unit, distance, 'up');
  shown.factors = check.factors.map((factor) => toFactor(how, factor));
  if (alternative !== undefined) shown.alternative = toAlternative(how, unit, alternative);
  if (furtherAlternatives !== undefined) {
    shown.furtherAlternatives = furtherAlternatives.map((one) => toAlternative(how, unit, one));
  }
  if (required !== undefined) shown.required = shownQuantity(how, unit, required, 'up');
  if (available !== undefined) shown.available = shownQuantity(how, unit, available, 'down');
  if (margin !== undefined) shown.margin = shownQuantity(how, unit, margin, 'down');
  if (marginRatio !== undefined) shown.marginPercent = shownPercent(how, marginRatio, 'down');
  shown.result = check.result;
  if (why !== undefined) shown.why = why;
  shown.source = check.source;
  return shown;
}

function toAlternative(how: Presentation, unit: Check['unit'], given: AlternativeReading) {
  return {
    startsFrom: given.startsFrom,
    distance: shownQuantity(how, unit, given.distance, 'up'),
    factors: given.factors.map((factor) => toFactor(how, factor)),
    required: shownQuantity(how, unit, given.required, 'up'),
    because: given.because,
  };
}

/** A factor of a rule set as answers and lists show it. */
export function toFactor(how: Presentation, { code, value, because, source, status, atLeast }: Factor) {
  const shown = { code, value: shownRatio(how, value), because, source, status };
  return atLeast === undefined ? shown : { ...shown, atLeast };
}
