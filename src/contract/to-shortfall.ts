import type { Shortfall } from '../planning/answer.ts';
import type { Draft } from './present.ts';
import type { ShortfallOnWire } from './shortfall.ts';
import type { Presentation } from './shown-quantity.ts';
import { toMeasure } from './to-advisory.ts';

/** Why there are no distances, in numbers. */
export function toShortfall(how: Presentation, { at, axis, table, given, bound, side }: Shortfall) {
  const shortfall = { at } as Draft<ShortfallOnWire>;
  if (axis !== undefined) shortfall.axis = axis;
  if (table !== undefined) shortfall.table = table;
  shortfall.given = toMeasure(how, given);
  shortfall.bound = toMeasure(how, bound);
  shortfall.side = side;
  return shortfall;
}
