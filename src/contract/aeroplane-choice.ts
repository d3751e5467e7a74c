import { z } from 'zod';
import { aeroplaneDefinition } from './aeroplane-definition.ts';
import { id, shortText } from './text.ts';

export const aeroplaneChoice = z
  .union([
    z.strictObject({
      id,
      revision: shortText.meta({ description: 'If given, the revision must be the one on file.' }).exactOptional(),
    }),
    z.strictObject({ definition: aeroplaneDefinition }),
  ])
  .meta({ id: 'Aeroplane', description: 'The aeroplane: an id of the catalogue or a whole definition.' });

/** The aeroplane as an answer echoes it: by id always with its revision. */
export const aeroplaneUnderstood = z
  .union([z.strictObject({ id, revision: shortText }), z.strictObject({ definition: aeroplaneDefinition })])
  .meta({
    id: 'AeroplaneUnderstood',
    description: 'The aeroplane: an id of the catalogue with its revision, or the definition.',
  });

/** The echo of a choice. */
export function asChosen(choice: AeroplaneChoice, revision: string): z.infer<typeof aeroplaneUnderstood> {
  return 'id' in choice ? { id: choice.id, revision } : choice;
}

export type AeroplaneChoice = z.infer<typeof aeroplaneChoice>;
