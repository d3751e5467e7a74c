import { z } from 'zod';
import { aeroplaneUnderstood } from '../aeroplane-choice.ts';
import { advisory, digest, modelVersion, sources } from '../answer-parts.ts';
import { manualTable } from '../flight-manual/manual-table.ts';
import { id, shortText } from '../text.ts';
import { proofRequest } from './proof-request.ts';

const { page, for: phase, configurations, conditions, contains, notes } = manualTable.shape;

/** What POST /v1/aeroplanes/proof answers. */
export const proofResponse = z
  .strictObject({
    outcome: z.enum(['every-cell-agrees', 'cells-differ']).meta({
      description: 'Whether the look-up gives every printed figure again at its own node.',
    }),
    advisory,
    table: z
      .strictObject({
        id,
        document: shortText,
        revision: shortText,
        page,
        for: phase,
        configurations,
        conditions,
        contains,
        notes,
      })
      .meta({ id: 'ProvedTable', description: 'The table, with everything that is not in its rows.' }),
    physics: z
      .array(z.strictObject({ configuration: id, method: z.enum(['fitted', 'stated']) }))
      .meta({ description: 'Whose physics stands beside the rows, and how it came about.' }),
    columns: z
      .array(
        z
          .strictObject({
            name: z.string(),
            unit: z.string().exactOptional(),
          })
          .meta({ id: 'ProofColumn', description: 'A column: its name, and its unit where it has one.' }),
      )
      .meta({
        description:
          'row and the columns entered with; then for each figure the printed one (groundRoll), the one looked up (groundRollRead), whether they agree (groundRollAgrees), the one of physics (groundRollPhysics), and printed over physics (groundRollRatio).',
      }),
    rows: z
      .array(z.array(z.union([z.number(), z.string()])))
      .meta({ description: 'One row for each row of the table; no data is written where there is none.' }),
    counts: z
      .strictObject({
        cells: z.number().int(),
        differ: z.array(z.string()).meta({ description: 'Pointers to the cells of the table that differ.' }),
      })
      .meta({ id: 'ProofCounts', description: 'How many cells there are, and which differ.' }),
    basis: z
      .strictObject({ sources, modelVersion, digests: z.strictObject({ aeroplane: digest }) })
      .meta({ id: 'ProofBasis', description: 'What the proof rests on.' }),
    question: z
      .strictObject({ ...proofRequest.shape, aeroplane: aeroplaneUnderstood })
      .meta({ id: 'ProofQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'ProofResponse', description: 'Each cell of a table back as the service computes it.' });

export type ProofResponse = z.infer<typeof proofResponse>;
