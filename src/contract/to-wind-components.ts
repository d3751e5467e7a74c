import type { WindComponents } from '../planning/answer.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import type { WindOnAnswer } from './wind-components.ts';

/** The wind along and across the runway. */
export function toWindComponents(
  how: Presentation,
  { headwind, crosswind, crosswindFrom, creditedHeadwind }: WindComponents,
) {
  const wind = { headwind: shownQuantity(how, 'speed', headwind) } as Draft<WindOnAnswer>;
  if (crosswind !== undefined) wind.crosswind = shownQuantity(how, 'speed', crosswind);
  if (crosswindFrom !== undefined) wind.crosswindFrom = crosswindFrom;
  wind.creditedHeadwind = shownQuantity(how, 'speed', creditedHeadwind);
  return wind;
}
