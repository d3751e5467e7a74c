import { z } from 'zod';
import { type Reference, references } from '../references.ts';

const listedSource = z
  .strictObject({
    key: z.string().meta({ description: 'How answers name the source.' }),
    title: z.string(),
    status: z.enum(['read', 'secondary', 'memory', 'derived', 'judgement']).meta({
      description: 'Whether the text was read, seen as quoted, not confirmed, worked out by us, or our choice.',
    }),
  })
  .meta({ id: 'ListedSource', description: 'A source of the numbers.' });

/** The answer of GET /v1/sources. */
export const sourceList = z
  .strictObject({ sources: z.array(listedSource) })
  .meta({ id: 'SourceList', description: 'Every source that an answer may name, with how well it is confirmed.' });

export function toSourceList(): z.infer<typeof sourceList> {
  const entries = Object.entries(references) as [string, Reference][];
  return { sources: entries.map(([key, { title, status }]) => ({ key, title, status })) };
}
