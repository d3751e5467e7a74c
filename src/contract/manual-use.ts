import { z } from 'zod';
import { quantity } from './answer-parts.ts';
import { shortfall } from './shortfall.ts';

/** What an answer took from the flight manual. */
export const manualUse = z
  .strictObject({
    document: z.string(),
    revision: z.string(),
    tables: z
      .array(z.strictObject({ id: z.string(), page: z.string() }))
      .meta({ description: 'The tables and graphs that were read.' }),
    groundRoll: quantity
      .meta({ description: "The manual's own figure, its notes applied, before anything is carried further." })
      .exactOptional(),
    wholeDistance: quantity
      .meta({ description: "The manual's own distance to or from the screen, its notes applied." })
      .exactOptional(),
    notes: z
      .array(
        z.strictObject({
          table: z.string(),
          about: z.string().meta({ description: 'headwind, tailwind, uphill, surface ...' }),
          text: z.string().meta({ description: 'As printed.' }).exactOptional(),
          given: z.union([quantity, z.number()]).meta({ description: 'What it was applied to.' }).exactOptional(),
          factor: z.number().meta({ description: 'What it makes of what it multiplies.' }),
        }),
      )
      .meta({ description: 'The notes in the order in which they were applied.' }),
    notSpokenOf: z
      .array(z.enum(['wind', 'slope', 'surface', 'procedure', 'changes']))
      .meta({ description: 'What the manual does not speak of: its figure is carried there by physics.' }),
    edges: z.array(shortfall).meta({ description: 'Where the edge of a table stands for what lies beyond it.' }),
  })
  .meta({ id: 'ManualUse', description: 'What was read in the flight manual.' });

export const otherMethod = z
  .strictObject({
    method: z.enum(['flight-manual', 'fitted', 'stated', 'geometry']),
    distance: quantity.meta({ description: 'The takeoff or landing distance by that method.' }),
    ratio: z.number().meta({ description: 'Over the distance of this answer.' }),
  })
  .meta({ id: 'OtherMethod', description: 'The same distance by the method that was not taken.' });
