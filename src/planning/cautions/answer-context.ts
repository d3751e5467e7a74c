import type { Air } from '../../performance/air.ts';
import type { Kind } from '../../units/presentation.ts';
import type { BandedDistance, Check, Factor, Outcome, SpeedSet } from '../answer.ts';
import type { AnyAssumed } from '../assumed.ts';
import type { DeclaredDistances } from '../declared-distances.ts';
import type { Found } from '../found.ts';
import type { ThinBecause } from '../outcome.ts';
import type { Question } from '../question.ts';
import type { PhaseRules, RuleSet } from '../rules/rule-set.ts';
import type { RunwayCondition } from '../runway-condition.ts';
import { measureText } from '../sentences/measure-text.ts';
import type { WindAlong } from '../wind-along.ts';

/** What the cautions of any answer may look at. */
export interface ConditionsContext {
  readonly question: Question;
  readonly air: Air;
  readonly wind: WindAlong;
}

/** What the cautions of a takeoff and of a landing may look at alike. */
export interface AnswerContext extends ConditionsContext {
  readonly phase: 'takeoff' | 'landing';
  readonly ruleSet: RuleSet;
  /** of this phase and stage */
  readonly rules: PhaseRules;
  /** on the reference distance; undefined where the rules do not speak of the aeroplane or of the surface */
  readonly runwayFactors: readonly Factor[] | undefined;
  readonly declared: DeclaredDistances;
  /** the surface in words: 'short wet grass' */
  readonly surface: string;
  /** why physics does not speak of it, where more can be said than that */
  readonly noData: string | undefined;
  readonly condition: RunwayCondition;
  /** why the rule set does not speak of the aeroplane */
  readonly doesNotApply: string | undefined;
  readonly outcome: Outcome;
  readonly checks: readonly Check[];
  readonly governing: Check | undefined;
  readonly thin: ThinBecause | undefined;
  readonly assumed: readonly AnyAssumed[];
  /** the method of the distances, and what stands beside them */
  readonly found: Pick<Found<unknown>, 'method' | 'flightManual' | 'outside' | 'noSheet' | 'unscaled' | 'other'>;
  /** the speed at which the wheels leave or meet the runway */
  readonly wheelSpeed: SpeedSet;
  /** the ground roll as stated, without factors, and what it would be in still air [m]; undefined where there is none */
  readonly roll: number | undefined;
  readonly rollInStillAir: () => number | undefined;
  /** the length that the roll has [m] */
  readonly rollAvailable: number | undefined;
  /** takeoff or landing distance as stated */
  readonly wholeDistance: BandedDistance | undefined;
}

/** What a text needs of a question: the units it is written in. */
export interface Written {
  readonly question: Pick<Question, 'units'>;
}

/** A number in the units of the question, as a caution writes it; distances go up. */
export function textIn({ question }: Written, kind: Kind, si: number): string {
  return measureText(question.units, kind, si, kind === 'distance' ? 'up' : 'nearest');
}

/** A length that is available or spare, as a caution writes it: it goes down. */
export function measureDown({ question }: Written, si: number): string {
  return measureText(question.units, 'distance', si, 'down');
}
