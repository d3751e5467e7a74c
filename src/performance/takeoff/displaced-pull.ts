import type { Thrust } from '../../physics/thrust/thrust.ts';

/**
 * Thrust less the drag of a loose contaminant: what pulls an aeroplane that rolls through it.
 *
 * Taken off the thrust so that the roll on a runway without a contaminant pays nothing for it. Unlike a thrust it may be below 0.
 *
 * @param thrust - of all engines
 * @param contaminantDrag - k over the square of the ground speed [kg/m], 0 or more
 * @param headwind - w [m/s]
 */
export function displacedPull(thrust: Thrust, contaminantDrag: number, headwind: number): Thrust {
  if (!(contaminantDrag >= 0)) throw new RangeError(`contaminantDrag must be 0 or more: ${contaminantDrag}`);
  return {
    ...thrust,
    at: (airspeed) => thrust.at(airspeed) - contaminantDrag * (airspeed - headwind) ** 2,
    fill: (airspeeds, n, out) => {
      thrust.fill(airspeeds, n, out);
      for (let i = 0; i < n; i++) {
        const groundSpeed = (airspeeds[i] as number) - headwind;
        out[i] = (out[i] as number) - contaminantDrag * groundSpeed * groundSpeed;
      }
    },
  };
}
