import { filmAsWet } from '../physics/runway-surface.ts';
import type { Check, Outcome } from './answer.ts';
import { type Band, highOverOf } from './band.ts';
import type { Conditions } from './conditions.ts';
import type { DeclaredDistances } from './declared-distances.ts';
import { checkOf, governingCheck } from './margins.ts';
import { outcomeOf, type ThinBecause, thinBecause } from './outcome.ts';
import type { Runway } from './question.ts';
import type { PhaseRules } from './rules/rule-set.ts';
import type { Runs } from './runs.ts';

/** The distances of a run that checks are of [m]. */
export interface Checked {
  readonly groundRoll: number;
  /** the takeoff or landing distance */
  readonly wholeDistance: number;
}

/** What there is to assess. */
export interface Assessing {
  readonly conditions: Pick<Conditions, 'ruleSet' | 'doesNotApply' | 'condition'>;
  readonly rules: PhaseRules;
  readonly runway: Pick<Runway, 'surface' | 'slope'>;
  readonly declared: DeclaredDistances;
  /** why there are no distances; undefined where each run that was asked for has them */
  readonly notReached: { readonly outcome: Outcome } | undefined;
  /** the distances of those runs */
  readonly distances: Runs<Checked>;
  /** of the distances as stated */
  readonly band: Band | undefined;
  /** checks that follow from those of the runway, such as the clearance over obstacles */
  readonly further?: (checks: readonly Check[]) => readonly Check[];
  /** the length that the ground roll has [m] */
  readonly rollAvailable: number | undefined;
}

/** The checks and what they come to. */
export interface Assessed {
  readonly outcome: Outcome;
  /** undefined where nothing can be assessed */
  readonly checks: readonly Check[] | undefined;
  readonly governing: Check | undefined;
  readonly thin: ThinBecause | undefined;
}

/** Every check of a rule set in its order, the one that governs, and the outcome. */
export function assess(assessing: Assessing): Assessed {
  const { conditions, rules, runway, declared, notReached, distances, band, rollAvailable } = assessing;
  const { ruleSet, doesNotApply } = conditions;
  const { stated, credited, reference } = distances;
  const noSurface = notReached === undefined && credited === undefined && reference === undefined;
  const isAssessed = notReached === undefined && doesNotApply === undefined && !noSurface;
  const ofRunway = isAssessed
    ? checksOf(rules, distances, runway, declared, conditions.condition.isSlippery)
    : undefined;
  const checks = ofRunway && assessing.further ? [...ofRunway, ...assessing.further(ofRunway)] : ofRunway;
  const thinRatio = ruleSet.thinMargin.ratio;
  const highOver = (of: string) => highOverOf(band, of);
  const outcome = outcomeOf({
    notReached,
    doesNotApply,
    noSurface,
    checks: checks ?? [],
    roll: stated?.groundRoll,
    rollAvailable,
    thinRatio,
    highOver,
  });
  return {
    outcome,
    checks,
    governing: checks && governingCheck(checks),
    thin: checks && outcome === 'enough-but-thin' ? thinBecause(checks, thinRatio, highOver) : undefined,
  };
}

function checksOf(
  rules: PhaseRules,
  { credited, reference }: Runs<Checked>,
  { surface, slope }: Pick<Runway, 'surface' | 'slope'>,
  declared: DeclaredDistances,
  isSlippery: boolean,
): readonly Check[] {
  const factors = rules.runwayFactors(filmAsWet(surface), slope);
  return rules.requirements(declared).map((requirement) => {
    const of = requirement.of === 'groundRoll' ? 'groundRoll' : 'wholeDistance';
    const check = checkOf(requirement, { reference: reference?.[of], credited: credited?.[of] }, factors, declared);
    return isSlippery && requirement.presumesDryOrWet ? withoutStop(check) : check;
  });
}

/** A check by a factor that presumes a dry or a wet runway: on a slippery one it can fail, and cannot pass. */
function withoutStop(check: Check): Check {
  if (check.result !== 'passes') return check;
  const { margin: _, marginRatio: __, ...rest } = check;
  return {
    ...rest,
    result: 'not-assessed',
    why: 'the stop is not computed on this surface, and the factor that stands for it presumes a dry or wet runway',
  };
}
