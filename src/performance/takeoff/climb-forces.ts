import { g0 } from '../../physics/constants.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** What the path from lift-off to the screen is made of, as constants of one run. */
export interface ClimbForces {
  readonly thrust: Thrust;
  /** one over the weight [1/N] */
  readonly perWeight: number;
  /** over the weight: zero-lift drag over V^2 [s2/m2], and induced drag out of ground effect times V^2 [m2/s2] */
  readonly zeroLift: number;
  readonly induced: number;
  /** [m], [1/m] */
  readonly wingHeight: number;
  readonly perSpan: number;
  /** uphill slope, 0 where the runway falls */
  readonly uphill: number;
  /** square of the lift-off speed, and its growth with height [m2/s2], [m/s2] */
  readonly square: number;
  readonly growth: number;
  /** 1/kappa, height over energy height */
  readonly perEnergyRatio: number;
}

/** The steepest path the energy may ask for, sin 45 degrees: beyond it the formula's lift = weight is not true. */
const steepest = Math.SQRT1_2;

/** The forces and the speed schedule of a climb to the screen: V^2 linear in height from lift-off to the screen. */
export function climbForces(run: TakeoffRun): ClimbForces {
  const weight = run.mass * g0;
  const halfRhoS = 0.5 * run.density * run.wingArea;
  const square = run.liftOffSpeed * run.liftOffSpeed;
  const growth = Math.max(0, run.screenSpeed * run.screenSpeed - square) / run.screenHeight;
  return {
    thrust: run.thrust,
    perWeight: 1 / weight,
    zeroLift: (halfRhoS * run.airDragCoefficient) / weight,
    induced: (run.inducedDragFactor * weight) / halfRhoS,
    wingHeight: run.wingHeight,
    perSpan: 1 / run.span,
    uphill: Math.max(0, run.slope),
    square,
    growth,
    perEnergyRatio: 1 / (1 + growth / (2 * g0)),
  };
}

/** (T - D)/W - max(slope, 0) at a height with the thrust known there, load factor 1. */
export function climbGradientWith(forces: ClimbForces, height: number, thrust: number): number {
  const square = forces.square + forces.growth * height;
  const phi = groundEffect((forces.wingHeight + height) * forces.perSpan);
  return thrust * forces.perWeight - forces.zeroLift * square - (phi * forces.induced) / square - forces.uphill;
}

/** The same, thrust included. */
export function climbGradient(forces: ClimbForces, height: number): number {
  return climbGradientWith(forces, height, forces.thrust.at(Math.sqrt(forces.square + forces.growth * height)));
}

/** Sine of the path angle that energy allows with a gradient. */
export function energySine(forces: ClimbForces, gradient: number): number {
  return Math.min(steepest, gradient * forces.perEnergyRatio);
}
