import { z } from 'zod';
import { measure } from './answer-parts.ts';

export const shortfall = z
  .strictObject({
    at: z.string().meta({ description: 'JSON pointer into the question, or the speed or gradient that falls short.' }),
    axis: z.string().exactOptional(),
    table: z.string().exactOptional(),
    given: measure,
    bound: measure,
    side: z.enum(['above', 'below']).meta({ description: 'On which side of the bound the given number lies.' }),
  })
  .meta({ id: 'Shortfall', description: 'Why there are no distances, in numbers.' });

export type ShortfallOnWire = z.infer<typeof shortfall>;
