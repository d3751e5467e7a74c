import type { Check } from '../answer.ts';
import type { DeclaredDistances } from '../declared-distances.ts';
import { checkOf } from '../margins.ts';
import type { Requirement } from '../rules/rule-set.ts';

/** The distances of an engine failure that checks are of [m], in the wind that counts. */
export interface FailureDistances {
  /** the longer of the two stops, and each */
  readonly accelerateStopDistance: number | undefined;
  readonly accelerateStopAllEngines: number | undefined;
  readonly accelerateStopEngineOut: number | undefined;
  readonly accelerateGoDistance: number | undefined;
  /** to the middle between lift-off and the screen */
  readonly engineOutTakeoffRun: number | undefined;
}

/** What checks of an engine failure are made from. */
export interface CheckedFailure {
  /** on the runway as it is */
  readonly onRunway: FailureDistances;
  /** on the same runway dry, where the rule composes both */
  readonly dry?: FailureDistances | undefined;
  /** why nothing can be compared, whatever was computed */
  readonly notAssessed?: string | undefined;
  /** why a distance is absent */
  readonly why: string;
}

const names = [
  'accelerateStopDistance',
  'accelerateStopAllEngines',
  'accelerateStopEngineOut',
  'accelerateGoDistance',
  'engineOutTakeoffRun',
] as const satisfies readonly (keyof FailureDistances)[];

/** Whether a requirement is of a distance with an engine failure. */
export function isOfFailure(of: Requirement['of']): of is keyof FailureDistances {
  return (names as readonly string[]).includes(of);
}

/**
 * One check of a distance with an engine failure: on the runway as it is, or on the same runway dry where that is longer.
 *
 * @see references.Cfr25s109a; references.Cfr25s113
 */
export function engineFailureCheck(
  requirement: Requirement,
  of: keyof FailureDistances,
  { onRunway, dry, notAssessed, why }: CheckedFailure,
  declared: DeclaredDistances,
): Check {
  if (notAssessed !== undefined) return checkOf({ ...requirement, notAssessed }, nowhere, undefined, declared);
  const wet = onRunway[of];
  if (wet === undefined) return checkOf({ ...requirement, notAssessed: why }, nowhere, undefined, declared);
  const onDry = dry?.[of];
  const check = checkOf(requirement, { ...nowhere, credited: Math.max(wet, onDry ?? 0) }, undefined, declared);
  if (onDry === undefined) return check;
  const [less, because] =
    onDry > wet
      ? [wet, 'on the wet runway it is the shorter; that on the same runway dry counts']
      : [onDry, 'on the same runway dry it is not longer'];
  return {
    ...check,
    alternative: { startsFrom: 'credited', distance: less, factors: check.factors, required: less, because },
  };
}

const nowhere = { reference: undefined, credited: undefined };
