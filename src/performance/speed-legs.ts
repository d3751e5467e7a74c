import { pathLeg } from './path-leg.ts';
import type { ChangeOn, StretchedPath } from './stretched-path.ts';
import type { Leg } from './trajectory.ts';

/**
 * A change of speed on the wheels as legs of a trajectory, one a part.
 *
 * @param path - over its stretches
 * @param changeOn - the change on one stretch
 * @param headwind - [m/s]
 * @returns undefined where the path does not reach its speed
 */
export function speedLegs(
  { reaches, parts }: Pick<StretchedPath, 'reaches' | 'parts'>,
  changeOn: ChangeOn,
  headwind: number,
): Leg[] | undefined {
  if (!reaches) return undefined;
  return parts.map(({ stretch, from, to }) =>
    pathLeg(
      (low, high) => changeOn(stretch, low, high).sum,
      from,
      to,
      (trueAirspeed, distance, time) => ({
        distance,
        time,
        groundSpeed: trueAirspeed - headwind,
        trueAirspeed,
        height: 0,
      }),
    ),
  );
}

/** Time at one speed on the wheels, as a leg of a trajectory. */
export function steadyLeg(trueAirspeed: number, headwind: number, seconds: number): Leg {
  const groundSpeed = trueAirspeed - headwind;
  return {
    distance: groundSpeed * seconds,
    time: seconds,
    at(distance) {
      const time = groundSpeed > 0 ? distance / groundSpeed : 0;
      return { distance, time, groundSpeed, trueAirspeed, height: 0 };
    },
  };
}
