import { g0 } from '../physics/constants.ts';
import { dragCoefficient } from '../physics/drag.ts';

/** What a steady climb is made of, in SI. */
export interface Climb {
  /** [kg], [m2] */
  readonly mass: number;
  readonly wingArea: number;
  readonly zeroLiftDragCoefficient: number;
  /** K = 1/(pi A e) */
  readonly inducedDragFactor: number;
  /** [kg/m3] */
  readonly density: number;
  /** true [m/s] */
  readonly airspeed: number;
  /** of all running engines at that airspeed [N] */
  readonly thrust: number;
}

/**
 * Gradient and rate of a climb at a constant true airspeed, out of ground effect, wings level.
 *
 * sin gamma = (T - D)/W with lift = weight; gradient = tan gamma, rate = V sin gamma.
 *
 * @returns gradient, dimensionless, and rate [m/s]; both below 0 where the aeroplane sinks
 * @remarks Small angles: lift = weight cos gamma would lower the drag a little. A constant calibrated airspeed asks for some 1 % less
 * below Mach 0.15.
 * @see references.AndersonPerformance, ch. 5
 */
export function steadyClimb(climb: Climb): { readonly gradient: number; readonly rate: number } {
  const { mass, wingArea, density, airspeed, thrust } = climb;
  const weight = mass * g0;
  const q = 0.5 * density * airspeed * airspeed * wingArea;
  const drag = q * dragCoefficient(climb.zeroLiftDragCoefficient, climb.inducedDragFactor, weight / q, 1);
  const sine = (thrust - drag) / weight;
  return { gradient: sine / Math.sqrt(1 - Math.min(0.99, sine * sine)), rate: airspeed * sine };
}
