import type { LandingAnswer, Method } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Stopped } from './landing-runs.ts';

/** The distances as stated, each with its 90 % band. */
export function landingDistances(
  stated: Stopped,
  band: Band,
  screenHeight: number,
  method: Method,
): NonNullable<LandingAnswer['distances']> {
  return {
    screenHeight,
    airDistance: banded(stated.airDistance, band.airDistance, method),
    groundRoll: banded(stated.groundRoll, band.groundRoll, method),
    landingDistance: banded(stated.landingDistance, band.wholeDistance, method),
    airTime: stated.airTime,
    groundRollTime: stated.freeRollTime + stated.brakedRollTime,
  };
}
