import type { Check, Factor } from './answer.ts';
import { arithmeticSlack } from './arithmetic-slack.ts';
import type { DeclaredDistances } from './declared-distances.ts';
import type { Requirement } from './rules/rule-set.ts';

/** The distances that checks start from [m], each absent where it does not exist. */
export interface StartingDistances {
  /** credited wind; paved, dry, level */
  readonly reference: number | undefined;
  /** credited wind; the runway as it is */
  readonly credited: number | undefined;
}

type Start = 'reference' | 'credited';
interface Reading {
  readonly startsFrom: Start;
  readonly distance: number;
  readonly factors: readonly Factor[];
  readonly required: number;
}

/**
 * One check: what a rule requires against what is declared.
 *
 * The factors of the surface and the slope multiply the reference distance only. Where physics on the actual runway exceeds the
 * reference times those factors, it is taken; the one not taken stands beside it. The overall factor is applied once, to
 * whichever is taken.
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
  const { code, of, against, factor, source } = requirement;
  const overall = factor === undefined ? [] : [factor];
  const { taken, other } = readings(from, runwayFactors, overall);
  const available = declared.credited[against];
  const { startsFrom, distance, factors, required } = taken;
  const margin = available === undefined ? undefined : available - required;
  return {
    code,
    of,
    startsFrom,
    distance,
    factors,
    alternative: otherReading(requirement, taken) ?? other,
    unit: 'distance',
    required,
    available,
    margin,
    marginRatio: margin === undefined ? undefined : margin / required,
    result: margin === undefined ? 'not-assessed' : -margin <= arithmeticSlack ? 'passes' : 'fails',
    why: margin === undefined ? `${against.toUpperCase()} is not declared` : undefined,
    source,
  };
}

function readings(
  { reference, credited }: StartingDistances,
  runwayFactors: readonly Factor[] | undefined,
  overall: readonly Factor[],
): { readonly taken: Reading; readonly other?: Check['alternative'] } {
  const byFactors =
    reference === undefined || runwayFactors === undefined
      ? undefined
      : reading('reference', reference, [...runwayFactors, ...overall]);
  const byPhysics = credited === undefined ? undefined : reading('credited', credited, overall);
  if (byFactors === undefined && byPhysics === undefined) {
    throw new RangeError('from must hold a distance to start from');
  }
  if (byFactors === undefined) return { taken: byPhysics as Reading };
  if (byPhysics === undefined || byPhysics.required === byFactors.required) return { taken: byFactors };
  return byPhysics.required > byFactors.required
    ? { taken: byPhysics, other: beside(byFactors, 'the factors on a paved, dry, level runway ask for less') }
    : { taken: byFactors, other: beside(byPhysics, 'physics on the runway as it is asks for less') };
}

/** The rule's other reading, from the same distance with its own overall factor. */
function otherReading({ alternative, factor }: Requirement, taken: Reading): Check['alternative'] {
  if (alternative === undefined) return undefined;
  const factors = [...taken.factors.filter((one) => one !== factor), alternative.factor];
  return beside(reading(taken.startsFrom, taken.distance, factors), alternative.because);
}

/** A reading that is shown and not taken. */
function beside({ startsFrom, distance, factors, required }: Reading, because: string): Check['alternative'] {
  return { startsFrom, distance, factors, required, because };
}

function reading(startsFrom: Start, distance: number, factors: readonly Factor[]): Reading {
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
