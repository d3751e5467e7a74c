import { z } from 'zod';
import { graphAxis, graphOutput } from './manual-columns.ts';
import { sheetMembers } from './manual-sheet.ts';
import { notes } from './manual-table.ts';
import { workedExamples } from './worked-example.ts';

const number = z.number().min(-10_000).max(1_000_000);

const curve = (parameter: string) =>
  z.strictObject({
    parameter: number.meta({ description: parameter }),
    points: z
      .array(z.tuple([number, number]))
      .min(2)
      .max(60)
      .meta({ description: 'Along the curve: the value across, rising, and the height.' }),
  });

const entry = z
  .union([z.literal('previous'), graphAxis])
  .meta({ id: 'ManualGraphEntry', description: 'An axis, or previous for what the panel before gave.' });

/** One panel of digitised curves. */
const panel = z
  .discriminatedUnion('kind', [
    z.strictObject({
      kind: z.literal('curves'),
      across: entry,
      parameter: entry,
      curves: z.array(curve('Value of the parameter, in its unit, for which the curve is drawn.')).min(2).max(24),
    }),
    z.strictObject({
      kind: z.literal('guide'),
      across: graphAxis,
      reference: number.meta({ description: 'Where the guide lines begin, in the unit across.' }),
      curves: z.array(curve('Height of the guide line at the reference.')).min(2).max(24),
    }),
  ])
  .meta({
    id: 'ManualGraphPanel',
    description:
      'A panel of curves, read at a value across on the curve of the parameter, or of guide lines that carry what the panel before gave from the reference to a value across.',
  });

/** A graph of the manual: panels in a chain, what one gives enters the next. */
export const manualGraph = z
  .strictObject({
    ...sheetMembers,
    output: graphOutput,
    notes: notes.exactOptional(),
    panels: z.array(panel).min(1).max(8).meta({ description: 'In the order in which the graph is followed.' }),
    workedExamples: workedExamples.meta({
      description: 'At least one: a graph that cannot be verified is not used.',
    }),
  })
  .meta({
    id: 'ManualGraph',
    description: 'A graph of the flight manual, digitised. It is read inside its curves alone.',
  });

export type ManualGraphOnWire = z.infer<typeof manualGraph>;
