import type { Fault } from '../../planning/fault.ts';
import { fromSi, toSi } from '../../units/units.ts';
import { fittingUnit } from '../fitting-unit.ts';
import { columnKinds, type Heading } from '../flight-manual/manual-columns.ts';
import { figure } from '../written.ts';

/**
 * The first number, if any, that no column of this name can hold: a slip of unit or of digits.
 *
 * @param pointerTo - the place of one of the numbers
 */
export function checkRange(
  { name, unit }: Heading,
  numbers: readonly number[],
  pointerTo: (index: number) => string,
): Fault[] {
  const { quantity, units, lowest, highest } = columnKinds[name];
  const room = 1e-9 * Math.max(1, highest - lowest);
  const fits = (inSi: number) => inSi >= lowest - room && inSi <= highest + room;
  const index = numbers.findIndex((number) => !fits(toSi(quantity, number, unit as never)));
  if (index < 0) return [];
  const received = numbers[index] as number;
  const meant = fittingUnit(quantity, { value: received, unit }, units, fits);
  const bound = (limit: number) => figure(fromSi(quantity, limit, unit as never));
  return [
    {
      pointer: pointerTo(index),
      code: 'out-of-range',
      message: `${name} is ${received} ${unit}.`,
      received,
      allowed: `${bound(lowest)} to ${bound(highest)} ${unit}`,
      ...(meant === undefined ? {} : { hint: `In ${meant} it would fit; check the unit.` }),
    },
  ];
}
