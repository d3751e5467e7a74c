import { z } from 'zod';
import { aeroplaneChoice } from '../aeroplane-choice.ts';
import { asOf, reference } from '../question-frame.ts';
import { manualTable, tableMembers } from './manual-table.ts';

/** What POST /v1/aeroplanes/tables is asked and answers. */
export const tableRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice
      .meta({
        description: 'The aeroplane that the table is for: its configurations and its calibration are checked too.',
      })
      .exactOptional(),
    ...tableMembers,
    csv: z.string().min(1).max(60_000).meta({
      description:
        'Columns and rows as CSV: a first line of headings name [unit], then one line of numbers for each combination printed.',
    }),
  })
  .meta({ id: 'TableRequest', description: 'A table of a flight manual as CSV, with what is printed around it.' });

export const tableFindingCodes = ['not-every-combination', 'no-edge', 'not-spoken-of', 'not-checked'] as const;

export const tableResponse = z
  .strictObject({
    outcome: z.literal('in-order').meta({ description: 'A table with a fault is refused.' }),
    table: manualTable.meta({ description: 'The table as a definition has it, under flightManual.tables.' }),
    findings: z
      .array(
        z
          .strictObject({
            code: z.enum(tableFindingCodes).meta({ description: 'Stable code of the finding.' }),
            message: z.string().meta({ description: 'The finding in a sentence.' }),
          })
          .meta({ id: 'TableFinding', description: 'What is worth knowing of a table that is in order.' }),
      )
      .meta({ description: 'What is worth knowing of the table, though nothing is wrong with it.' }),
  })
  .meta({ id: 'TableResponse', description: 'A table ready for a definition.' });

export type TableRequest = z.infer<typeof tableRequest>;
export type TableResponse = z.infer<typeof tableResponse>;
export type TableFinding = TableResponse['findings'][number];
