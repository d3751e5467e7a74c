import type { SlopeProfile } from '../performance/slope-profile.ts';

/** The distances behind an answer; an absent one has no physics or is not asked for. */
export interface Runs<Result> {
  /** wind, surface and slope as given */
  readonly stated: Result | undefined;
  /** wind as the rule set credits it, surface and slope as given */
  readonly credited: Result | undefined;
  /** credited wind, surface as given, level; only where the rules let a slope that helps earn nothing */
  readonly level: Result | undefined;
  /** credited wind; paved, dry, level */
  readonly reference: Result | undefined;
}

/** What differs between the three. */
export interface RunsAsked<Run> {
  /** whether physics speaks of the actual surface */
  readonly known: boolean;
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** whether a level runway is asked for too: there is a slope that may help, and the rules let it earn nothing */
  readonly alsoLevel: boolean;
  /** the run in the credited wind on a paved, dry, level runway; undefined where the rule set does not start from it */
  readonly reference: Run | undefined;
  /** whether that runway is the one as given */
  readonly sameRunway: boolean;
}

/** What the runs behind an answer differ in. */
export interface Sloped {
  readonly headwind: number;
  readonly slope: number;
  readonly profile?: SlopeProfile | undefined;
}

/**
 * The runs behind an answer; runs that are the same question are computed once.
 *
 * @param compute - what comes of a run
 * @param run - as stated
 */
export function runsOf<Run extends Sloped, Result>(
  compute: (run: Run) => Result,
  run: Run,
  { known, creditedHeadwind, alsoLevel, reference, sameRunway }: RunsAsked<Run>,
): Runs<Result> {
  const stated = known ? compute(run) : undefined;
  const sameWind = creditedHeadwind === run.headwind;
  const credited = sameWind || !known ? stated : compute({ ...run, headwind: creditedHeadwind });
  const level =
    alsoLevel && known ? compute({ ...run, headwind: creditedHeadwind, slope: 0, profile: undefined }) : undefined;
  if (reference === undefined) return { stated, credited, level, reference: undefined };
  return { stated, credited, level, reference: sameRunway && known ? credited : compute(reference) };
}

/** The first of them that came to nothing, in the order stated, credited, level, reference. */
export function firstWithout<Result extends { readonly outcome: string }, Fine extends Result>(
  { stated, credited, level, reference }: Runs<Result>,
  isFine: (result: Result) => result is Fine,
): Exclude<Result, Fine> | undefined {
  for (const result of [stated, credited, level, reference]) {
    if (result !== undefined && !isFine(result)) return result as Exclude<Result, Fine>;
  }
  return undefined;
}
