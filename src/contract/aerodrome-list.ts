import { z } from 'zod';
import { type AerodromeDefinition, aerodromeDefinition } from './aerodrome-definition.ts';
import { shortText } from './text.ts';

const { id, revision, name, elevation } = aerodromeDefinition.shape;

const listedAerodrome = z
  .strictObject({
    id,
    revision,
    name,
    elevation,
    ends: z.array(shortText).meta({ description: 'Designators of its runway ends.' }),
    digest: z.string().meta({ description: 'SHA-256 of the definition, hex.' }),
  })
  .meta({ id: 'ListedAerodrome', description: 'An aerodrome of the catalogue, in short.' });

/** The answer of GET /v1/aerodromes. */
export const aerodromeList = z
  .strictObject({ aerodromes: z.array(listedAerodrome) })
  .meta({ id: 'AerodromeList', description: 'The aerodromes that a question may name by id.' });

export function toListedAerodrome(definition: AerodromeDefinition, digest: string): z.infer<typeof listedAerodrome> {
  const { id, revision, name, elevation, ends } = definition;
  return { id, revision, name, elevation, ends: ends.map(({ designator }) => designator), digest };
}
