import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { SlopeProfile } from '../slope-profile.ts';

/** All that the integrations of a takeoff need, in SI, nothing assumed any more. */
export interface TakeoffRun {
  /** [kg] */
  readonly mass: number;
  /** [m2] */
  readonly wingArea: number;
  /** span [m] and height of the wing's quarter chord above the runway [m] */
  readonly span: number;
  readonly wingHeight: number;
  /** K = 1/(pi A e) out of ground effect */
  readonly inducedDragFactor: number;
  /** zero-lift drag coefficient on the ground and in the air, flap and gear included */
  readonly groundDragCoefficient: number;
  readonly airDragCoefficient: number;
  /** lift coefficient held in the roll */
  readonly groundLiftCoefficient: number;
  /** free-rolling friction, dimensionless */
  readonly rollingFriction: number;
  /** drag of a loose contaminant over the square of the ground speed [kg/m], whole at every speed; absent: none */
  readonly contaminantDrag?: number | undefined;
  readonly thrust: Thrust;
  /** [kg/m3] */
  readonly density: number;
  /** along the runway [m/s], on the nose positive */
  readonly headwind: number;
  /** uphill positive, dimensionless; with a profile, of the whole line */
  readonly slope: number;
  /** the ground line from the start point on; absent: the slope holds throughout */
  readonly profile?: SlopeProfile | undefined;
  /** true airspeeds [m/s] */
  readonly rotationSpeed: number;
  readonly liftOffSpeed: number;
  readonly screenSpeed: number;
  /** [s] */
  readonly rotationTime: number;
  /** load factor of the pull-up arc after lift-off, above 1 */
  readonly pullUpLoadFactor: number;
  /** [m] */
  readonly screenHeight: number;
}

/** What came of it: the distances, or the name of why there are none with the number that shows it. */
export type TakeoffResult =
  | {
      readonly outcome: 'reaches-screen';
      /** brake release to lift-off, rotation included [m], [s] */
      readonly groundRoll: number;
      readonly groundRollTime: number;
      /** lift-off to the screen [m], [s] */
      readonly airDistance: number;
      readonly airTime: number;
      readonly takeoffDistance: number;
      /** least acceleration on the ground over g, and least of (T - D)/W - max(slope, 0) in the air, dimensionless */
      readonly leastAccelerationRatio: number;
      readonly leastClimbGradient: number;
    }
  | {
      readonly outcome: 'never-reaches-lift-off-speed';
      /** true airspeed [m/s] at which the acceleration is first gone, and the least acceleration met over g */
      readonly atAirspeed: number;
      readonly leastAccelerationRatio: number;
    }
  | {
      readonly outcome: 'never-reaches-screen-height';
      readonly groundRoll: number;
      readonly groundRollTime: number;
      /** least of (T - D)/W - max(slope, 0) on the path, and what it must exceed */
      readonly leastClimbGradient: number;
      readonly neededClimbGradient: number;
    }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly liftOffSpeed: number }
  | {
      readonly outcome: 'ground-speed-not-positive';
      readonly headwind: number;
      /** mean speed forward through the air from lift-off to the screen [m/s] */
      readonly climbSpeed: number;
    }
  | {
      readonly outcome: 'outside-stated-data';
      /** true airspeed asked for and the bound of the measured thrust [m/s] */
      readonly airspeed: number;
      readonly bound: number;
    };
