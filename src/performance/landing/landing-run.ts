/** All that the integrations of a landing need, in SI, nothing assumed any more. */
export interface LandingRun {
  /** [kg] */
  readonly mass: number;
  /** [m2], [m], [m] */
  readonly wingArea: number;
  readonly span: number;
  readonly wingHeight: number;
  /** K = 1/(pi A e) out of ground effect */
  readonly inducedDragFactor: number;
  /** zero-lift drag coefficient on the ground and in the air, flap, gear and spoilers included */
  readonly groundDragCoefficient: number;
  readonly airDragCoefficient: number;
  /** lift coefficient held in the roll */
  readonly groundLiftCoefficient: number;
  /** [kg/m3] */
  readonly density: number;
  /** along the runway [m/s], on the nose positive */
  readonly headwind: number;
  /** uphill positive, dimensionless */
  readonly slope: number;
  /** true airspeeds over the screen and at touchdown [m/s] */
  readonly referenceSpeed: number;
  readonly touchdownSpeed: number;
  /** [m] */
  readonly screenHeight: number;
  /** approach path below the horizon, in the air and against the runway plane [rad] */
  readonly approachAngle: number;
  /** load factor of the flare, above 1 */
  readonly flareLoadFactor: number;
  /** how the air distance is taken: the arc alone (a fitted aeroplane), or the longer of arc and seven seconds, and the float */
  readonly airMethod: 'arc' | 'unfitted';
  /** (D - T)/W while floating, dimensionless; used by 'unfitted' */
  readonly floatDeceleration: number;
  /** touchdown to brakes [s] */
  readonly freeRollTime: number;
  /** effective braking friction of the braked wheels against ground speed [m/s], load factor and anti-skid included */
  readonly brakingFriction: (groundSpeed: number) => number;
  /** ground speeds at which that friction or the reverse thrust jumps [m/s] */
  readonly brakingKinks: readonly number[];
  /** thrust of the whole aeroplane in the roll against ground speed [N]: idle positive, reverse negative */
  readonly rollThrust: (groundSpeed: number) => number;
}

/** What came of it: the distances, or the name of why there are none with the number that shows it. */
export type LandingResult =
  | {
      readonly outcome: 'stops';
      /** screen to touchdown: straight approach and flare, and the float on top [m], [s] */
      readonly airDistance: number;
      readonly floatDistance: number;
      readonly airTime: number;
      readonly freeRoll: number;
      readonly brakedRoll: number;
      readonly brakedRollTime: number;
      /** free and braked roll together */
      readonly groundRoll: number;
      readonly landingDistance: number;
      /** least deceleration over g while braking */
      readonly leastDecelerationRatio: number;
      /** true where the flare would begin above the screen */
      readonly flareAboveScreen: boolean;
    }
  | { readonly outcome: 'never-stops'; readonly atGroundSpeed: number; readonly leastDecelerationRatio: number }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly touchdownSpeed: number };
