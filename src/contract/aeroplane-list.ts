import { z } from 'zod';
import { type AeroplaneDefinition, aeroplaneDefinition } from './aeroplane-definition.ts';

const { id, revision, name, category, engines } = aeroplaneDefinition.shape;

const listedAeroplane = z
  .strictObject({
    id,
    revision,
    name,
    category,
    engines,
    configurations: z.array(id).meta({ description: 'Ids of its configurations.' }),
    digest: z.string().meta({ description: 'SHA-256 of the definition, hex.' }),
  })
  .meta({ id: 'ListedAeroplane', description: 'An aeroplane of the catalogue, in short.' });

/** The answer of GET /v1/aeroplanes. */
export const aeroplaneList = z
  .strictObject({ aeroplanes: z.array(listedAeroplane) })
  .meta({ id: 'AeroplaneList', description: 'The aeroplanes that a question may name by id.' });

export function toListedAeroplane(definition: AeroplaneDefinition, digest: string): z.infer<typeof listedAeroplane> {
  const { id, revision, name, category, engines, configurations } = definition;
  return { id, revision, name, category, engines, configurations: Object.keys(configurations), digest };
}
