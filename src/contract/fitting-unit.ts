import { type Quantity, toSi } from '../units/units.ts';
import type { Q } from './quantity.ts';

/**
 * The unit that was probably meant: the first other one in which the same number fits.
 *
 * @param units - those the member accepts
 * @param fits - whether an SI value is plausible here
 */
export function fittingUnit<U extends string>(
  quantity: Quantity,
  given: Q<U>,
  units: readonly U[],
  fits: (si: number) => boolean,
): U | undefined {
  return units.find((unit) => unit !== given.unit && fits(toSi(quantity, given.value, unit as never)));
}
