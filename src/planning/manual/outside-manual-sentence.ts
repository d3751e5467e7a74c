import type { OutsideManual } from '../../performance/flight-manual/manual-figures.ts';
import type { UnitFamily } from '../../units/presentation.ts';
import { manualBoundText } from './manual-bound-text.ts';

/** Why the flight manual has no figure, in words and numbers. */
export function outsideManualSentence({ bounds }: OutsideManual, units: UnitFamily): string {
  const each = bounds.map((bound) => manualBoundText(bound, units));
  return `Outside the flight manual: ${each.join('; ')}. Its tables are not extrapolated.`;
}
