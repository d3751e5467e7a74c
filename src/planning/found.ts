import type { ManualFigures, OutsideManual } from '../performance/flight-manual/manual-figures.ts';
import type { Factor, ManualUse, Method, OtherMethod } from './answer.ts';
import type { Checked } from './assess.ts';
import type { Parts } from './band-parts.ts';
import type { Conditions } from './conditions.ts';
import { type ManualReading, manualReading } from './manual/manual-reading.ts';
import type { ManualRuns } from './manual/manual-runs.ts';
import type { Silence } from './manual/silence.ts';
import type { ChosenMethod } from './method.ts';
import type { Question } from './question.ts';
import { modelForm } from './rules/input-uncertainties.ts';
import { factorsBesideManual } from './rules/runway-factors.ts';
import type { Runs } from './runs.ts';

/**
 * The distances behind an answer and the method they come from.
 *
 * @typeParam NotReached - why physics has none
 */
export interface Found<NotReached> {
  /** of the whole distance */
  readonly method: Method;
  /** of each distance: what the manual does not print is shared out by physics */
  readonly methods: DistanceMethods;
  /** what the method itself may be off, as a share of the distance */
  readonly modelForm: number;
  /** the sheet of the flight manual whose edge stands for what lies beyond it */
  readonly edge?: string | undefined;
  /** why there are none; undefined where each that was asked for is there */
  readonly notReached: NotReached | OutsideManual | undefined;
  /** without factors [m] */
  readonly runs: Runs<Parts>;
  /** what the first of a rule's distances is: physics on a paved, dry, level runway, or the flight manual's figure */
  readonly startsFrom: 'reference' | 'flight-manual';
  /** on that distance; undefined where the rules do not speak of the aeroplane or the surface */
  readonly runwayFactors: readonly Factor[] | undefined;
  /** what was read in the flight manual, whether its figures were taken or stand beside */
  readonly flightManual?: ManualUse | undefined;
  /** where the manual ends, though its figures were not asked for */
  readonly outside?: OutsideManual | undefined;
  /** the manual has sheets for the configuration, and none for this surface or a dry paved one to carry from */
  readonly noSheet?: boolean;
  /** the aeroplane that the manual is of cannot be asked the same, so that no ratio of physics carries its figures */
  readonly unscaled?: boolean;
  readonly other?: OtherMethod | undefined;
}

/** The method of each distance of an answer. */
export interface DistanceMethods {
  readonly groundRoll: Method;
  readonly airDistance: Method;
  readonly wholeDistance: Method;
}

/** What there is to find distances from. */
export interface Finding<Result extends object, NotReached extends Result> {
  readonly phase: 'takeoff' | 'landing';
  readonly question: Question;
  readonly conditions: Conditions;
  readonly chosen: ChosenMethod;
  /** physics alone */
  readonly physics: Runs<Result>;
  readonly partsOf: (result: Result | undefined) => Parts | undefined;
  readonly notReachedOf: (runs: Runs<Result>) => NotReached | undefined;
  /** whether it is flown otherwise than a manual's figures are: less power, a rolling start, reverse thrust ... */
  readonly flownOtherwise: boolean;
  /** the manual's figures carried to what it does not speak of; undefined where the aeroplane it is of cannot be asked the same */
  readonly byManual: (
    reading: ManualReading,
    silences: readonly Silence[],
    needsReference: boolean,
  ) => ManualRuns<Result> | undefined;
}

/** The distances of a question, from the flight manual where it has them, else from physics, each with the other beside it. */
export function found<Result extends object, NotReached extends Result>(
  finding: Finding<Result, NotReached>,
): Found<NotReached> {
  const { conditions, chosen, question, phase } = finding;
  const reading = chosen.manual && manualReading(chosen.manual, phase, question, conditions);
  const physics = byPhysics(finding);
  if (reading === undefined) return chosen.manual === undefined ? physics : { ...physics, noSheet: true };
  if (reading.outcome === 'outside-flight-manual') {
    if (!chosen.byManual) return { ...physics, outside: reading };
    const none = { stated: undefined, credited: undefined, level: undefined, reference: undefined };
    return { ...physics, method: 'flight-manual', notReached: reading, runs: none };
  }
  const manual = byManual(finding, reading);
  if (manual === undefined) return { ...physics, unscaled: true };
  const [taken, beside] = chosen.byManual ? [manual, physics] : [physics, manual];
  return { ...taken, flightManual: manual.flightManual, other: otherMethod(taken, beside) };
}

function byPhysics<Result extends object, NotReached extends Result>({
  chosen,
  physics: { stated, credited, level, reference },
  physics,
  partsOf,
  notReachedOf,
  conditions,
}: Finding<Result, NotReached>): Found<NotReached> {
  const method = chosen.physics;
  return {
    method,
    methods: { groundRoll: method, airDistance: method, wholeDistance: method },
    modelForm: modelForm[method],
    notReached: notReachedOf(physics),
    runs: {
      stated: partsOf(stated),
      credited: partsOf(credited),
      level: partsOf(level),
      reference: partsOf(reference),
    },
    startsFrom: 'reference',
    runwayFactors: conditions.runwayFactors,
  };
}

function byManual<Result extends object, NotReached extends Result>(
  { chosen, question, conditions, flownOtherwise, byManual, notReachedOf }: Finding<Result, NotReached>,
  reading: ManualReading,
): Found<NotReached> | undefined {
  const silences: Silence[] = [...reading.silences];
  if (flownOtherwise) silences.push('procedure');
  if (question.changes?.flewAs !== undefined) silences.push('changes');
  const { rules, asked, doesNotApply, condition } = conditions;
  const isSpoken = doesNotApply === undefined && condition.refusal === undefined;
  const runwayFactors = isSpoken ? factorsBesideManual(rules, asked, silences) : undefined;
  const carried = byManual(reading, silences, runwayFactors !== undefined);
  if (carried === undefined) return undefined;
  const { document, revision } = reading.manual;
  const none = { stated: undefined, credited: undefined, level: undefined, reference: undefined };
  const runs = carried.outcome === 'found' ? carried.runs : none;
  const { stated: figures } = reading;
  const methods = methodsOf(figures, silences.length === 0 ? 'flight-manual' : chosen.physics, chosen.physics);
  return {
    method: methods.wholeDistance,
    methods,
    modelForm: carriedForm(figures, runs.stated, chosen.physics),
    notReached: carried.outcome === 'found' ? undefined : notReachedOf({ ...none, stated: carried.result }),
    runs,
    edge: figures.edges[0]?.sheet,
    startsFrom: 'flight-manual',
    runwayFactors,
    flightManual: { document, revision, figures, silences },
  };
}

/** What the manual prints is by the method that carries it, the rest by physics. */
function methodsOf({ groundRoll, wholeDistance }: ManualFigures, method: Method, physics: Method): DistanceMethods {
  return {
    groundRoll: groundRoll === undefined ? physics : method,
    airDistance: groundRoll === undefined || wholeDistance === undefined ? physics : method,
    wholeDistance: wholeDistance === undefined ? physics : method,
  };
}

/**
 * What a manual's figure may be off once physics has carried it: the manual's own share, and that of physics on as much as it was
 * carried, so that the band does not jump where what the manual is silent on goes to nothing.
 *
 * @see references.HouseManual
 */
function carriedForm(figures: ManualFigures, stated: Parts | undefined, physics: Method): number {
  const printed = figures.wholeDistance ?? figures.groundRoll;
  if (stated === undefined || printed === undefined) return modelForm[physics];
  const carried = figures.wholeDistance === undefined ? stated.groundRoll : stated.groundRoll + stated.airDistance;
  return Math.hypot(modelForm['flight-manual'], modelForm[physics] * Math.log(carried / printed));
}

function otherMethod(taken: Found<unknown>, beside: Found<unknown>): OtherMethod | undefined {
  const { stated } = taken.runs;
  const other = beside.runs.stated;
  if (stated === undefined || other === undefined) return undefined;
  const distance = other.groundRoll + other.airDistance;
  return {
    method: beside.method,
    distance,
    ratio: distance / (stated.groundRoll + stated.airDistance),
    rollRatio: other.groundRoll / stated.groundRoll,
  };
}

/** The same distances under the names by which checks are of them. */
export function checkedRuns({ stated, credited, level, reference }: Runs<Parts>): Runs<Checked> {
  return {
    stated: stated && checked(stated),
    credited: credited && checked(credited),
    level: level && checked(level),
    reference: reference && checked(reference),
  };
}

function checked({ groundRoll, airDistance }: Parts): Checked {
  return { groundRoll, wholeDistance: groundRoll + airDistance };
}
