import type { Fault } from '../planning/fault.ts';
import type { AeroplaneChoice } from './aeroplane-choice.ts';
import type { AeroplaneLookup, KnownAeroplane } from './aeroplane-lookup.ts';
import { checkAeroplane } from './check-aeroplane.ts';
import { toAeroplane } from './to-aeroplane.ts';
import { unknownId } from './unknown-id.ts';

/** Where the aeroplane of a question stands in it: faults and assumptions about it point there. */
export function aeroplaneAt(given: AeroplaneChoice): string {
  return 'id' in given ? '/aeroplane' : '/aeroplane/definition';
}

/** The aeroplane a question means: the one on file, or the one that came with it. */
export function toKnownAeroplane(given: AeroplaneChoice, lookup: AeroplaneLookup): KnownAeroplane | Fault[] {
  if (!('id' in given)) {
    const faults = checkAeroplane(given.definition, '/aeroplane/definition');
    if (faults.length > 0) return faults;
    return { aeroplane: toAeroplane(given.definition), digest: lookup.digestOf(given.definition) };
  }
  const known = lookup.get(given.id);
  if (known === undefined) return [unknownId('/aeroplane/id', 'aeroplane', given.id, lookup.ids)];
  const { revision } = known.aeroplane;
  if (given.revision !== undefined && given.revision !== revision) {
    return [
      {
        pointer: '/aeroplane/revision',
        code: 'contradiction',
        message: `Revision ${revision} of ${given.id} is on file.`,
        received: given.revision,
        allowed: revision,
      },
    ];
  }
  return known;
}
