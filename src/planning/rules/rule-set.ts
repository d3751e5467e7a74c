import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { ReferenceKey } from '../../references.ts';
import type { Factor } from '../answer.ts';
import type { DeclaredDistances } from '../declared-distances.ts';
import type { Surface } from '../question.ts';

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

/** One comparison a rule asks for: a distance times its overall factor against one declared distance. */
export interface Requirement {
  readonly code: string;
  readonly of: 'groundRoll' | 'takeoffDistance' | 'landingDistance';
  readonly against: 'tora' | 'toda' | 'asda' | 'lda';
  /** the overall factor, applied once; absent: 1 without a word */
  readonly factor?: Factor;
  /** another reading of the same rule, shown beside the one that decides */
  readonly alternative?: { readonly factor: Factor; readonly because: string };
  /** the factor stands for a stop that the rule means to be on a dry or wet runway */
  readonly presumesDryOrWet?: true;
  readonly source: ReferenceKey;
}

/** What a rule set holds for takeoffs, or for landings. */
export interface PhaseRules {
  readonly source: ReferenceKey;
  /**
   * The distance that the set's surface and slope factors multiply. 'reference': credited wind on a paved, dry, level runway;
   * 'credited': the set has no such factors and physics on the actual runway stands alone.
   */
  readonly startsFrom: 'reference' | 'credited';
  /** factors of the surface and the slope on the reference distance; undefined where the set does not speak of the surface */
  readonly runwayFactors: (surface: Surface, slope: number) => readonly Factor[] | undefined;
  /** the comparisons, which may depend on which distances are declared */
  readonly requirements: (declared: DeclaredDistances) => readonly Requirement[];
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
  /** absent where the set asks for no clearance with all engines running */
  readonly obstacles?: ObstacleDemand;
}

/** A set of operating rules as figures with their sources; numbers somebody decided live in these files and nowhere else. */
export interface RuleSet {
  readonly id: string;
  readonly title: string;
  /** how a sentence names the set: 'under class B factors' */
  readonly phrase: string;
  readonly source: ReferenceKey;
  /** why the set does not speak of this aeroplane; undefined where it does */
  readonly doesNotApply: (aeroplane: Aeroplane) => string | undefined;
  readonly windCredit: WindCredit;
  readonly thinMargin: ThinMargin;
  readonly takeoff: TakeoffRules;
  readonly landing: PhaseRules;
}
