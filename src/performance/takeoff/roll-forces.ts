import { g0 } from '../../physics/constants.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import { displacedPull } from './displaced-pull.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** What pushes and holds an aeroplane that rolls on its wheels, by unit of mass, as constants of one run. */
export interface RollForces {
  /** less the drag of a loose contaminant */
  readonly thrust: Thrust;
  /** one over the mass [1/kg] */
  readonly perMass: number;
  /** [m/s2] */
  readonly weight: number;
  /** drag and lift over V|V| and mass [1/m] */
  readonly drag: number;
  readonly lift: number;
  readonly friction: number;
  /** gravity along the runway, uphill positive [m/s2] */
  readonly uphill: number;
}

/**
 * The forces of a takeoff roll: attitude held, wing in ground effect at its height above the runway.
 *
 * @see references.McCormick1995, sec. 7.2
 */
export function rollForces(run: TakeoffRun): RollForces {
  const { mass, density, wingArea, groundLiftCoefficient, contaminantDrag, thrust } = run;
  const perMass = 1 / mass;
  const halfRhoS = 0.5 * density * wingArea * perMass;
  const phi = groundEffect(run.wingHeight / run.span);
  return {
    thrust: contaminantDrag === undefined ? thrust : displacedPull(thrust, contaminantDrag, run.headwind),
    perMass,
    weight: g0,
    drag: halfRhoS * dragCoefficient(run.groundDragCoefficient, run.inducedDragFactor, groundLiftCoefficient, phi),
    lift: halfRhoS * groundLiftCoefficient,
    friction: run.rollingFriction,
    uphill: g0 * run.slope,
  };
}

/** The same forces on another slope, uphill positive. */
export function sloped(forces: RollForces, slope: number): RollForces {
  return { ...forces, uphill: g0 * slope };
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
  return thrust * forces.perMass - forces.drag * square - held - forces.uphill;
}
