import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { RunwayConditionCode } from '../../physics/runway-condition-code.ts';
import type { ReferenceKey } from '../../references.ts';
import type { Factor } from '../answer.ts';
import type { Lengths } from '../declared-distances.ts';
import type { Surface } from '../question.ts';

/** When a question is asked: before departure, or in flight for the runway as it will be on arrival. */
export type Stage = 'dispatch' | 'in-flight';

/** What rules look at of an aeroplane. */
export type RuledAeroplane = Pick<Aeroplane, 'category' | 'engines' | 'certification' | 'masses' | 'passengerSeats'>;

/** What decides which figures of a rule set count. */
export interface Asked {
  readonly aeroplane: RuledAeroplane;
  /** a film of a contaminant read as wet */
  readonly surface: Surface;
  /** neither dry nor wet: contaminated, or medium to poor and worse */
  readonly isSlippery: boolean;
  /** the worst along the runway; undefined where there is none */
  readonly conditionCode: RunwayConditionCode | undefined;
  /** uphill positive in the direction of movement */
  readonly slope: number;
  /** the declared distances as published from the start point [m] */
  readonly published: Lengths;
  /** whether reverse thrust is used in the landing roll */
  readonly reverse: boolean;
}

/** Something an aeroplane must be for a rule set to speak of it. */
export interface Applicability {
  /** where it is not met, this is why: 'class B is for propeller-driven aeroplanes' */
  readonly because: string;
  readonly holds: (aeroplane: RuledAeroplane) => boolean;
  /** what is taken of the number of passenger seats, in words, where the aeroplane does not state it and it would decide */
  readonly taken?: (aeroplane: RuledAeroplane) => string | undefined;
  readonly source: ReferenceKey;
}

/** What a rule set lets be taken into account of the wind along the runway, as multiples of the component. */
export interface WindCredit {
  readonly headwind: number;
  readonly tailwind: number;
  readonly because: string;
  readonly source: ReferenceKey;
}

/** A margin over what is required below which an answer is thin. */
export interface ThinMargin {
  readonly ratio: number;
  readonly because: string;
  readonly source: ReferenceKey;
}

/** The factors of one kind of surface on the reference distance: credited wind; paved, dry, level. */
export interface SurfaceRule {
  /** the surface in words */
  readonly when: string;
  readonly holds: (asked: Asked) => boolean;
  readonly factors: readonly Factor[];
}

/** What a slope the unfavourable way adds to the reference distance; the other way earns nothing, by physics neither. */
export interface SlopeRule {
  readonly unfavourable: 'uphill' | 'downhill';
  /** the factor for a slope of `step`, a ratio */
  readonly factor: Factor;
  readonly step: number;
  /** between and beyond steps: 1 + (F - 1) x, or the larger of that and F^x */
  readonly growth: 'linear' | 'larger-of-linear-and-compound';
}

/** One comparison a rule asks for: a distance times its overall factor against one declared distance. */
export interface Requirement {
  readonly code: string;
  /** 'takeoffRun' and 'engineOutTakeoffRun' end in the middle between lift-off and the screen */
  readonly of:
    | 'groundRoll'
    | 'takeoffRun'
    | 'takeoffDistance'
    | 'accelerateStopDistance'
    | 'accelerateStopAllEngines'
    | 'accelerateStopEngineOut'
    | 'accelerateGoDistance'
    | 'engineOutTakeoffRun'
    | 'landingDistance';
  readonly against: 'tora' | 'toda' | 'asda' | 'lda';
  /** the overall factor, applied once; absent: 1 without a word */
  readonly factor?: Factor;
  /** the overall factor on the distance on the runway as it is, where it is another one */
  readonly onRunway?: Factor;
  /**
   * Where physics speaks of the runway as it is, that decides, and the factors on the reference stand beside it for this reason;
   * absent: the longer decides.
   */
  readonly runwayDecides?: string;
  /** other readings of the same rule, shown beside the one that decides; each factor stands in place of the one with its code */
  readonly alternatives?: readonly { readonly factor: Factor; readonly because: string }[];
  /** why the rule's own distance is not there to be compared */
  readonly notAssessed?: string;
  /** the factor stands for a stop too, which the rule means to be on a dry or wet runway */
  readonly presumesDryOrWet?: true;
  readonly source: ReferenceKey;
}

/** The comparisons that a rule asks for in one case. */
export interface Reading {
  /** the case in words */
  readonly when: string;
  readonly holds: (asked: Asked) => boolean;
  readonly requirements: readonly Requirement[];
}

/** A figure of the rules that no answer uses, with the reason. */
export interface NotApplied {
  readonly factor: Factor;
  readonly why: string;
}

/** What a set asks of the climb, as a gradient at one place of it. */
export interface ClimbDemand {
  /** stable name of the check: 'climb-all-engines' */
  readonly code: string;
  /** after takeoff, on the approach, or after a balked landing */
  readonly of: 'takeoff' | 'approach' | 'balked-landing';
  readonly engines: 'all' | 'one-out';
  /** height over distance, at least; 0 with `positive`: any climb at all is enough */
  readonly gradient: number;
  readonly positive?: true;
  /** height above the runway at which it is to be had [m]; absent: at the screen, or on the runway's level */
  readonly atHeight?: number;
  /** flap, gear, power and speed, in words */
  readonly configuration: string;
  readonly appliesTo: (aeroplane: RuledAeroplane) => boolean;
  /** to whom, in words */
  readonly when: string;
  readonly source: ReferenceKey;
  readonly status: string;
}

/** What a rule set holds for takeoffs, or for landings at one stage. */
export interface PhaseRules {
  readonly source: ReferenceKey;
  /** the stage the figures are of; absent: the set does not tell stages apart */
  readonly stage?: Stage;
  readonly windCredit: WindCredit;
  /** beyond what the set itself asks of an aeroplane */
  readonly appliesTo?: readonly Applicability[];
  /**
   * The first that holds counts; where none does, the set does not speak of the surface and physics on the actual runway stands
   * alone.
   */
  readonly surfaces: readonly SurfaceRule[];
  readonly slope?: SlopeRule;
  /** the first that holds counts, and one must */
  readonly readings: readonly Reading[];
  /** what is asked of the climb */
  readonly demands?: readonly ClimbDemand[];
  readonly notApplied?: readonly NotApplied[];
}

/** What a set asks of the path past obstacles. */
export interface ObstacleDemand {
  readonly code: string;
  /** vertical, over every obstacle [m] */
  readonly clearance: number;
  /** where the path begins at the screen height: at the end of the distance that the set requires, or of the one computed */
  readonly begins: 'required-distance' | 'computed-distance';
  readonly because: string;
  readonly appliesTo: (aeroplane: Aeroplane) => boolean;
  readonly source: ReferenceKey;
}

/** The takeoff side of a rule set. */
export interface TakeoffRules extends PhaseRules {
  /** the most that counts of a clearway, over the run */
  readonly clearwayShare: number;
  /** what it means where no clearway or stopway is declared */
  readonly nothingBeyond: string;
  /** absent where the set asks for no clearance with all engines running */
  readonly obstacles?: ObstacleDemand;
}

export type Operation = 'commercial' | 'private';

/** A set of operating rules as figures with their sources; numbers somebody decided live in these files and nowhere else. */
export interface RuleSet {
  readonly id: string;
  readonly title: string;
  /** how a sentence names the set: 'under class B factors' */
  readonly phrase: string;
  readonly source: ReferenceKey;
  /** whose flights the rules are for */
  readonly operations: readonly Operation[];
  /** all of it must hold */
  readonly appliesTo: readonly Applicability[];
  readonly thinMargin: ThinMargin;
  readonly takeoff: TakeoffRules;
  readonly landing: PhaseRules;
  /** where the rule knows both stages: the one in flight */
  readonly landingInFlight?: PhaseRules;
}
