import type { ManualFigures } from '../performance/flight-manual/manual-figures.ts';
import type { ReferenceKey } from '../references.ts';
import type { Direction, Kind } from '../units/presentation.ts';
import type { Detail } from './detail/detail.ts';
import type { DecisionSpeed, EngineOut } from './engine-failure/engine-failure-answer.ts';
import type { Silence } from './manual/silence.ts';

/**
 * An answer in SI, as planning hands it to the contract's gate out. Sentences are already in the asked units; numbers are
 * not: the gate converts and rounds them.
 */
export const outcomes = [
  'enough',
  'enough-but-thin',
  'not-enough',
  'nothing-to-compare',
  'never-reaches-lift-off-speed',
  'never-reaches-screen-height',
  'never-stops',
  'roll-longer-than-runway',
  'outside-flight-manual',
  'outside-stated-data',
  'no-data-for-this-surface',
  'rule-set-does-not-apply',
  'single-engine-cannot-continue',
  'no-decision-speed',
  'ground-speed-not-positive',
] as const;
export type Outcome = (typeof outcomes)[number];

/** A number with what it is; the gate out turns it into a quantity. */
export interface Measure {
  readonly kind: Kind;
  readonly value: number;
  /** which way it may be rounded; absent: to the nearest step */
  readonly direction?: Direction;
}

export type Severity = 'note' | 'caution' | 'strong';

export interface Caution {
  readonly code: string;
  readonly severity: Severity;
  readonly message: string;
  /** pointer into the request */
  readonly at?: string | undefined;
  readonly value?: Measure | number | undefined;
  readonly threshold?: Measure | number | undefined;
  readonly source?: ReferenceKey | undefined;
}

export interface Air {
  readonly temperature: number;
  /** from the standard temperature at the pressure altitude [K] */
  readonly temperatureDeviation: number;
  readonly pressure: number;
  readonly pressureAltitude: number;
  readonly density: number;
  readonly densityRatio: number;
  readonly densityAltitude: number;
  readonly dewPoint?: number;
  readonly relativeHumidity?: number;
}

export interface WindComponents {
  /** on the nose positive [m/s] */
  readonly headwind: number;
  /** size of the crosswind [m/s]; absent where it was not given */
  readonly crosswind?: number;
  readonly crosswindFrom?: 'left' | 'right';
  /** what the rule set lets be taken into account [m/s] */
  readonly creditedHeadwind: number;
}

/** One speed in its kinds [m/s]. */
export interface SpeedSet {
  readonly cas: number;
  readonly eas: number;
  readonly tas: number;
  readonly ias?: number;
  readonly stallRatio: number;
}

export type Method = 'flight-manual' | 'fitted' | 'stated' | 'geometry';

export interface BandedDistance {
  readonly value: number;
  /** 90 % band [m] */
  readonly low: number;
  readonly high: number;
  readonly method: Method;
  /** the sheet of the flight manual whose edge stands for what lies beyond it */
  readonly edge?: string | undefined;
}

export interface Factor {
  readonly code: string;
  readonly value: number;
  readonly because: string;
  readonly source: ReferenceKey;
  readonly status: string;
  /** the rule says 'or more': the factor alone cannot show that a length is enough */
  readonly atLeast?: true;
}

/** The distance that the factors of a check multiply; 'level' is 'credited' where a slope that helps earns nothing. */
export type StartsFrom = 'reference' | 'credited' | 'level' | 'flight-manual';

/** A reading of a rule that is shown and does not decide. */
export interface AlternativeReading {
  readonly startsFrom: StartsFrom;
  readonly distance: number;
  readonly factors: readonly Factor[];
  readonly required: number;
  readonly because: string;
}

export interface Check {
  readonly code: string;
  /** what is compared: 'groundRoll', 'takeoffDistance', 'landingDistance' ... */
  readonly of: string;
  /** the declared distance it is compared with; absent for a check that is not of a distance */
  readonly against?: 'tora' | 'toda' | 'asda' | 'lda';
  /** absent for a check that is not of a distance */
  readonly startsFrom?: StartsFrom;
  /** the distance before factors [m], where one exists */
  readonly distance?: number;
  readonly factors: readonly Factor[];
  /** another reading, shown and not chosen: the rule's own before the one of factors or physics that was not taken */
  readonly alternative?: AlternativeReading | undefined;
  readonly furtherAlternatives?: readonly AlternativeReading[];
  readonly unit: Kind;
  readonly required?: number;
  readonly available?: number | undefined;
  readonly margin?: number | undefined;
  /** margin as per cent of required, a ratio here: 0.1 is 10 % */
  readonly marginRatio?: number | undefined;
  readonly result: 'passes' | 'fails' | 'not-assessed';
  readonly why?: string | undefined;
  readonly source: ReferenceKey;
}

export interface Assumption {
  readonly at: string;
  readonly value: Measure | number | string;
  readonly because: string;
  /** change of the stated total distance, as a ratio, when the other end of the plausible range is taken instead */
  readonly effectRatio?: number;
  readonly source?: ReferenceKey;
}

/** Why there are no distances, in numbers. */
export interface Shortfall {
  readonly at: string;
  readonly axis?: string;
  readonly table?: string;
  readonly given: Measure | number;
  readonly bound: Measure | number;
  readonly side: 'above' | 'below';
}

/** What one input adds to the bands: the share by which each distance moves when it is one standard deviation less favourable. */
export interface BandContribution {
  readonly of: string;
  readonly groundRoll: number;
  readonly airDistance: number;
  /** the takeoff or landing distance */
  readonly wholeDistance: number;
}

export interface Basis {
  readonly method: Method;
  /** the whole distance by the method that was not taken, where it has one [m] */
  readonly other?: OtherMethod | undefined;
  /** what was read in the flight manual */
  readonly flightManual?: ManualUse | undefined;
  /** absent where there are no distances */
  readonly band?: readonly BandContribution[] | undefined;
  readonly assumed: readonly Assumption[];
  readonly notGiven: readonly string[];
  readonly sources: readonly ReferenceKey[];
}

/** The takeoff or landing distance by another method, and over the one taken. */
export interface OtherMethod {
  readonly method: Method;
  readonly distance: number;
  readonly ratio: number;
  /** of the ground rolls */
  readonly rollRatio: number;
}

/** What an answer took from the flight manual. */
export interface ManualUse {
  readonly document: string;
  readonly revision: string;
  readonly figures: ManualFigures;
  /** what it does not speak of, by whose physics its figures are carried */
  readonly silences: readonly Silence[];
}

/** What the answers to a takeoff and to a landing share. */
export interface Answer {
  readonly outcome: Outcome;
  readonly sentence: string;
  readonly cautions: readonly Caution[];
  readonly air: Air;
  readonly wind: WindComponents;
  readonly assessment?:
    | {
        readonly ruleSet: string;
        /** id of the set that an operator's own rules are based on */
        readonly basedOn?: string | undefined;
        readonly checks: readonly Check[];
        /** code of the governing check */
        readonly governing?: string | undefined;
      }
    | undefined;
  readonly shortfall?: readonly Shortfall[] | undefined;
  /** what was asked for beyond that */
  readonly detail?: Detail;
  readonly basis: Basis;
}

/** Distances without factors, all engines running, each with its band [m]; times [s]. */
export interface Distances {
  readonly screenHeight: number;
  readonly groundRoll: BandedDistance;
  readonly airDistance: BandedDistance;
  /** absent where the flight manual gives a distance and physics none */
  readonly groundRollTime?: number | undefined;
  readonly airTime?: number | undefined;
}

/** A climb with all engines. */
export interface ClimbFigures {
  /** height over distance in still air, below 0 where the aeroplane sinks */
  readonly gradient: number;
  /** [m/s] */
  readonly rate: number;
  readonly method: Method;
}

/** The climb after takeoff: all engines, flap and gear as at the screen, at the screen speed, out of ground effect. */
export type TakeoffClimb = ClimbFigures;

/** One obstacle and the path above it [m], heights above the runway where the distances are measured from. */
export interface ObstacleCleared {
  readonly distance: number;
  readonly height: number;
  readonly pathHeight: number;
  readonly clearance: number;
}

/** The path past the obstacles; the critical one has the least clearance. */
export type ObstaclePath =
  | {
      readonly outcome: 'climbs';
      /** where the path begins: distance from brake release [m] and what it is */
      readonly begins: number;
      readonly because: string;
      readonly obstacles: readonly ObstacleCleared[];
      /** place of the critical one in the list */
      readonly critical: number;
    }
  | { readonly outcome: 'does-not-climb'; readonly atHeight: number; readonly gradient: number }
  | {
      readonly outcome: 'outside-stated-data';
      /** true airspeed at which the thrust is asked for, and where its data end [m/s] */
      readonly airspeed: number;
      readonly bound: number;
    };

export interface TakeoffAnswer extends Answer {
  readonly speeds: {
    readonly stall: SpeedSet;
    readonly rotation: SpeedSet;
    readonly liftOff: SpeedSet;
    readonly screen: SpeedSet;
    /** with more than one engine, where there is one */
    readonly decision?: DecisionSpeed | undefined;
  };
  readonly distances?: (Distances & { readonly takeoffDistance: BandedDistance }) | undefined;
  /** absent where the airspeed lies outside measured thrust */
  readonly climb?: TakeoffClimb | undefined;
  /** with more than one engine, where there are distances by physics */
  readonly engineOut?: EngineOut | undefined;
  /** absent where no obstacle was given or there are no distances */
  readonly obstaclePath?: ObstaclePath | undefined;
}

/** The climb after a balked landing: all engines at full power, in the landing configuration, at the landing reference speed. */
export type BalkedLanding =
  | ({ readonly outcome: 'computed' } & ClimbFigures)
  | {
      readonly outcome: 'outside-stated-data';
      /** true airspeed at which the thrust is asked for, and where its data end [m/s] */
      readonly airspeed: number;
      readonly bound: number;
    };

export interface LandingAnswer extends Answer {
  readonly speeds: {
    readonly stall: SpeedSet;
    readonly landingReference: SpeedSet;
    readonly touchdown: SpeedSet;
  };
  readonly distances?: (Distances & { readonly landingDistance: BandedDistance }) | undefined;
  readonly balkedLanding: BalkedLanding;
}
