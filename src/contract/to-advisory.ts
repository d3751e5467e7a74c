import type { z } from 'zod';
import type { Caution, Measure } from '../planning/answer.ts';
import type { Unit } from '../units/units.ts';
import type { caution } from './answer-parts.ts';
import { notice } from './notice.ts';
import type { Draft } from './present.ts';
import type { Q } from './quantity.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

type ShownCaution = z.infer<typeof caution>;

/** The answer in words: notice, sentence, cautions. */
export function toAdvisory(how: Presentation, sentence: string, cautions: readonly Caution[]) {
  return { notice, sentence, cautions: cautions.map((caution) => toCaution(how, caution)) };
}

function toCaution(how: Presentation, { code, severity, message, at, value, threshold, source }: Caution) {
  const shown: Draft<ShownCaution> = { code, severity, message };
  if (at !== undefined) shown.at = at;
  if (value !== undefined) shown.value = toMeasure(how, value);
  if (threshold !== undefined) shown.threshold = toMeasure(how, threshold);
  if (source !== undefined) shown.source = source;
  return shown;
}

/** A measure as a quantity, rounded the way it says; a bare number as a ratio. */
export function toMeasure(how: Presentation, measure: Measure | number): Q<Unit> | number {
  return typeof measure === 'number'
    ? shownRatio(how, measure)
    : shownQuantity(how, measure.kind, measure.value, measure.direction);
}
