import { z } from 'zod';
import type { Aeroplane } from '../performance/aeroplane.ts';
import type { AeroplaneChanges } from '../planning/question.ts';
import { aeroplaneDefinition } from './aeroplane-definition.ts';
import { orderOfIds } from './order-of-ids.ts';
import { orderOfMembers } from './order-of-members.ts';
import { id, reason, shortText } from './text.ts';

const revision = shortText.meta({ description: 'If given, the revision must be the one on file.' }).exactOptional();
const inline = z.strictObject({ definition: aeroplaneDefinition });
const inlineInOrder = inline.overwrite(({ definition }) => ({ definition: orderOfIds(definition) }));
const changed = {
  basedOn: id.meta({ description: 'An id of the catalogue.' }),
  revision,
  changes: z.record(z.string().max(64), z.unknown()).overwrite(orderOfMembers).meta({
    description: 'JSON merge patch (RFC 7396) of its definition; null takes a member out.',
    minProperties: 1,
    maxProperties: 24,
  }),
  because: reason.meta({ description: 'Why the aeroplane is changed; repeated in a caution.' }),
};

const onFile = z.strictObject({ id, revision });

/** An aeroplane without changes: what is asked is of its own flight manual. */
export const aeroplaneAsItStands = z
  .union([onFile, inlineInOrder])
  .meta({ id: 'AeroplaneAsItStands', description: 'The aeroplane: an id of the catalogue, or a whole definition.' });

export const aeroplaneChoice = z.union([onFile, inlineInOrder, z.strictObject(changed)]).meta({
  id: 'Aeroplane',
  description: 'The aeroplane: an id of the catalogue, a whole definition, or one of the catalogue with changes.',
});

/** The aeroplane as an answer echoes it: one of the catalogue always with its revision. */
export const aeroplaneUnderstood = z
  .union([z.strictObject({ id, revision: shortText }), inline, z.strictObject({ ...changed, revision: shortText })])
  .meta({
    id: 'AeroplaneUnderstood',
    description: 'The aeroplane: an id of the catalogue with its revision, the definition, or the id with the changes.',
  });

export type AeroplaneChoice = z.infer<typeof aeroplaneChoice>;
export type ChangedAeroplaneChoice = Extract<AeroplaneChoice, { basedOn: string }>;

/** The aeroplane of a choice, and the changes it came to it by. */
export interface Chosen {
  readonly aeroplane: Pick<Aeroplane, 'revision'>;
  readonly changes?: Pick<AeroplaneChanges, 'revision'>;
}

/** The echo of a choice. */
export function asChosen(choice: AeroplaneChoice, { aeroplane, changes }: Chosen): z.infer<typeof aeroplaneUnderstood> {
  if ('id' in choice) return { id: choice.id, revision: aeroplane.revision };
  if ('definition' in choice) return choice;
  const { basedOn, changes: patch, because } = choice;
  return { basedOn, revision: (changes ?? aeroplane).revision, changes: patch, because };
}
