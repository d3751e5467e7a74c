import type { Aeroplane } from '../performance/aeroplane.ts';
import { type Fault, isRefused } from '../planning/fault.ts';
import type { ChangedAeroplaneChoice } from './aeroplane-choice.ts';
import type { AeroplaneLookup, KnownAeroplane } from './aeroplane-lookup.ts';
import { type ChangedMember, changedMembers, changeText } from './changed-members.ts';
import { checkAeroplane } from './check-aeroplane.ts';
import { mergePatch } from './merge-patch.ts';
import { readDefinition } from './read-definition.ts';
import { nearestNames } from './reading/nearest-name.ts';
import { isPlainObject } from './reading/object-faults.ts';
import { shortened } from './reading/scalar-faults.ts';
import { toAeroplane } from './to-aeroplane.ts';

/** Where the changes stand in the request: faults and assumptions about the changed aeroplane point there. */
export const changesAt = '/aeroplane/changes';

/**
 * An aeroplane on file with changes merged into its definition, read as strictly as a whole definition.
 *
 * A change must change something, and what is taken out must be there: a misspelt name would otherwise leave the aeroplane as
 * it is, unseen.
 *
 * @param base - the aeroplane on file
 * @returns the changed aeroplane, or every fault, each at the change that brings it about
 * @see references.Rfc7396
 */
export function toChangedAeroplane(
  { basedOn, changes, because }: ChangedAeroplaneChoice,
  base: KnownAeroplane,
  lookup: AeroplaneLookup,
): KnownAeroplane | Fault[] {
  const merged = mergePatch(base.definition, changes);
  const members = changedMembers(base.definition, changes, merged);
  const idle = idleFaults(members, base);
  const read = readDefinition(merged);
  if (isRefused(read)) return [...idle, ...read.refused.map((fault) => atChange(fault, changes))];
  const faults = [...idle, ...checkAeroplane(read.value, '').map((fault) => atChange(fault, changes))];
  if (faults.length > 0) return faults;
  const really = members.filter(differs);
  const ambiguous = sheetsOfUnknownAeroplane(really);
  if (ambiguous.length > 0) return ambiguous;
  const isRefitted = really.some(standsForFit);
  return {
    definition: read.value,
    aeroplane: withoutFit(toAeroplane(read.value), isRefitted),
    digest: lookup.digestOf(read.value),
    changes: {
      basedOn,
      revision: base.aeroplane.revision,
      because,
      changed: really.map(changeText),
      ...(really.some(movesDistances) ? { flewAs: withoutFit(base.aeroplane, isRefitted) } : {}),
    },
  };
}

/** Changes that change nothing. */
function idleFaults(members: readonly ChangedMember[], { aeroplane, definition }: KnownAeroplane): Fault[] {
  const faults = members.filter(({ before, change }) => change === null && before === undefined).map(nothingToTakeOut);
  if (faults.length > 0 || members.some(differs)) return faults;
  return [
    {
      pointer: changesAt,
      code: members.length === 0 ? 'missing' : 'contradiction',
      message: `The changes leave ${aeroplane.id} as it is on file.`,
      allowed: `at least one change of ${Object.keys(definition).join(', ')}`,
    },
  ];

  function nothingToTakeOut({ at }: ChangedMember): Fault {
    const path = at.split('/').slice(1);
    const name = path.pop() as string;
    const parent = path.reduce<unknown>((node, step) => (isPlainObject(node) ? node[step] : undefined), definition);
    const near = nearestNames(name, isPlainObject(parent) ? Object.keys(parent) : [], 1);
    return {
      pointer: `${changesAt}${at}`,
      code: 'unknown-member',
      message: `${aeroplane.id} has no member ${shortened(name)} here that could be taken out.`,
      ...(near.length === 0 ? {} : { hint: `Perhaps ${near[0]}.` }),
    };
  }
}

/** Members that no distance hangs on, or that hold distances themselves. */
const named = [
  'id',
  'revision',
  'name',
  'passengerSeats',
  'certification',
  'masses',
  'limitations',
  'flightManual',
  'fit',
];

function movesDistances({ at }: ChangedMember): boolean {
  return !named.includes(at.split('/')[1] as string);
}

/**
 * New sheets of the flight manual beside a change that moves distances: physics would carry their figures by the change once more
 * where they are of the changed aeroplane already.
 */
function sheetsOfUnknownAeroplane(really: readonly ChangedMember[]): Fault[] {
  const moving = really.find(movesDistances);
  if (moving === undefined) return [];
  return really
    .filter(({ at, after }) => after !== undefined && /^\/flightManual(\/(tables|graphs))?$/.test(at))
    .map(({ at }) => ({
      pointer: `${changesAt}${at}`,
      code: 'contradiction',
      message: `The changes bring sheets of the flight manual and change ${moving.at.slice(1)}: they do not tell which aeroplane the sheets are of.`,
      allowed: 'one of the two',
      hint: 'Figures of the changed aeroplane go into a whole definition.',
    }));
}

/** Members whose figures a fit puts its own in place of: changed, they would be lost in it. */
const fittedMembers =
  /^\/(propulsion\/(thrustFactor|altitudeLapseCoefficient|temperatureExponent|humidityFactor|kind)|brakes\/(brakingFrictionCoefficient|loadFactor)|configurations\/[^/]+\/(airDragIncrementCoefficient|pullUpLoadFactor|approachAngle|flareLoadFactor|floatDecelerationRatio))$|^\/(propulsion|brakes)$/;

function standsForFit({ at }: ChangedMember): boolean {
  return fittedMembers.test(at);
}

/** The aeroplane as its physics is stated, where a change and a fit speak of the same figure. */
function withoutFit(aeroplane: Aeroplane, isRefitted: boolean): Aeroplane {
  if (!isRefitted || aeroplane.fit === undefined) return aeroplane;
  const { fit: _, ...stated } = aeroplane;
  return stated;
}

function differs({ before, after }: ChangedMember): boolean {
  return JSON.stringify(before) !== JSON.stringify(after);
}

/** A fault of the changed definition, at the change that it comes from, or at the nearest one above it. */
function atChange(fault: Fault, changes: ChangedAeroplaneChoice['changes']): Fault {
  let node: unknown = changes;
  let pointer = changesAt;
  for (const step of fault.pointer.split('/').slice(1)) {
    const name = step.replaceAll('~1', '/').replaceAll('~0', '~');
    if (!isPlainObject(node) || !Object.hasOwn(node, name)) {
      const hint = fault.hint ?? (fault.code === 'unknown-member' ? 'A change to null takes a member out.' : undefined);
      return {
        ...fault,
        pointer,
        message: `${fault.message} (${fault.pointer} of the changed aeroplane)`,
        ...(hint === undefined ? {} : { hint }),
      };
    }
    node = node[name];
    pointer = `${pointer}/${step}`;
  }
  return { ...fault, pointer };
}
