import type { BandedDistance, TakeoffAnswer } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Parts } from './band-parts.ts';

/**
 * The distances as stated, each with its 90 % band.
 *
 * @param by - the method, and the edge of a table where one stands for the rest
 * @param times - of physics, where it has them [s]
 */
export function takeoffDistances(
  { groundRoll, airDistance }: Parts,
  band: Band,
  screenHeight: number,
  by: Pick<BandedDistance, 'method' | 'edge'>,
  times: { readonly groundRollTime: number; readonly airTime: number } | undefined,
): NonNullable<TakeoffAnswer['distances']> {
  return {
    screenHeight,
    groundRoll: banded(groundRoll, band.groundRoll, by),
    airDistance: banded(airDistance, band.airDistance, by),
    takeoffDistance: banded(groundRoll + airDistance, band.wholeDistance, by),
    groundRollTime: times?.groundRollTime,
    airTime: times?.airTime,
  };
}
