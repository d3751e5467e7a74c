import type { BrakingFriction } from '../../physics/braking-friction.ts';
import type { StoppingDrag } from '../../physics/stopping-drag.ts';
import type { SlopeProfile } from '../slope-profile.ts';

/** A stretch of runway with its own braking, slope and contaminant. */
export interface BrakedStretch {
  /** where it ends [m]: from the threshold in a landing, in the direction of movement */
  readonly end: number;
  /** effective, as in the run */
  readonly braking: BrakingFriction;
  /** uphill positive, dimensionless; absent: the run's own */
  readonly slope?: number | undefined;
  /** what a loose contaminant helps; absent: nothing */
  readonly contaminantDrag?: StoppingDrag | undefined;
}

/** What the stop from a speed on the wheels needs, in SI. */
export interface BrakedRun {
  /** [kg] */
  readonly mass: number;
  /** [m2] */
  readonly wingArea: number;
  /** span [m] and height of the wing's quarter chord above the runway [m] */
  readonly span: number;
  readonly wingHeight: number;
  /** K = 1/(pi A e) out of ground effect */
  readonly inducedDragFactor: number;
  /** zero-lift drag coefficient and lift coefficient held in the roll, flap, gear and spoilers as they then are */
  readonly groundDragCoefficient: number;
  readonly groundLiftCoefficient: number;
  /** effective: on the whole weight, share of the braked wheels included */
  readonly braking: BrakingFriction;
  /** of all running engines, forward positive [N] */
  readonly idleThrust: number;
  /** backwards in place of idle thrust [N], at and above a ground speed [m/s]; absent: not used */
  readonly reverseThrust?: { readonly thrust: number; readonly cutOffSpeed: number } | undefined;
  /** [kg/m3] */
  readonly density: number;
  /** along the runway [m/s], on the nose positive */
  readonly headwind: number;
  /** uphill positive, dimensionless; with a profile, of the whole line */
  readonly slope: number;
  /** the ground line from the threshold on, in place of every slope; absent: the slopes hold */
  readonly profile?: SlopeProfile | undefined;
  /** what a loose contaminant helps; absent: nothing */
  readonly contaminantDrag?: StoppingDrag | undefined;
  /**
   * the runway where it is not the same throughout, in rising order of their ends, the last going on beyond its end; absent: the
   * run's own braking, slope and contaminant throughout. The estimate goes by the run's own: those of the poorest stretch.
   */
  readonly stretches?: readonly BrakedStretch[] | undefined;
}

/** All that the integrations of a landing need, in SI, nothing assumed any more. */
export interface LandingRun extends BrakedRun {
  /** true airspeeds [m/s] at the screen and at touchdown */
  readonly referenceSpeed: number;
  readonly touchdownSpeed: number;
  /** to the runway's plane, down positive [rad] */
  readonly approachAngle: number;
  /** of the flare's arc, above 1 */
  readonly flareLoadFactor: number;
  /** [m]; 15.24 */
  readonly screenHeight: number;
  /** between touchdown and full braking [s] */
  readonly freeRollTime: number;
  /**
   * (D - T)/W in the float, about 0.12: an aeroplane nobody has fitted takes at least seven seconds to touch down and floats from
   * 0.96 of the reference speed; absent: the arc alone, for an aeroplane whose flare was fitted
   */
  readonly floatDecelerationRatio?: number | undefined;
}

/** What came of it: the distances, or the name of why there are none with the number that shows it. */
export type LandingResult =
  | {
      readonly outcome: 'stops';
      /** screen to touchdown, float included [m], [s] */
      readonly airDistance: number;
      readonly airTime: number;
      /** the part of it floated off [m], 0 where none */
      readonly floatDistance: number;
      /** which of the two readings of the air distance was the longer */
      readonly airDistanceFrom: 'arc' | 'seven-seconds';
      /** the flare's arc begins above the screen: the approach has no straight part */
      readonly flareAboveScreen: boolean;
      /** touchdown to full braking [m], [s] */
      readonly freeRoll: number;
      readonly freeRollTime: number;
      /** full braking to the stop [m], [s] */
      readonly brakedRoll: number;
      readonly brakedRollTime: number;
      readonly groundRoll: number;
      readonly landingDistance: number;
      /** least deceleration over g, dimensionless */
      readonly leastDecelerationRatio: number;
    }
  | {
      readonly outcome: 'never-stops';
      /** ground speed [m/s] at which the deceleration is first gone while slowing down, and the least over g */
      readonly atGroundSpeed: number;
      readonly leastDecelerationRatio: number;
    }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly touchdownSpeed: number };
