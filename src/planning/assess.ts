import type { Check, Factor, Outcome } from './answer.ts';
import { type Band, highOverOf } from './band.ts';
import type { Conditions } from './conditions.ts';
import { type CheckedFailure, engineFailureCheck, isOfFailure } from './engine-failure/engine-failure-check.ts';
import { checkOf, governingCheck } from './margins.ts';
import { outcomeOf, type ThinBecause, thinBecause } from './outcome.ts';
import { requirements } from './rules/requirements.ts';
import type { Requirement } from './rules/rule-set.ts';
import type { Runs } from './runs.ts';

/** The distances of a run that checks are of [m]. */
export interface Checked {
  readonly groundRoll: number;
  /** the takeoff or landing distance */
  readonly wholeDistance: number;
}

/** What there is to assess. */
export interface Assessing {
  readonly conditions: Pick<Conditions, 'ruleSet' | 'rules' | 'asked' | 'doesNotApply' | 'declared'>;
  /** on the reference distance; undefined where the rules do not speak of the aeroplane or the surface */
  readonly runwayFactors: readonly Factor[] | undefined;
  /** what that distance is */
  readonly startsFrom: 'reference' | 'flight-manual';
  /** why there are no distances; undefined where each run that was asked for has them */
  readonly notReached: { readonly outcome: Outcome } | undefined;
  /** the distances of those runs */
  readonly distances: Runs<Checked>;
  /** of the distances as stated */
  readonly band: Band | undefined;
  /** what comes of an engine failure; undefined where none is computed */
  readonly engineFailure?: AssessedFailure | undefined;
  /** checks that follow from those of the runway, such as the clearance over obstacles */
  readonly further?: (checks: readonly Check[]) => readonly Check[];
  /** the length that the ground roll has [m] */
  readonly rollAvailable: number | undefined;
}

/** What is assessed of an engine failure. */
export interface AssessedFailure {
  readonly outcome: string;
  readonly checked: CheckedFailure;
  /** the high end of the band over the value, for what a check is of */
  readonly highOver: (of: string) => number | undefined;
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
  const { conditions, notReached, distances, band, rollAvailable } = assessing;
  const { ruleSet, doesNotApply } = conditions;
  const { stated, credited, reference } = distances;
  const noSurface = notReached === undefined && credited === undefined && reference === undefined;
  const isAssessed = notReached === undefined && doesNotApply === undefined && !noSurface;
  const ofRunway = isAssessed ? checksOf(assessing) : undefined;
  const checks = ofRunway && assessing.further ? [...ofRunway, ...assessing.further(ofRunway)] : ofRunway;
  const thinRatio = ruleSet.thinMargin.ratio;
  const highOver = (of: string) => assessing.engineFailure?.highOver(of) ?? highOverOf(band, of);
  const outcome = outcomeOf({
    notReached,
    doesNotApply,
    noSurface,
    failureOutcome: isAssessed ? failureOutcome(assessing) : undefined,
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

/** The outcomes that an engine failure has where the rule set asks for a distance with one. */
const unable = ['single-engine-cannot-continue', 'no-decision-speed', 'never-stops'] as const;

function failureOutcome({
  conditions: { rules, asked },
  engineFailure,
}: Assessing): (typeof unable)[number] | undefined {
  const isAsked = requirements(rules, asked).some(
    ({ of, notAssessed }) => notAssessed === undefined && isOfFailure(of),
  );
  return isAsked ? unable.find((outcome) => outcome === engineFailure?.outcome) : undefined;
}

const notComputed: CheckedFailure = {
  onRunway: {
    accelerateStopDistance: undefined,
    accelerateStopAllEngines: undefined,
    accelerateStopEngineOut: undefined,
    accelerateGoDistance: undefined,
    engineOutTakeoffRun: undefined,
  },
  why: 'the takeoff with an engine failure is not computed',
};

function checksOf({ conditions, runwayFactors, startsFrom, distances, engineFailure }: Assessing): readonly Check[] {
  const { rules, asked, declared } = conditions;
  const { credited, level, reference } = distances;
  return requirements(rules, asked).map((requirement) => {
    const { of } = requirement;
    if (isOfFailure(of) && requirement.notAssessed === undefined)
      return engineFailureCheck(requirement, of, engineFailure?.checked ?? notComputed, declared);
    const from = {
      reference: distanceOf(of, reference),
      credited: distanceOf(of, credited),
      level: distanceOf(of, level),
      startsFrom,
    };
    const check = checkOf(requirement, from, runwayFactors, declared);
    return asked.isSlippery && requirement.presumesDryOrWet ? withoutStop(check) : check;
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

function distanceOf(of: Requirement['of'], checked: Checked | undefined): number | undefined {
  if (checked === undefined) return undefined;
  const { groundRoll, wholeDistance } = checked;
  if (of === 'groundRoll') return groundRoll;
  return of === 'takeoffRun' ? (groundRoll + wholeDistance) / 2 : wholeDistance;
}
