import type { Caution, Measure } from '../planning/answer.ts';
import type { Unit } from '../units/units.ts';
import { notice } from './notice.ts';
import type { Q } from './quantity.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

/** The answer in words: notice, sentence, cautions. */
export function toAdvisory(how: Presentation, sentence: string, cautions: readonly Caution[]) {
  return { notice, sentence, cautions: cautions.map((caution) => toCaution(how, caution)) };
}

function toCaution(how: Presentation, { code, severity, message, at, value, threshold, source }: Caution) {
  return {
    code,
    severity,
    message,
    ...(at === undefined ? {} : { at }),
    ...(value === undefined ? {} : { value: toMeasure(how, value) }),
    ...(threshold === undefined ? {} : { threshold: toMeasure(how, threshold) }),
    ...(source === undefined ? {} : { source }),
  };
}

/** A measure as a quantity to the nearest step; a bare number as a ratio. */
export function toMeasure(how: Presentation, measure: Measure | number): Q<Unit> | number {
  return typeof measure === 'number' ? shownRatio(how, measure) : shownQuantity(how, measure.kind, measure.value);
}
