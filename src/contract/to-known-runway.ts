import { countingDistances } from '../planning/declared-distances.ts';
import type { Fault } from '../planning/fault.ts';
import { fromSi } from '../units/units.ts';
import type { AerodromeDefinition, RunwayEnd } from './aerodrome-definition.ts';
import type { AerodromeLookup } from './aerodrome-lookup.ts';
import { changedMembers, changeText } from './changed-members.ts';
import { laterProfile } from './later-profile.ts';
import { mergePatch } from './merge-patch.ts';
import { si } from './quantity.ts';
import type { DeclaredOnWire } from './question-checks/check-declared.ts';
import type { RunwayOnWire } from './runway.ts';
import type { RunwayChoice, RunwayOfAerodrome } from './runway-choice.ts';
import type { SlopeOnWire } from './slope.ts';
import { unknownId } from './unknown-id.ts';

type Phase = 'takeoff' | 'landing';
type NamedPoint = NonNullable<RunwayEnd['points']>[number];

/**
 * The runway of a question, whole: as it is given, or a runway end on file with what the question puts in its place.
 *
 * With a named point the distances published from there are taken. A ground line on file begins with the declared distances of
 * the whole runway; it is taken from where those of the question begin: the named point, in a landing the displaced threshold.
 *
 * @returns the runway as it can be asked inline, or what was not found
 */
export function toKnownRunway(
  given: RunwayChoice,
  { get, ids }: AerodromeLookup,
  phase: Phase,
): RunwayOnWire | Fault[] {
  if (!('aerodrome' in given)) return given;
  const aerodrome = get(given.aerodrome)?.definition;
  if (aerodrome === undefined) return [unknownId('/runway/aerodrome', 'aerodrome', given.aerodrome, ids)];
  const end = aerodrome.ends.find(({ designator }) => designator === given.end);
  if (end === undefined) {
    const designators = aerodrome.ends.map(({ designator }) => designator);
    return [unknownId('/runway/end', `runway end of ${aerodrome.id}`, given.end, designators)];
  }
  const { start } = given;
  const point = typeof start === 'object' && 'point' in start ? pointOf(end, start.point) : undefined;
  if (point !== undefined && 'code' in point) return [point];
  const runway = merged(onFile(aerodrome, end, point, given, phase), given);
  return countingDistances[phase].some((name) => runway.declared?.[name] !== undefined)
    ? runway
    : [notForUse(aerodrome, end, point, phase)];
}

/** The point of that very name: one that only begins alike is another point. */
function pointOf({ designator, points = [] }: RunwayEnd, name: string): NamedPoint | Fault {
  const found = points.find((point) => point.name === name);
  if (found !== undefined) return found;
  const names = points.map((point) => point.name);
  const fault = unknownId(
    '/runway/start/point',
    `point of runway ${designator}`,
    name,
    names,
    (known) => !name.startsWith(known),
  );
  return names.length > 0 ? fault : { ...fault, allowed: 'none: no point is on file' };
}

function notForUse({ id }: AerodromeDefinition, end: RunwayEnd, point: NamedPoint | undefined, phase: Phase): Fault {
  const names = countingDistances[phase].map((name) => name.toUpperCase()).join(', ');
  const where = point === undefined ? '' : ` from ${point.name}`;
  return {
    pointer: point === undefined ? '/runway/end' : '/runway/start/point',
    code: 'contradiction',
    message: `Runway ${end.designator} of ${id} is not declared for a ${phase}${where}: none of ${names} is on file.`,
    received: point?.name ?? end.designator,
    hint: `Ask another runway end, or give runway.declared if it is published for a ${phase}.`,
  };
}

/** What is on file, in the form of a runway in a question; its surface has no state yet. */
function onFile(
  { id, revision, elevation, magneticVariation }: AerodromeDefinition,
  end: RunwayEnd,
  point: NamedPoint | undefined,
  { start }: RunwayOfAerodrome,
  phase: Phase,
) {
  const displaced =
    phase === 'landing' && end.displacedThreshold !== undefined ? si('length', end.displacedThreshold) : 0;
  return {
    designator: end.designator,
    direction: end.direction,
    directionReference: 'true' as const,
    magneticVariation,
    elevation,
    slope: slopeFrom(end.slope, point === undefined ? displaced : si('length', point.distance)),
    surface: end.surface,
    start,
    declared: point?.declared ?? end.declared,
    ...(phase === 'takeoff' && end.obstacles !== undefined ? { obstacles: end.obstacles } : {}),
    onFile: { aerodrome: id, revision, ...(point === undefined ? {} : { full: end.declared }) },
  };
}

function slopeFrom(slope: SlopeOnWire, distance: number): SlopeOnWire {
  if (!('profile' in slope) || distance === 0) return slope;
  return { profile: laterProfile(slope.profile, fromSi('length', distance, slope.profile.units[0])) };
}

function merged(filed: ReturnType<typeof onFile>, given: RunwayOfAerodrome): RunwayOnWire {
  const { aerodrome: _, end: __, start: ___, slope, ...overrides } = given;
  const whole = mergePatch(filed, overrides) as Omit<typeof filed, 'surface' | 'declared' | 'obstacles'> &
    Pick<RunwayOnWire, 'surface' | 'lineUp' | 'obstacles'> & { readonly declared: DeclaredOnWire };
  const { kind, state, ...surface } = whole.surface;
  const changes = changedMembers(filed, overrides, whole);
  if (slope !== undefined) changes.push({ at: '/slope', before: filed.slope, change: slope, after: slope });
  const changed = changes.filter(({ before, after }) => before !== undefined && !same(before, after)).map(changeText);
  return {
    designator: whole.designator,
    direction: whole.direction,
    directionReference: whole.directionReference,
    magneticVariation: whole.magneticVariation,
    elevation: whole.elevation,
    slope: slope ?? filed.slope,
    surface: { kind, state, ...surface },
    start: filed.start,
    ...(whole.lineUp === undefined ? {} : { lineUp: whole.lineUp }),
    declared: whole.declared,
    ...(whole.obstacles === undefined ? {} : { obstacles: whole.obstacles }),
    onFile: { ...filed.onFile, ...(changed.length === 0 ? {} : { changed }) },
  };
}

function same(one: unknown, other: unknown): boolean {
  return JSON.stringify(one) === JSON.stringify(other);
}
