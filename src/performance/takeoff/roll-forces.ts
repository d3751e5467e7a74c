import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** What pushes and holds an aeroplane that rolls on its wheels, as constants of one run. */
export interface RollForces {
  readonly thrust: Thrust;
  readonly mass: number;
  /** [N] */
  readonly weight: number;
  /** drag and lift over V|V| [N s2/m2] */
  readonly drag: number;
  readonly lift: number;
  readonly friction: number;
  /** weight's part along the runway, uphill positive [N] */
  readonly uphill: number;
}

/**
 * The forces of a takeoff roll: attitude held, wing in ground effect at its height above the runway.
 *
 * @see references.McCormick1995, sec. 7.2
 */
export function rollForces(run: TakeoffRun): RollForces {
  const { mass, density, wingArea, groundLiftCoefficient } = run;
  const halfRhoS = 0.5 * density * wingArea;
  const phi = groundEffect(run.wingHeight / run.span);
  const coefficient = dragCoefficient(run.groundDragCoefficient, run.inducedDragFactor, groundLiftCoefficient, phi);
  return {
    thrust: run.thrust,
    mass,
    weight: mass * g0,
    drag: halfRhoS * coefficient,
    lift: halfRhoS * groundLiftCoefficient,
    friction: run.rollingFriction,
    uphill: mass * g0 * run.slope,
  };
}

/** Acceleration [m/s2] at a true airspeed [m/s], below 0 with a tailwind at rest: air from behind pushes. */
export function rollAcceleration(forces: RollForces, airspeed: number): number {
  return accelerationWith(forces, airspeed, forces.thrust.at(airspeed));
}

/** The same with the thrust [N] already known. */
export function accelerationWith(forces: RollForces, airspeed: number, thrust: number): number {
  const square = airspeed * Math.abs(airspeed);
  const load = forces.weight - forces.lift * square;
  const held = load > 0 ? forces.friction * load : 0;
  return (thrust - forces.drag * square - held - forces.uphill) / forces.mass;
}
