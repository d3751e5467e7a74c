import type { OutsideManual } from '../../performance/flight-manual/manual-figures.ts';
import type { Shortfall } from '../answer.ts';
import { manualMeasures } from './manual-bound-text.ts';

/** Where the flight manual ends, as numbers. */
export function outsideManualShortfalls({ bounds }: Pick<OutsideManual, 'bounds'>): readonly Shortfall[] {
  return bounds.map(({ sheet, axis, given, bound, side }) => {
    const { kind, at } = manualMeasures[axis];
    return { at, axis, table: sheet, given: { kind, value: given }, bound: { kind, value: bound }, side };
  });
}
