import { z } from 'zod';
import { categories } from '../performance/aeroplane.ts';
import { ruleSets } from '../planning/rules/rule-sets.ts';
import { type ReferenceKey, references } from '../references.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';
import { source, sources } from './answer-parts.ts';
import { id } from './text.ts';
import { namedSource } from './to-basis.ts';

/** What the GET routes list. */
export const aeroplanesResponse = z
  .strictObject({
    aeroplanes: z.array(
      z
        .strictObject({
          id,
          revision: z.string(),
          name: z.string(),
          category: z.enum(categories),
          configurations: z.array(
            z
              .strictObject({ id, for: z.array(z.enum(['takeoff', 'landing'])) })
              .meta({ id: 'ListedConfiguration', description: 'A configuration and what it is for.' }),
          ),
          digest: z.string().meta({ description: 'SHA-256 of the definition, hex.' }),
        })
        .meta({
          id: 'ListedAeroplane',
          description: 'An aeroplane on file; GET by its id gives the whole definition.',
        }),
    ),
  })
  .meta({ id: 'AeroplanesResponse', description: 'The aeroplanes on file.' });

export const ruleSetsResponse = z
  .strictObject({
    ruleSets: z.array(
      z
        .strictObject({ id, title: z.string(), source })
        .meta({ id: 'ListedRuleSet', description: 'A rule set that a question can name.' }),
    ),
  })
  .meta({ id: 'RuleSetsResponse', description: 'The rule sets.' });

export const sourcesResponse = z
  .strictObject({ sources })
  .meta({ id: 'SourcesResponse', description: 'Every source of a constant, a formula or a rule.' });

/** The aeroplanes on file, in the lookup's order. */
export function listAeroplanes({ ids, get }: AeroplaneLookup): z.infer<typeof aeroplanesResponse> {
  return {
    aeroplanes: ids.flatMap((id) => {
      const known = get(id);
      if (known === undefined) return [];
      const { revision, name, category, configurations } = known.aeroplane;
      const listed = Object.entries(configurations).map(([key, one]) => ({ id: key, for: [...one.for] }));
      return [{ id, revision, name, category, configurations: listed, digest: known.digest }];
    }),
  };
}

export function listRuleSets(): z.infer<typeof ruleSetsResponse> {
  return { ruleSets: ruleSets.map(({ id, title, source }) => ({ id, title, source })) };
}

export function listSources(): z.infer<typeof sourcesResponse> {
  return { sources: (Object.keys(references) as ReferenceKey[]).map(namedSource) };
}
