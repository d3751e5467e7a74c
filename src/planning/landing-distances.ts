import type { BandedDistance, LandingAnswer } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Parts } from './band-parts.ts';

/**
 * The distances as stated, each with its 90 % band.
 *
 * @param by - the method, and the edge of a table where one stands for the rest
 * @param times - of physics, where it has them [s]
 */
export function landingDistances(
  { groundRoll, airDistance }: Parts,
  band: Band,
  screenHeight: number,
  by: Pick<BandedDistance, 'method' | 'edge'>,
  times: { readonly airTime: number; readonly freeRollTime: number; readonly brakedRollTime: number } | undefined,
): NonNullable<LandingAnswer['distances']> {
  return {
    screenHeight,
    airDistance: banded(airDistance, band.airDistance, by),
    groundRoll: banded(groundRoll, band.groundRoll, by),
    landingDistance: banded(airDistance + groundRoll, band.wholeDistance, by),
    airTime: times?.airTime,
    groundRollTime: times && times.freeRollTime + times.brakedRollTime,
  };
}
