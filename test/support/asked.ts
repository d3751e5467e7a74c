import type { Check } from '../../src/planning/answer.ts';
import type { DeclaredDistances, Lengths } from '../../src/planning/declared-distances.ts';
import {
  type CheckedFailure,
  engineFailureCheck,
  type FailureDistances,
  isOfFailure,
} from '../../src/planning/engine-failure/engine-failure-check.ts';
import { checkOf, type StartingDistances } from '../../src/planning/margins.ts';
import type { Surface } from '../../src/planning/question.ts';
import { doesNotApply } from '../../src/planning/rules/applies.ts';
import { requirements } from '../../src/planning/rules/requirements.ts';
import type { Asked, PhaseRules, RuledAeroplane, RuleSet } from '../../src/planning/rules/rule-set.ts';
import { runwayFactors } from '../../src/planning/rules/runway-factors.ts';

export const dryPavement = { kind: 'paved', state: 'dry' } as const;

/** A small twin with propellers and pistons, and nothing stated that it need not state. */
export const smallTwin: RuledAeroplane = {
  category: 'twin-piston',
  engines: 2,
  certification: { basis: 'cs-23-amendment-4', screenHeight: 50 * 0.3048 },
  masses: { maximumTakeoff: 2000 },
};

/** An aeroplane that differs from the small twin in what is named. */
export function ruled({
  kilograms,
  basis,
  ...more
}: Partial<RuledAeroplane> & {
  readonly kilograms?: number;
  readonly basis?: RuledAeroplane['certification']['basis'];
} = {}): RuledAeroplane {
  return {
    ...smallTwin,
    ...more,
    ...(kilograms === undefined ? {} : { masses: { maximumTakeoff: kilograms } }),
    ...(basis === undefined ? {} : { certification: { ...smallTwin.certification, basis } }),
  };
}

/** What a rule looks at: a small twin on a long, dry, paved, level runway with every length declared alike, but for what is named. */
export function asked(some: Partial<Asked> = {}): Asked {
  const published = { tora: 1000, toda: 1000, asda: 1000, lda: 1000 };
  return {
    aeroplane: smallTwin,
    surface: dryPavement,
    isSlippery: false,
    conditionCode: undefined,
    slope: 0,
    published,
    reverse: false,
    ...some,
  };
}

/** Lengths that are declared, all of which count. */
export function declaredAs(lengths: Partial<Lengths>): DeclaredDistances {
  const all = { tora: undefined, toda: undefined, asda: undefined, ...lengths };
  return { published: all, credited: all, clearwayNotCredited: undefined };
}

/** Values of the factors of surface and slope; undefined where the rules do not speak of the surface. */
export function factorsOn(rules: PhaseRules, surface: Surface, slope = 0, aeroplane = smallTwin): number[] | undefined {
  return runwayFactors(rules, asked({ surface, slope, aeroplane }))?.map(({ value }) => value);
}

/** Why a set does not speak of an aeroplane in a phase. */
export function refusal(set: RuleSet, aeroplane: RuledAeroplane, phase: 'takeoff' | 'landing'): string | undefined {
  return doesNotApply(set, set[phase], aeroplane);
}

/** The checks of one side of a rule set, from distances that are given, with an engine failure and without. */
export function checksFrom(
  rules: PhaseRules,
  given: Asked,
  from: StartingDistances,
  failure: Partial<CheckedFailure> = {},
): Check[] {
  const factors = runwayFactors(rules, given);
  const declared = declaredAs(given.published);
  const checked = { onRunway: noFailure, why: 'nothing is computed', ...failure };
  return requirements(rules, given).map((one) =>
    isOfFailure(one.of) && one.notAssessed === undefined
      ? engineFailureCheck(one, one.of, checked, declared)
      : checkOf(one, from, factors, declared),
  );
}

/** No distance with an engine failure. */
export const noFailure: FailureDistances = {
  accelerateStopDistance: undefined,
  accelerateStopAllEngines: undefined,
  accelerateStopEngineOut: undefined,
  accelerateGoDistance: undefined,
  engineOutTakeoffRun: undefined,
};
