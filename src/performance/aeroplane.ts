import type { Fit } from './fit/fit.ts';
import type { FlightManual } from './flight-manual/flight-manual.ts';

/**
 * An aeroplane's definition in SI: the same members as the JSON of the contract, bare numbers.
 *
 * Lengths m, areas m2, masses kg, speeds m/s, forces N, powers W, temperature differences K, angles rad, times s.
 * A member that may be absent is absent, never zero: what a method then assumes is said by whoever assumes it.
 */
export const categories = [
  'single-piston',
  'single-electric',
  'single-turboprop',
  'single-jet',
  'twin-piston',
  'twin-electric',
  'twin-turboprop',
  'twin-jet',
] as const;
export type Category = (typeof categories)[number];

export const certificationBases = ['cs-23-amendment-4', 'cs-23-commuter', 'cs-25', 'none'] as const;
export type CertificationBasis = (typeof certificationBases)[number];

/** Of the rules for a rejected takeoff of the transport category: that in force since amendment 25-92 of 1998, or the one before it. */
export const stopRules = ['current', 'before-1998'] as const;
export type StopRule = (typeof stopRules)[number];

export interface Aeroplane {
  readonly id: string;
  readonly revision: string;
  readonly name: string;
  readonly category: Category;
  readonly engines: number;
  /** the most passengers it is operated with; rules decide by it */
  readonly passengerSeats?: number;
  readonly certification: {
    readonly basis: CertificationBasis;
    readonly screenHeight: number;
    /** by which rule its accelerate-stop distances were found; transport category alone */
    readonly stopRule?: StopRule;
  };
  readonly masses: { readonly empty?: number; readonly maximumTakeoff: number; readonly maximumLanding?: number };
  readonly wing: Wing;
  readonly drag: { readonly zeroLiftCoefficient: number; readonly oswaldFactor: number };
  readonly configurations: Readonly<Record<string, Configuration>>;
  readonly propulsion: Propulsion;
  readonly wheels?: {
    readonly arrangement?: WheelArrangement;
    readonly tyrePressure?: number;
    readonly tyreSpeedLimit?: number;
    /** how many roll through what lies on the runway */
    readonly tyres?: number;
    readonly maximumTyreWidth?: number;
    readonly tyreDeflection?: number;
    /** fuselage behind the wheels that their spray wets [m] */
    readonly sprayLength?: number;
  };
  readonly brakes?: {
    readonly brakingFrictionCoefficient?: number;
    readonly loadFactor?: number;
    readonly antiSkid?: AntiSkid;
    readonly energyLimit?: number;
  };
  /** ground spoilers, out with the brakes in a rejected takeoff */
  readonly spoilers?: { readonly dragIncrementCoefficient: number };
  /** of the whole aeroplane, backwards [N], above a ground speed [m/s] */
  readonly reverseThrust?: { readonly thrust: number; readonly cutOffSpeed: number };
  readonly engineOut?: {
    readonly vmc?: number;
    readonly vmcg?: number;
    readonly dragIncrementCoefficient?: number;
    readonly propeller?: 'feathered' | 'windmilling' | 'stopped';
    /** the climb of an approach with one engine out: flap of a configuration, gear up */
    readonly approach?: {
      readonly configuration: string;
      readonly airDragIncrementCoefficient: number;
      /** over the stall speed of that configuration */
      readonly stallRatio?: number;
    };
  };
  readonly limitations?: {
    readonly demonstratedCrosswind?: number;
    readonly crosswind?: number;
    readonly tailwind?: number;
    readonly maximumTemperature?: number;
    readonly maximumPressureAltitude?: number;
  };
  readonly airspeedCalibration?: AirspeedCalibration;
  /** the manual's own figures, as printed */
  readonly flightManual?: FlightManual;
  /** what its physics was fitted to */
  readonly fit?: Fit;
}

export const antiSkids = ['none', 'on-off', 'quasi-modulating', 'fully-modulating'] as const;
export type AntiSkid = (typeof antiSkids)[number];

export const wheelArrangements = ['tricycle', 'tailwheel'] as const;
export type WheelArrangement = (typeof wheelArrangements)[number];

export interface Wing {
  readonly area: number;
  readonly span: number;
  /** quarter-chord of the mean chord above the runway [m] */
  readonly heightAboveGround: number;
  readonly taperRatio?: number;
  readonly sweep?: number;
}

/** Indicated and calibrated airspeed pairs [m/s], both rising. */
export interface AirspeedCalibration {
  readonly indicated: readonly number[];
  readonly calibrated: readonly number[];
}

/** A speed of the procedure: a ratio to the stall speed, or a calibrated airspeed at a mass. */
export type ScheduledSpeed =
  | { readonly kind: 'stall-ratio'; readonly ratio: number }
  | { readonly kind: 'cas'; readonly cas: number; readonly mass: number };

export type MaximumLift =
  | { readonly kind: 'coefficient'; readonly coefficient: number }
  | {
      readonly kind: 'stall-speed';
      readonly cas: number;
      readonly mass: number;
      /** 'minimum' is the older minimum speed in the manoeuvre, about 0.94 of the 1-g stall speed */
      readonly definition: 'one-g' | 'minimum';
    };

export interface Configuration {
  readonly for: readonly ('takeoff' | 'landing')[];
  /** flap deflection [rad] */
  readonly flap: number;
  readonly maximumLift: MaximumLift;
  readonly groundDragIncrementCoefficient?: number;
  readonly airDragIncrementCoefficient?: number;
  readonly groundLiftCoefficient?: number;
  readonly speeds?: {
    readonly rotation?: ScheduledSpeed;
    readonly liftOff?: ScheduledSpeed;
    readonly screen?: ScheduledSpeed;
    /** of a takeoff continued after an engine failure */
    readonly engineOutLiftOff?: ScheduledSpeed;
    readonly engineOutScreen?: ScheduledSpeed;
    readonly landingReference?: ScheduledSpeed;
    readonly touchdown?: ScheduledSpeed;
  };
  /** drag increments after the screen as gear and flap come up, each from a height above the runway on [m] */
  readonly climbOut?: readonly { readonly from: number; readonly airDragIncrementCoefficient: number }[];
  readonly rotationTime?: number;
  readonly pullUpLoadFactor?: number;
  /** what a rolling start takes over one from standing at full power [m] */
  readonly rollingStartAllowance?: number;
  readonly approachAngle?: number;
  readonly flareLoadFactor?: number;
  /** the approach angle holds the flare as it was fitted: the air distance is the arc alone, without float */
  readonly flareFitted?: boolean;
  /** (D - T)/W while floating */
  readonly floatDecelerationRatio?: number;
  readonly freeRollTime?: number;
  readonly idleThrust?: number;
}

/** How power or static thrust falls with altitude, temperature and moisture (members absent take the kind's defaults). */
export interface Lapse {
  readonly altitudeLapseCoefficient?: number;
  readonly temperatureExponent?: number;
  readonly humidityFactor?: number;
  readonly thrustFactor?: number;
}

/** Power, static thrust and measured thrust are of one engine. */
export type Propulsion = FixedPitch | ConstantSpeed | Turboprop | Jet | Electric | MeasuredThrust;

/** A setting below full power that the flight manual has figures for. */
export interface PowerSetting {
  /** of full power, or of full thrust where the definition gives thrust; at every altitude and temperature */
  readonly fullPowerRatio: number;
}

/** Settings by id; full power needs none. */
export interface PowerSettings {
  readonly powerSettings?: Readonly<Record<string, PowerSetting>>;
}

export interface FixedPitch extends Lapse, PowerSettings {
  readonly kind: 'fixed-pitch';
  readonly staticThrust: number;
  readonly propellerDiameter: number;
  /** |b| of the linear propeller polar; absent: 0.056 */
  readonly polarSlopeCoefficient?: number;
}
export interface Disc extends PowerSettings {
  readonly propellerDiameter: number;
  readonly profileFactor?: number;
  readonly inducedFactor?: number;
  /** a known static thrust of one engine caps the disc's [N] */
  readonly staticThrust?: number;
}
export interface ConstantSpeed extends Lapse, Disc {
  readonly kind: 'constant-speed';
  readonly power: number;
  readonly criticalAltitude?: number;
}
export interface Turboprop extends Disc {
  readonly kind: 'turboprop';
  readonly power: number;
  readonly flatRating?: number;
  readonly lapseExponent?: number;
  readonly thrustFactor?: number;
}
export interface Jet extends PowerSettings {
  readonly kind: 'jet';
  readonly staticThrust: number;
  readonly flatRating?: number;
  readonly bypassRatio?: number;
  readonly thrustFactor?: number;
}
export interface Electric extends Disc {
  readonly kind: 'electric';
  readonly power: number;
  readonly thrustFactor?: number;
}
export interface MeasuredThrust extends PowerSettings {
  readonly kind: 'measured';
  /** true airspeeds [m/s], rising, and the thrust of one engine at each [N] */
  readonly airspeeds: readonly number[];
  readonly thrusts: readonly number[];
  /** the density at which it was measured [kg/m3] */
  readonly density: number;
  readonly densityExponent: number;
  readonly thrustFactor?: number;
}
