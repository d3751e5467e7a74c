import { z } from 'zod';
import {
  type Direction,
  type Kind,
  roundTo,
  shown,
  type UnitFamily,
  unitFamilies,
  unitFor,
} from '../units/presentation.ts';
import type { Unit } from '../units/units.ts';
import type { Q } from './quantity.ts';

/** How an answer is written: the family of units and whether numbers are rounded. */
export interface Presentation {
  readonly units: UnitFamily;
  readonly rounding: 'safe' | 'none';
}

/** A number of an answer with its unit, rounded the safe way. */
export function shownQuantity(
  { units, rounding }: Presentation,
  kind: Kind,
  si: number,
  direction: Direction = 'nearest',
): Q<Unit> {
  return { value: shown(units, kind, si, direction, rounding), unit: unitFor(units, kind) };
}

/** A dimensionless number of an answer, to four decimals. */
export function shownRatio({ rounding }: Presentation, ratio: number): number {
  return rounding === 'none' ? ratio + 0 : roundTo(ratio, 0.0001, 'nearest');
}

/** A ratio as per cent, to two decimals. */
export function shownPercent({ units, rounding }: Presentation, ratio: number, direction: Direction): number {
  return shown(units, 'gradient', ratio, direction, rounding);
}

/** The schema of a kind of number in an answer: finite, in the unit of one of the families. */
export function shownSchema(id: string, kind: Kind, description: string): z.ZodType<Q<Unit>> {
  return z
    .strictObject({
      value: z.number(),
      unit: z.enum([...new Set(unitFamilies.map((family) => unitFor(family, kind)))]),
    })
    .meta({ id, description });
}
