import type { AlternativeReading, Check, Factor, StartsFrom } from './answer.ts';
import { arithmeticSlack } from './arithmetic-slack.ts';
import type { DeclaredDistances } from './declared-distances.ts';
import type { Requirement } from './rules/rule-set.ts';

/** The distances that checks start from [m], each absent where it does not exist. */
export interface StartingDistances {
  /** credited wind; paved, dry, level */
  readonly reference: number | undefined;
  /** credited wind; the runway as it is */
  readonly credited: number | undefined;
  /** credited wind; the surface as it is, level; only where a slope that helps earns nothing */
  readonly level?: number | undefined;
  /** what the first of them is: of physics, or the flight manual's own figure; absent: of physics */
  readonly startsFrom?: 'reference' | 'flight-manual';
}

interface Reading {
  readonly startsFrom: StartsFrom;
  readonly distance: number;
  readonly factors: readonly Factor[];
  readonly required: number;
}

/**
 * One check: what a rule requires against what is declared.
 *
 * The factors of the surface and the slope multiply the reference distance only. Where physics on the actual runway exceeds the
 * reference times those factors, it is taken; the one not taken stands beside it. The overall factor is applied once, to
 * whichever is taken. Where the rules give no credit for a slope that helps, physics on the same surface and level is taken if that
 * is longer, and the runway as it is stands beside it. A factor that the rule calls the least it may be shows that a length is not enough, and without physics
 * beside it never that it is.
 *
 * @param requirement - what is compared, the overall factor
 * @param from - reference and credited distance [m]; at least one
 * @param runwayFactors - on the reference; undefined where the rule set does not speak of the surface
 * @param declared - what is available
 * @see references.EuAirOps305, AMC1 and AMC2: the factors are for where the manual holds no data of its own
 */
export function checkOf(
  requirement: Requirement,
  from: StartingDistances,
  runwayFactors: readonly Factor[] | undefined,
  declared: DeclaredDistances,
): Check {
  const { code, of, against, source } = requirement;
  const available = declared.credited[against];
  if (requirement.notAssessed !== undefined) return notAssessed(requirement, available);
  const { taken, others } = readings(requirement, from, runwayFactors);
  const { startsFrom, distance, factors, required } = taken;
  const [alternative, ...further] = [...otherReadings(requirement, taken), ...others];
  const passes = available !== undefined && required - available <= arithmeticSlack;
  const least = from.credited === undefined ? factors.find(({ atLeast }) => atLeast) : undefined;
  const why =
    available === undefined
      ? `${against.toUpperCase()} is not declared`
      : passes && least !== undefined
        ? `the factor ${least.value} is the least that the rule asks for (${least.because}), and physics does not speak of this surface`
        : undefined;
  const margin = available === undefined || why !== undefined ? undefined : available - required;
  return {
    code,
    of,
    against,
    startsFrom,
    distance,
    factors,
    alternative,
    ...(further.length === 0 ? {} : { furtherAlternatives: further }),
    unit: 'distance',
    required,
    available,
    margin,
    marginRatio: margin === undefined ? undefined : margin / required,
    result: why !== undefined ? 'not-assessed' : passes ? 'passes' : 'fails',
    why,
    source,
  };
}

/** A check whose distance is not computed: it stands there so that nobody takes it for passed. */
function notAssessed(
  { code, of, against, factor, notAssessed: why, source }: Requirement,
  available: number | undefined,
): Check {
  const factors = factor === undefined ? [] : [factor];
  return { code, of, against, factors, unit: 'distance', available, result: 'not-assessed', why, source };
}

function readings(
  { factor, onRunway = factor, runwayDecides }: Requirement,
  { reference, credited, level, startsFrom = 'reference' }: StartingDistances,
  runwayFactors: readonly Factor[] | undefined,
): { readonly taken: Reading; readonly others: readonly AlternativeReading[] } {
  const byFactors =
    reference === undefined || runwayFactors === undefined
      ? undefined
      : reading(startsFrom, reference, [...runwayFactors, ...listed(factor)]);
  if (credited === undefined) {
    if (byFactors === undefined) throw new RangeError('from must hold a distance to start from');
    return { taken: byFactors, others: [] };
  }
  const asItIs = reading('credited', credited, listed(onRunway));
  const helped = level !== undefined && level > credited;
  const byPhysics = helped ? reading('level', level, listed(onRunway)) : asItIs;
  const uncredited = helped ? [beside(asItIs, 'the rules give no credit for a slope that helps')] : [];
  if (byFactors === undefined) return { taken: byPhysics, others: uncredited };
  if (runwayDecides !== undefined) {
    return { taken: byPhysics, others: [beside(byFactors, runwayDecides), ...uncredited] };
  }
  if (byPhysics.required > byFactors.required) {
    return { taken: byPhysics, others: [beside(byFactors, asksForLess[startsFrom]), ...uncredited] };
  }
  return asItIs.required === byFactors.required
    ? { taken: byFactors, others: [] }
    : { taken: byFactors, others: [beside(asItIs, 'physics on the runway as it is asks for less')] };
}

/** Why a reading by factors is not taken, by what they multiply. */
const asksForLess = {
  reference: 'the factors on a paved, dry, level runway ask for less',
  'flight-manual': "the factors on the flight manual's figure ask for less",
} as const;

function listed(factor: Factor | undefined): readonly Factor[] {
  return factor === undefined ? [] : [factor];
}

/** The rule's other readings from the same distance, each with its own factor in place of the one of the same code. */
function otherReadings({ alternatives = [] }: Requirement, taken: Reading): readonly AlternativeReading[] {
  return alternatives.flatMap(({ factor, because }) => {
    const factors = taken.factors.map((one) => (one.code === factor.code ? factor : one));
    if (!factors.includes(factor)) return [];
    return [beside(reading(taken.startsFrom, taken.distance, factors), because)];
  });
}

/** A reading that is shown and not taken. */
function beside({ startsFrom, distance, factors, required }: Reading, because: string): AlternativeReading {
  return { startsFrom, distance, factors, required, because };
}

function reading(startsFrom: StartsFrom, distance: number, factors: readonly Factor[]): Reading {
  let required = distance;
  for (const { value } of factors) required *= value;
  return { startsFrom, distance, factors, required };
}

/** Shares of the required that differ by less are equal: in other units the last bits fall otherwise. */
const alike = 1e-9;

/**
 * The check with the least margin as a share of what it requires; of equal ones the first, whatever their last bits.
 *
 * @returns its code, or undefined where nothing was assessed
 */
export function governingCheck(checks: readonly Check[]): Check | undefined {
  let governing: Check | undefined;
  for (const check of checks) {
    if (check.marginRatio === undefined) continue;
    if (governing?.marginRatio === undefined || check.marginRatio < governing.marginRatio - alike) governing = check;
  }
  return governing;
}
