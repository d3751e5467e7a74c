import type { Fault } from '../planning/fault.ts';
import type { AeroplaneChoice } from './aeroplane-choice.ts';
import type { AeroplaneLookup, KnownAeroplane } from './aeroplane-lookup.ts';
import { checkAeroplane } from './check-aeroplane.ts';
import { toAeroplane } from './to-aeroplane.ts';
import { changesAt, toChangedAeroplane } from './to-changed-aeroplane.ts';
import { unknownId } from './unknown-id.ts';

/** Where the aeroplane of a question stands in it: faults and assumptions about it point there. */
export function aeroplaneAt(given: AeroplaneChoice): string {
  if ('id' in given) return '/aeroplane';
  return 'definition' in given ? '/aeroplane/definition' : changesAt;
}

/** The aeroplane a question means: the one on file, that one with changes, or the one that came with it. */
export function toKnownAeroplane(given: AeroplaneChoice, lookup: AeroplaneLookup): KnownAeroplane | Fault[] {
  if ('id' in given) return onFile(given.id, '/aeroplane/id', given.revision, lookup);
  if ('definition' in given) {
    const { definition } = given;
    const faults = checkAeroplane(definition, '/aeroplane/definition');
    if (faults.length > 0) return faults;
    return { definition, aeroplane: toAeroplane(definition), digest: lookup.digestOf(definition) };
  }
  const base = onFile(given.basedOn, '/aeroplane/basedOn', given.revision, lookup);
  return 'aeroplane' in base ? toChangedAeroplane(given, base, lookup) : base;
}

function onFile(
  id: string,
  at: string,
  revision: string | undefined,
  lookup: AeroplaneLookup,
): KnownAeroplane | Fault[] {
  const known = lookup.get(id);
  if (known === undefined) return [unknownId(at, 'aeroplane', id, lookup.ids)];
  const filed = known.aeroplane.revision;
  if (revision === undefined || revision === filed) return known;
  return [
    {
      pointer: '/aeroplane/revision',
      code: 'contradiction',
      message: `Revision ${filed} of ${id} is on file.`,
      received: revision,
      allowed: filed,
    },
  ];
}
