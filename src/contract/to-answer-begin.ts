import type { Answer } from '../planning/answer.ts';
import type { Presentation } from './shown-quantity.ts';
import { toAdvisory } from './to-advisory.ts';
import { toAir } from './to-air.ts';
import { toWindComponents } from './to-wind-components.ts';

/** The blocks with which every answer of a field length begins. */
export function toAnswerBegin(how: Presentation, { outcome, sentence, cautions, air, wind }: Answer) {
  return {
    outcome,
    advisory: toAdvisory(how, sentence, cautions),
    air: toAir(how, air),
    wind: toWindComponents(how, wind),
  };
}
