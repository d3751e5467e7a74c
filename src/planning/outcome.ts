import type { Check, Outcome } from './answer.ts';
import { arithmeticSlack } from './arithmetic-slack.ts';
import { governingCheck } from './margins.ts';

/** Why an answer that passes is thin, and which check shows it. */
export interface ThinBecause {
  readonly kind: 'margin' | 'band';
  readonly check: Check;
  /** what that check would require at the high end of the band, with the same factors [m] */
  readonly requiredAtHigh: number;
}

/** What decides the outcome of a takeoff or landing. */
export interface Deciding {
  /** why there are no distances */
  readonly notReached: { readonly outcome: Outcome } | undefined;
  /** why the rule set does not speak of the aeroplane */
  readonly doesNotApply: string | undefined;
  /** whether neither factor nor physics speaks of the surface */
  readonly noSurface: boolean;
  /** where the rule set asks for a distance with an engine failure: why there can be none */
  readonly failureOutcome?: 'single-engine-cannot-continue' | 'no-decision-speed' | 'never-stops' | undefined;
  readonly checks: readonly Check[];
  /** the roll as stated, without factors, and the length it has [m] */
  readonly roll: number | undefined;
  readonly rollAvailable: number | undefined;
  /** a margin over required below this is thin */
  readonly thinRatio: number;
  /** the high end of the band over the value, for what a check is of */
  readonly highOver: (of: string) => number;
}

/**
 * The outcome, in the order in which one hides the next: no distance, rules that do not apply, a surface nothing speaks of, an
 * engine failure that leaves no way, a roll longer than the runway, not enough, nothing to compare, thin, enough.
 *
 * A check that is not assessed keeps the outcome from enough.
 */
export function outcomeOf(deciding: Deciding): Outcome {
  const { notReached, doesNotApply, noSurface, checks, roll, rollAvailable } = deciding;
  if (notReached !== undefined) return notReached.outcome;
  if (doesNotApply !== undefined) return 'rule-set-does-not-apply';
  if (noSurface) return 'no-data-for-this-surface';
  if (deciding.failureOutcome !== undefined) return deciding.failureOutcome;
  if (roll !== undefined && rollAvailable !== undefined && roll - rollAvailable > arithmeticSlack) {
    return 'roll-longer-than-runway';
  }
  if (checks.some(({ result }) => result === 'fails')) return 'not-enough';
  if (checks.length === 0 || checks.some(({ result }) => result === 'not-assessed')) return 'nothing-to-compare';
  return thinBecause(checks, deciding.thinRatio, deciding.highOver) === undefined ? 'enough' : 'enough-but-thin';
}

/**
 * Why checks that all pass are thin, or undefined where they are not.
 *
 * @param checks - all passing
 * @param thinRatio - the least margin over required that is not thin
 * @param highOver - the high end of the band over the value; with the same factors it must still pass
 */
export function thinBecause(
  checks: readonly Check[],
  thinRatio: number,
  highOver: (of: string) => number,
): ThinBecause | undefined {
  const governing = governingCheck(checks);
  if (governing?.marginRatio === undefined) return undefined;
  const atHigh = (check: Check) => (check.required ?? 0) * highOver(check.of);
  if (governing.marginRatio < thinRatio - 1e-9) {
    return { kind: 'margin', check: governing, requiredAtHigh: atHigh(governing) };
  }
  let least = -arithmeticSlack;
  let thin: ThinBecause | undefined;
  for (const check of checks) {
    const left = (check.available ?? 0) - atHigh(check);
    if (left >= least) continue;
    least = left;
    thin = { kind: 'band', check, requiredAtHigh: atHigh(check) };
  }
  return thin;
}
