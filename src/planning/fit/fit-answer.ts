import type { FitFinding } from '../../performance/fit/fit-finding.ts';
import type { FittedResult } from '../../performance/fit/fit-result.ts';
import type { Assumption, Caution } from '../answer.ts';
import type { Origin } from './fit-points.ts';

/** What is answered to a fit, in SI. */
export interface FitAnswer {
  readonly outcome: FitOutcome;
  readonly sentence: string;
  readonly cautions: readonly Caution[];
  readonly findings: readonly SaidFinding[];
  /** absent where nothing could be fitted */
  readonly result: FittedResult | undefined;
  /** by the rows of the result */
  readonly origins: readonly Origin[];
  /** from measured stall speeds, where there are any */
  readonly maximumLift: { readonly coefficient: number; readonly relativeSd: number } | undefined;
  readonly assumed: readonly Assumption[];
}

export const fitOutcomes = ['accepted', 'not-accepted', 'not-fitted'] as const;
/** accepted: nothing speaks against it, and it is within the bounds of a fit; not-accepted: figures, but not to be used */
export type FitOutcome = (typeof fitOutcomes)[number];

/** A finding in words, with where it points to. */
export interface SaidFinding {
  readonly finding: FitFinding;
  readonly message: string;
  readonly at: string;
}
