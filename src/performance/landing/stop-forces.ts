import type { BrakingFriction } from '../../physics/braking-friction.ts';
import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { BrakedRun, BrakedStretch } from './landing-run.ts';

/** What slows an aeroplane down on its wheels, by unit of mass, as constants of one stretch of one run. */
export interface StopForces {
  readonly headwind: number;
  /** against ground speed, on the whole weight */
  readonly braking: BrakingFriction;
  /** drag and lift over V|V| and mass [1/m] */
  readonly drag: number;
  readonly lift: number;
  /** gravity along the runway less idle thrust [m/s2], and with reverse thrust, at and above its cut-off ground speed [m/s] */
  readonly steady: number;
  readonly reversed: number;
  readonly cutOffSpeed: number;
  /** drag of a contaminant over the square of the ground speed and mass [1/m], below a ground speed [m/s] */
  readonly displaced: number;
  readonly displacedBelow: number;
  /** airspeeds [m/s] at which the deceleration or its slope jumps */
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
  return { headwind, braking, drag, lift, steady, reversed, cutOffSpeed, displaced, displacedBelow, jumps };
}

/** Deceleration by the wheels [m/s2] at a true airspeed [m/s]. */
export function wheelDeceleration({ braking, headwind, lift }: StopForces, airspeed: number): number {
  return braking.at(airspeed - headwind) * Math.max(0, g0 - lift * airspeed * Math.abs(airspeed));
}

/** Deceleration by all but the wheels [m/s2] at a true airspeed [m/s]: air, contaminant, slope, engines. */
export function otherDeceleration(forces: StopForces, airspeed: number): number {
  const groundSpeed = airspeed - forces.headwind;
  const pushed = groundSpeed < forces.displacedBelow ? forces.displaced * groundSpeed * groundSpeed : 0;
  const held = groundSpeed < forces.cutOffSpeed ? forces.steady : forces.reversed;
  return forces.drag * airspeed * Math.abs(airspeed) + pushed + held;
}

/** Deceleration [m/s2] at a true airspeed [m/s]. */
export function deceleration(forces: StopForces, airspeed: number): number {
  return wheelDeceleration(forces, airspeed) + otherDeceleration(forces, airspeed);
}
