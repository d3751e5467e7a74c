import type { Method, TakeoffAnswer } from './answer.ts';
import { type Band, banded } from './band.ts';
import type { Reached } from './takeoff-runs.ts';

/** The distances as stated, each with its 90 % band. */
export function takeoffDistances(
  stated: Reached,
  band: Band,
  screenHeight: number,
  method: Method,
): NonNullable<TakeoffAnswer['distances']> {
  return {
    screenHeight,
    groundRoll: banded(stated.groundRoll, band.groundRoll, method),
    airDistance: banded(stated.airDistance, band.airDistance, method),
    takeoffDistance: banded(stated.takeoffDistance, band.wholeDistance, method),
    groundRollTime: stated.groundRollTime,
    airTime: stated.airTime,
  };
}
