import { g0 } from '../../physics/constants.ts';
import type { PathIntegral } from '../path-integral.ts';
import type { BrakedRun } from './landing-run.ts';
import { stopAlong } from './stop-along.ts';
import { noDeceleration } from './stop-between.ts';
import { deceleration, type StopForces } from './stop-forces.ts';

/** The stop, or the name of why there is none. */
export type BrakedRoll =
  | {
      readonly outcome: 'stops';
      /** [m], [s] */
      readonly distance: number;
      readonly time: number;
      /** heat of the brakes: all the friction of the wheels, rolling friction included [J] */
      readonly brakeEnergy: number;
      /** least deceleration over g */
      readonly leastDecelerationRatio: number;
    }
  | { readonly outcome: 'never-stops'; readonly atGroundSpeed: number; readonly leastDecelerationRatio: number };

/**
 * Distance on the wheels from an airspeed to a standstill, brakes full on.
 *
 * s = integral of (V - w)/d(V) dV from V = w to the airspeed; t = integral of dV/d; brake energy = integral of the friction over s;
 * m d = mu_B(V - w) max(0, W - q S C_Lg) + q S C_Dg - T_idle + W slope + k (V - w)^2, q = rho V|V|/2,
 * with the reverse thrust added in place of T_idle taken off, at and above its cut-off speed, and the contaminant's k below its
 * speed. On a runway in stretches each has its own braking, slope and contaminant.
 *
 * @param run - configuration, wind and braking of the stop
 * @param airspeed - true, at which braking begins [m/s], above w
 * @param begin - where braking begins, on the scale of the stretches [m]
 * @returns distance [m], time [s] and brake energy [J]; 'never-stops' where d is not above 1e-6 g throughout, with the highest ground speed at which
 * it is gone
 * @remarks Small slopes; wheels, not skis or floats; the friction acts from the first moment.
 * @see references.McCormick1995, sec. 7.7; references.Raymer, ch. 17
 */
export function brakedRoll(run: BrakedRun, airspeed: number, begin = 0): BrakedRoll {
  const { headwind } = run;
  if (!(airspeed > headwind)) throw new RangeError(`airspeed must be above the headwind ${headwind}: ${airspeed}`);
  const { reaches, sum, forces, entered } = stopAlong(run)(airspeed, headwind, begin);
  return reaches ? stops(run, sum) : neverStops(forces, entered, sum.leastAt);
}

function stops({ mass }: BrakedRun, { distance, time, brakeWork, least }: PathIntegral): BrakedRoll {
  return { outcome: 'stops', distance, time, brakeEnergy: mass * brakeWork, leastDecelerationRatio: least / g0 };
}

/** The named outcome, with the first ground speed on slowing down at which the deceleration is gone, to a thousandth. */
function neverStops(forces: StopForces, from: number, leastAt: number): BrakedRoll {
  const { headwind } = forces;
  const leastDecelerationRatio = deceleration(forces, leastAt) / g0;
  for (let i = 0; i <= 1000; i++) {
    const at = from + ((headwind - from) * i) / 1000;
    if (deceleration(forces, at) <= noDeceleration * g0)
      return { outcome: 'never-stops', atGroundSpeed: at - headwind, leastDecelerationRatio };
  }
  return { outcome: 'never-stops', atGroundSpeed: leastAt - headwind, leastDecelerationRatio };
}
