import type { Fault } from '../../planning/fault.ts';
import { isRefused } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { checkAeroplane } from '../check-aeroplane.ts';
import { readDefinition } from '../read-definition.ts';
import { asItCame, leaveOut, type Remainder, remainderOf } from './leave-out.ts';

/** What of a definition can be read, and everything for which a question with it is refused. */
export interface ReadablePart {
  readonly faults: readonly Fault[];
  /** undefined where so much is at fault that nothing can be read */
  readonly definition: AeroplaneDefinition | undefined;
  readonly remainder: Remainder;
  /** ids of configurations whose figures contradict each other, or 'all' */
  readonly faulty: ReadonlySet<string>;
}

/** A slip in a member shows a missing one around it in the next round; deeper than a definition there is nothing to leave out. */
const mostRounds = 12;

/**
 * The part of a definition that is in its form, without the members and the sheets that are not, and what the form and the checks
 * say against it.
 *
 * @param given - any object
 */
export function readablePart(given: Record<string, unknown>): ReadablePart {
  const remainder = remainderOf(given);
  const faults: Fault[] = [];
  for (let round = 0; round < mostRounds; round++) {
    const read = readDefinition(remainder.tree);
    if (!isRefused(read)) return checked(read.value, remainder, faults);
    if (round === 0) faults.push(...read.refused);
    if (!leaveOut(remainder, read.refused.map(whatIsAtFault))) break;
  }
  return { faults, definition: undefined, remainder, faulty: new Set() };
}

/** What is missing cannot be left out: what it is missing in is. */
function whatIsAtFault({ code, pointer }: Fault): string {
  return code === 'missing' ? pointer.slice(0, pointer.lastIndexOf('/')) : pointer;
}

/** Members that every run of physics goes by. */
const ofEveryRun = ['wing', 'drag', 'propulsion'];

function checked(definition: AeroplaneDefinition, remainder: Remainder, faults: readonly Fault[]): ReadablePart {
  const isConsequence = consequencesOf(remainder);
  const found = checkAeroplane(definition, '');
  const own = found
    .map((fault) => ({ ...fault, pointer: asItCame(remainder, fault.pointer) }))
    .filter((fault) => !isConsequence(fault));
  const faulty = new Set<string>();
  for (const { pointer } of found) {
    const [, member, id] = pointer.split('/');
    if (member === 'configurations' && id !== undefined) faulty.add(id);
    else if (ofEveryRun.some((one) => one === member)) faulty.add('all');
  }
  const usable = withoutUnconvertible(definition, remainder, found);
  return { faults: [...faults, ...own], definition: usable, remainder, faulty };
}

/** Faults that come of what was left out: a configuration or a calibration that is named and no longer there. */
function consequencesOf({ leftOut }: Remainder): (fault: Fault) => boolean {
  return ({ code, pointer, received }) =>
    leftOut.includes(pointer) || (code === 'unknown-id' && leftOut.includes(`/configurations/${received}`));
}

/** A figure of a cell, a note or an example at fault leaves its sheet readable. */
const ofOneFigure = /^\/flightManual\/(?:tables|speedTables)\/\d+\/(?:rows\/\d+\/\d+|notes\/.*|workedExamples\/.*)$/;

/** The definition without what has no figures in SI: sheets whose form does not hold, indicated speeds that no calibration reaches. */
function withoutUnconvertible(
  definition: AeroplaneDefinition,
  remainder: Remainder,
  found: readonly Fault[],
): AeroplaneDefinition | undefined {
  const calibrationFails = found.some(({ pointer }) => pointer.startsWith('/airspeedCalibration'));
  const isLost = (id: string) => found.some(({ pointer }) => pointer.startsWith(`/configurations/${id}/maximumLift`));
  const lost = Object.entries(definition.configurations).flatMap(([id, { maximumLift }]) =>
    'stallSpeed' in maximumLift && maximumLift.type === 'ias' && (calibrationFails || isLost(id))
      ? [`/configurations/${id}`]
      : [],
  );
  if (lost.length === Object.keys(definition.configurations).length) return undefined;
  const { tables = [], speedTables = [] } = definition.flightManual ?? {};
  const indicated = [
    ...tables.map(({ airspeed }, i) => ({ airspeed, pointer: `/flightManual/tables/${i}` })),
    ...speedTables.map(({ airspeed }, i) => ({ airspeed, pointer: `/flightManual/speedTables/${i}` })),
  ].filter(
    ({ airspeed, pointer }) =>
      airspeed === 'ias' && (calibrationFails || found.some((fault) => fault.pointer.startsWith(`${pointer}/rows/`))),
  );
  const sheets = found.flatMap(({ pointer }) =>
    pointer.startsWith('/flightManual/') && !ofOneFigure.test(pointer) ? [pointer] : [],
  );
  const calibration = calibrationFails ? ['/airspeedCalibration'] : [];
  leaveOut(remainder, [...lost, ...calibration, ...sheets, ...indicated.map(({ pointer }) => pointer)]);
  const read = readDefinition(remainder.tree);
  return isRefused(read) ? undefined : read.value;
}
