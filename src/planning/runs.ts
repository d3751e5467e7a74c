/** The distances behind an answer; an absent one has no physics or is not asked for. */
export interface Runs<Result> {
  /** wind, surface and slope as given */
  readonly stated: Result | undefined;
  /** wind as the rule set credits it, surface and slope as given */
  readonly credited: Result | undefined;
  /** credited wind; paved, dry, level */
  readonly reference: Result | undefined;
}

/** What differs between the three. */
export interface RunsAsked<Run> {
  /** whether physics speaks of the actual surface */
  readonly known: boolean;
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** the run in the credited wind on a paved, dry, level runway; undefined where the rule set does not start from it */
  readonly reference: Run | undefined;
  /** whether that runway is the one as given */
  readonly sameRunway: boolean;
}

/**
 * The three runs behind an answer; runs that are the same question are computed once.
 *
 * @param compute - what comes of a run
 * @param run - as stated
 */
export function runsOf<Run extends { readonly headwind: number }, Result>(
  compute: (run: Run) => Result,
  run: Run,
  { known, creditedHeadwind, reference, sameRunway }: RunsAsked<Run>,
): Runs<Result> {
  const stated = known ? compute(run) : undefined;
  const sameWind = creditedHeadwind === run.headwind;
  const credited = sameWind || !known ? stated : compute({ ...run, headwind: creditedHeadwind });
  if (reference === undefined) return { stated, credited, reference: undefined };
  return { stated, credited, reference: sameRunway && known ? credited : compute(reference) };
}

/** The first of the three that came to nothing, in the order stated, credited, reference. */
export function firstWithout<Result extends { readonly outcome: string }, Fine extends Result>(
  { stated, credited, reference }: Runs<Result>,
  isFine: (result: Result) => result is Fine,
): Exclude<Result, Fine> | undefined {
  for (const result of [stated, credited, reference]) {
    if (result !== undefined && !isFine(result)) return result as Exclude<Result, Fine>;
  }
  return undefined;
}
