import type { LandingAnswer } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Parts } from './band-parts.ts';
import type { Found } from './found.ts';

/**
 * The distances as stated, each with its 90 % band.
 *
 * @param methods - of each, and the edge of a table where one stands for the rest
 * @param times - of physics, where it has them [s]
 */
export function landingDistances(
  { groundRoll, airDistance }: Parts,
  band: Band,
  screenHeight: number,
  { methods, edge }: Pick<Found<unknown>, 'methods' | 'edge'>,
  times: { readonly airTime: number; readonly freeRollTime: number; readonly brakedRollTime: number } | undefined,
): NonNullable<LandingAnswer['distances']> {
  return {
    screenHeight,
    airDistance: banded(airDistance, band.airDistance, { method: methods.airDistance, edge }),
    groundRoll: banded(groundRoll, band.groundRoll, { method: methods.groundRoll, edge }),
    landingDistance: banded(airDistance + groundRoll, band.wholeDistance, { method: methods.wholeDistance, edge }),
    airTime: times?.airTime,
    groundRollTime: times && times.freeRollTime + times.brakedRollTime,
  };
}
