import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { BrakedRun, BrakedStretch } from './landing-run.ts';

/** What slows an aeroplane down on its wheels, as constants of one stretch of one run. */
export interface StopForces {
  readonly headwind: number;
  /** deceleration [m/s2] against true airspeed [m/s] */
  readonly deceleration: (airspeed: number) => number;
  /** airspeeds [m/s] at which it or its slope jumps */
  readonly jumps: readonly number[];
}

/**
 * The forces of a stop: attitude held, wing in ground effect, brakes full on.
 *
 * @param run - configuration and wind
 * @param ground - what lies under the wheels: the run's own, or one of its stretches
 * @see references.McCormick1995, sec. 7.7
 */
export function stopForces(run: BrakedRun, ground: Omit<BrakedStretch, 'end'>): StopForces {
  const { headwind, groundLiftCoefficient: liftCoefficient } = run;
  const { braking, slope = run.slope, contaminantDrag } = ground;
  const halfRhoS = (0.5 * run.density * run.wingArea) / run.mass;
  const phi = groundEffect(run.wingHeight / run.span);
  const drag = halfRhoS * dragCoefficient(run.groundDragCoefficient, run.inducedDragFactor, liftCoefficient, phi);
  const lift = halfRhoS * liftCoefficient;
  const steady = g0 * slope - run.idleThrust / run.mass;
  const { thrust: reverse, cutOffSpeed } = run.reverseThrust ?? { thrust: 0, cutOffSpeed: Number.POSITIVE_INFINITY };
  const reversed = g0 * slope + reverse / run.mass;
  const displaced = contaminantDrag === undefined ? 0 : contaminantDrag.perSquare / run.mass;
  const displacedBelow = contaminantDrag?.below ?? 0;

  const jumps = [0];
  for (const groundSpeed of braking.kinks) jumps.push(groundSpeed + headwind);
  if (run.reverseThrust !== undefined) jumps.push(cutOffSpeed + headwind);
  if (contaminantDrag !== undefined) jumps.push(displacedBelow + headwind);
  if (lift > 0) jumps.push(Math.sqrt(g0 / lift));
  return {
    headwind,
    jumps,
    deceleration: (airspeed) => {
      const square = airspeed * Math.abs(airspeed);
      const groundSpeed = airspeed - headwind;
      const rest = groundSpeed < cutOffSpeed ? steady : reversed;
      const pushed = groundSpeed < displacedBelow ? displaced * groundSpeed * groundSpeed : 0;
      return braking.at(groundSpeed) * Math.max(0, g0 - lift * square) + drag * square + pushed + rest;
    },
  };
}
