import type { Air } from '../../performance/air.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import type { Kind } from '../../units/presentation.ts';
import type { Check, Outcome, TakeoffAnswer } from '../answer.ts';
import type { Assumed } from '../assumed.ts';
import type { DeclaredDistances } from '../declared-distances.ts';
import type { ThinBecause } from '../outcome.ts';
import type { Question } from '../question.ts';
import type { RuleSet } from '../rules/rule-set.ts';
import { measureText } from '../sentences/measure-text.ts';
import type { Reached, TakeoffRuns } from '../takeoff-runs.ts';
import type { WindAlong } from '../wind-along.ts';

/** What the cautions of any answer may look at. */
export interface ConditionsContext {
  readonly question: Question;
  readonly air: Air;
  readonly wind: WindAlong;
}

/** What the cautions of a takeoff may look at. */
export interface TakeoffContext extends ConditionsContext {
  readonly ruleSet: RuleSet;
  readonly speeds: TakeoffAnswer['speeds'];
  readonly declared: DeclaredDistances;
  readonly outcome: Outcome;
  readonly runs: TakeoffRuns;
  /** the surface in words: 'short wet grass' */
  readonly surface: string;
  /** why the rule set does not speak of the aeroplane */
  readonly doesNotApply: string | undefined;
  readonly checks: readonly Check[];
  readonly governing: Check | undefined;
  readonly thin: ThinBecause | undefined;
  /** the run as stated and what came of it, where physics speaks of the surface and the screen is reached */
  readonly run: TakeoffRun | undefined;
  readonly stated: Reached | undefined;
  readonly distances: TakeoffAnswer['distances'] | undefined;
  readonly assumed: readonly Assumed[];
}

/** A number in the units of the question, as a caution writes it; distances go up. */
export function textIn({ question }: Pick<ConditionsContext, 'question'>, kind: Kind, si: number): string {
  return measureText(question.units, kind, si, kind === 'distance' ? 'up' : 'nearest');
}

/** A length that is available or spare, as a caution writes it: it goes down. */
export function measureDown({ question }: Pick<ConditionsContext, 'question'>, si: number): string {
  return measureText(question.units, 'distance', si, 'down');
}
