import type { TakeoffAnswer } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Parts } from './band-parts.ts';
import type { Found } from './found.ts';

/**
 * The distances as stated, each with its 90 % band.
 *
 * @param methods - of each, and the edge of a table where one stands for the rest
 * @param times - of physics, where it has them [s]
 */
export function takeoffDistances(
  { groundRoll, airDistance }: Parts,
  band: Band,
  screenHeight: number,
  { methods, edge }: Pick<Found<unknown>, 'methods' | 'edge'>,
  times: { readonly groundRollTime: number; readonly airTime: number } | undefined,
): NonNullable<TakeoffAnswer['distances']> {
  return {
    screenHeight,
    groundRoll: banded(groundRoll, band.groundRoll, { method: methods.groundRoll, edge }),
    airDistance: banded(airDistance, band.airDistance, { method: methods.airDistance, edge }),
    takeoffDistance: banded(groundRoll + airDistance, band.wholeDistance, { method: methods.wholeDistance, edge }),
    groundRollTime: times?.groundRollTime,
    airTime: times?.airTime,
  };
}
