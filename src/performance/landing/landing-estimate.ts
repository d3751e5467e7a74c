import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import { landingAirDistance } from './landing-air-distance.ts';
import type { BrakedRun, LandingRun } from './landing-run.ts';

/** Ground roll by mean deceleration and air distance [m]; Infinity where the mean is not positive. */
export interface LandingEstimate {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/** The true airspeed at which the estimate takes the deceleration [m/s]: 0.707 of the ground speed at touchdown, on top of the wind. */
export function estimateSpeed({ headwind, touchdownSpeed }: Pick<LandingRun, 'headwind' | 'touchdownSpeed'>): number {
  return headwind + Math.SQRT1_2 * (touchdownSpeed - headwind);
}

/**
 * The cheap, smooth estimate of a landing from which bands and effects are taken.
 *
 * s_G = (V_TD - w) t_F + (V_TD - w)^2/(2 d(V_m)), V_m = w + 0.707 (V_TD - w); the air distance is that of landingAirDistance,
 * which is closed.
 *
 * @param run - as for landing, the touchdown speed above the headwind
 * @returns [m] each; not an answer by itself: within some 3 % of the roll on friction that does not change with speed
 * @see references.AndersonPerformance, ch. 6 for 0.7 of the touchdown speed
 */
export function landingEstimate(run: LandingRun): LandingEstimate {
  if (!(run.touchdownSpeed > run.headwind)) return { groundRoll: Number.NaN, airDistance: Number.NaN };
  return {
    groundRoll: stopEstimate(run, run.touchdownSpeed, run.freeRollTime),
    airDistance: landingAirDistance(run).distance,
  };
}

/**
 * The cheap, smooth estimate of a stop on the wheels.
 *
 * s = (V - w) t + (V - w)^2/(2 d(V_m)), V_m = w + 0.707 (V - w).
 *
 * @param run - as for brakedRoll
 * @param airspeed - true, at which it begins [m/s], above the headwind
 * @param freeRollTime - before the brakes hold [s]
 * @returns [m]; Infinity where the mean is not positive
 * @see references.AndersonPerformance, ch. 6
 */
export function stopEstimate(run: BrakedRun, airspeed: number, freeRollTime: number): number {
  const { headwind, groundLiftCoefficient: liftCoefficient, reverseThrust } = run;
  const groundSpeed = airspeed - headwind;
  const mean = estimateSpeed({ headwind, touchdownSpeed: airspeed });
  const phi = groundEffect(run.wingHeight / run.span);
  const q = (0.5 * run.density * run.wingArea * mean * Math.abs(mean)) / run.mass;
  const drag = q * dragCoefficient(run.groundDragCoefficient, run.inducedDragFactor, liftCoefficient, phi);
  const held = run.braking.at(mean - headwind) * Math.max(0, g0 - q * liftCoefficient);
  const isReversed = reverseThrust !== undefined && mean - headwind >= reverseThrust.cutOffSpeed;
  const thrust = isReversed ? -reverseThrust.thrust : run.idleThrust;
  const { contaminantDrag } = run;
  const isPushing = contaminantDrag !== undefined && mean - headwind < contaminantDrag.below;
  const pushed = isPushing ? (contaminantDrag.perSquare * (mean - headwind) ** 2) / run.mass : 0;
  const deceleration = held + drag + pushed - thrust / run.mass + g0 * run.slope;
  return deceleration > 0
    ? groundSpeed * freeRollTime + groundSpeed ** 2 / (2 * deceleration)
    : Number.POSITIVE_INFINITY;
}
