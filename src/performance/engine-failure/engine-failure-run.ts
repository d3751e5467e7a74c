import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { BrakedRun } from '../landing/landing-run.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';

/** All that the integrations of a takeoff with an engine failure need, in SI, nothing assumed any more. */
export interface EngineFailureRun {
  /** with all engines: up to the failure, and of the stop without one; its screen is that of the all-engines path */
  readonly allEngines: TakeoffRun;
  /** of the engines that still run */
  readonly remainingThrust: Thrust;
  /** drag coefficient that the dead engine and the rudder add, from the failure to the stop or the screen; in no other figure here */
  readonly dragIncrementCoefficient: number;
  /** true airspeeds of the continued takeoff [m/s], rotation at or below lift-off */
  readonly rotationSpeed: number;
  readonly liftOffSpeed: number;
  readonly screenSpeed: number;
  /** of the continued takeoff [m]: 35 ft, 15 ft on a wet runway, 50 ft for light twins */
  readonly screenHeight: number;
  /**
   * the wheels braked, spoilers out: what slows the aeroplane down, with the idle and reverse thrust of the engines that still run;
   * its profile and stretches are measured from brake release
   */
  readonly stop: BrakedRun;
  /** of all engines, for the stop without a failure [N]: idle thrust, and reverse thrust where the stop has it, absent: the stop's own */
  readonly idleThrustAllEngines: number;
  readonly reverseThrustAllEngines?: number | undefined;
  readonly timeline: StopTimeline;
}

/** When what is done in a stop [s]; every one a parameter that an answer states. */
export interface StopTimeline {
  /** failure to V1, the pilot's first action: the engines that remain go on accelerating */
  readonly recognitionTime: number;
  /** as a distance at constant V1: 2 s of the current rule, 0 of the older one and of the advisory for light aeroplanes */
  readonly timeAtDecisionSpeed: number;
  /** of going on accelerating after V1, with one engine out or with all: 2 s of the rule before 1998, else 0 */
  readonly continuedAccelerationTime: number;
  /** at the speed then reached, until brakes, idle and spoilers are all effective: 1 s light, 2 s transport */
  readonly transitionTime: number;
}

/** Where the wheels stand and the speed has gone [m], [s], true airspeeds [m/s]. */
export type AccelerateStop =
  | {
      readonly outcome: 'stops';
      readonly distance: number;
      readonly time: number;
      readonly failureSpeed: number;
      /** the greatest speed, from which it brakes */
      readonly brakingSpeed: number;
      /** which of the two stops is the longer */
      readonly longer: 'engine-failure' | 'all-engines';
      readonly engineFailureDistance: number;
      readonly allEnginesDistance: number;
      /** heat of the brakes: work of the wheels' friction in the stop of the two that heats them more [J] */
      readonly brakeEnergy: number;
    }
  | {
      readonly outcome: 'never-reaches-decision-speed';
      readonly atAirspeed: number;
      readonly leastAccelerationRatio: number;
    }
  | { readonly outcome: 'never-stops'; readonly atGroundSpeed: number; readonly leastDecelerationRatio: number }
  | { readonly outcome: 'outside-stated-data'; readonly airspeed: number; readonly bound: number };

/** The continued takeoff [m], [s]; least of the acceleration over g on the roll, or of the climb gradient. */
export type AccelerateGo =
  | {
      readonly outcome: 'reaches-screen';
      readonly distance: number;
      readonly time: number;
      readonly failureSpeed: number;
      /** brake release to lift-off */
      readonly groundRoll: number;
      readonly airDistance: number;
      readonly leastClimbGradient: number;
    }
  | { readonly outcome: 'single-engine-cannot-continue'; readonly because: 'roll' | 'climb'; readonly least: number }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly speed: number }
  | { readonly outcome: 'outside-stated-data'; readonly airspeed: number; readonly bound: number };

/** A bound of the decision speed and what sets it. */
export interface DecisionBound {
  /** true airspeed [m/s] */
  readonly speed: number;
  readonly because:
    | 'minimum-control-speed-on-the-ground'
    | 'failure-at-standstill'
    | 'rotation-speed'
    | 'brake-energy'
    | 'tyre-speed'
    | 'takeoff-distance-available'
    | 'accelerate-stop-distance-available'
    | 'asked-for';
}

/** The speeds between which V1 is looked for. */
export interface DecisionBounds {
  readonly lowest: DecisionBound;
  readonly highest: DecisionBound;
}

/** Stop and go as long as each other, or the named case in which they never are. */
export type BalancedField =
  | {
      readonly outcome: 'balanced' | 'go-longer-throughout' | 'stop-longer-throughout';
      /** V1, true airspeed [m/s] */
      readonly speed: number;
      /** the greater of stop and go there [m] */
      readonly length: number;
      readonly stop: number;
      readonly go: number;
    }
  | Exclude<AccelerateGo, { outcome: 'reaches-screen' }>
  | Exclude<AccelerateStop, { outcome: 'stops' }>
  | { readonly outcome: 'no-decision-speed'; readonly bounds: DecisionBounds };
