import { z } from 'zod';
import { fromSi, type Quantity, toSi, type UnitOf } from '../units/units.ts';

/** A number with its unit, as it travels on the wire. */
export interface Q<U extends string = string> {
  readonly value: number;
  readonly unit: U;
}

/**
 * The schema of one quantity family: one branch a unit, each with the family's bounds in that unit.
 *
 * The bounds are stated once in SI and rounded outward to four figures, so that a value on the bound is accepted in
 * every unit whatever its last bit.
 */
export function quantitySchema<K extends Quantity, const U extends UnitOf<K>>(
  id: string,
  description: string,
  quantity: K,
  units: readonly U[],
  lowest: number,
  highest: number,
): z.ZodType<Q<U>> {
  const branches = units.map((unit) =>
    z.strictObject({
      value: z
        .number()
        .min(outward(fromSi(quantity, lowest, unit), 'down'))
        .max(outward(fromSi(quantity, highest, unit), 'up')),
      unit: z.literal(unit),
    }),
  );
  return z
    .discriminatedUnion('unit', branches as unknown as [z.ZodObject, ...z.ZodObject[]])
    .meta({ id, description }) as unknown as z.ZodType<Q<U>>;
}

/**
 * A quantity in SI; a negative zero becomes zero.
 *
 * @param kind - which list the unit belongs to
 * @param quantity - value and unit, already read by a schema of that kind
 */
export function si<K extends Quantity>(kind: K, quantity: Q<UnitOf<K>>): number {
  return toSi(kind, quantity.value, quantity.unit) + 0;
}

/** Rounds to four significant figures, away from the range's inside. */
function outward(value: number, direction: 'down' | 'up'): number {
  if (value === 0) return 0;
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 3);
  const steps = value / step;
  const near = Math.abs(steps - Math.round(steps)) < 1e-9;
  const whole = near ? Math.round(steps) : direction === 'down' ? Math.floor(steps) : Math.ceil(steps);
  return Number((whole * step).toPrecision(4)) + 0;
}
