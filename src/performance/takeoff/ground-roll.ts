import { g0 } from '../../physics/constants.ts';
import type { PathIntegral } from '../path-integral.ts';
import { profiledRoll } from './profiled-roll.ts';
import { noAcceleration, rollBetween } from './roll-between.ts';
import { type RollForces, rollAcceleration, rollForces } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** The roll, or the name of why there is none. */
export type GroundRoll =
  | {
      readonly outcome: 'lifts-off';
      /** brake release to lift-off, rotation included [m], [s] */
      readonly distance: number;
      readonly time: number;
      /** least acceleration over g */
      readonly leastAccelerationRatio: number;
    }
  | {
      readonly outcome: 'never-reaches-lift-off-speed';
      readonly atAirspeed: number;
      readonly leastAccelerationRatio: number;
    }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly liftOffSpeed: number };

/**
 * Distance along the runway from brake release to lift-off.
 *
 * s = integral of (V - w)/a(V) dV from V = w to V_LOF, plus (V_R - w) t_R for the rotation; t = integral of dV/a, plus t_R;
 * m a = T(V) - q S C_Dg - mu max(0, W - q S C_Lg) - k (V - w)^2 - W slope, q = rho V|V|/2, k of a loose contaminant.
 *
 * On a ground line with a profile each stretch has its own slope. The acceleration is integrated to V_LOF even where V_R is
 * lower, and the rotation comes on top: the longer reading of two.
 *
 * @param run - steady headwind w, airspeeds and V_R = rotationSpeed [m/s], t_R = rotationTime [s]
 * @returns distance [m] and time [s]; 'never-reaches-lift-off-speed' where a is not above 1e-6 g throughout, with the airspeed at
 * which it is first gone; 'ground-speed-not-positive' where w is at or above V_LOF
 * @remarks Small slopes, wheels, below Mach 0.4; thrust acts along the runway; rotating masses are left out (0 to 2 %).
 * @see references.McCormick1995, sec. 7.2; references.KrenkelSalzman1968; references.Raymer for the rotation
 */
export function groundRoll(run: TakeoffRun): GroundRoll {
  const { headwind, liftOffSpeed } = run;
  if (headwind >= liftOffSpeed) return { outcome: 'ground-speed-not-positive', headwind, liftOffSpeed };
  const forces = rollForces(run);
  if (run.profile === undefined) {
    const { reaches, sum } = rollBetween(forces, headwind, headwind, liftOffSpeed);
    return reaches ? liftsOff(run, sum) : neverReaches(forces, headwind, liftOffSpeed, sum.leastAt);
  }
  const path = profiledRoll(forces, run.profile, headwind, headwind, liftOffSpeed);
  return path.reaches
    ? liftsOff(run, path.sum)
    : neverReaches(path.forces, path.entered, liftOffSpeed, path.sum.leastAt);
}

function liftsOff(run: TakeoffRun, sum: PathIntegral): GroundRoll {
  return {
    outcome: 'lifts-off',
    distance: sum.distance + Math.max(0, run.rotationSpeed - run.headwind) * run.rotationTime,
    time: sum.time + run.rotationTime,
    leastAccelerationRatio: sum.least / g0,
  };
}

/** The named outcome, with the first airspeed at which the acceleration is gone, to a thousandth of the speeds between. */
function neverReaches(forces: RollForces, from: number, to: number, leastAt: number): GroundRoll {
  const leastAccelerationRatio = rollAcceleration(forces, leastAt) / g0;
  for (let i = 0; i <= 1000; i++) {
    const airspeed = from + ((to - from) * i) / 1000;
    if (rollAcceleration(forces, airspeed) <= noAcceleration * g0) {
      return { outcome: 'never-reaches-lift-off-speed', atAirspeed: airspeed, leastAccelerationRatio };
    }
  }
  return { outcome: 'never-reaches-lift-off-speed', atAirspeed: leastAt, leastAccelerationRatio };
}
