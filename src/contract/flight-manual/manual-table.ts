import { z } from 'zod';
import { id } from '../text.ts';
import { speedColumn, tableColumn } from './manual-columns.ts';
import { manualNote } from './manual-note.ts';
import { page, sheetConfigurations, sheetMembers } from './manual-sheet.ts';
import { workedExamples } from './worked-example.ts';

/** Rows of a table at most; our choice, within what one question may hold. */
export const mostRows = 1000;

const cell = z.number().min(-10_000).max(1_000_000);

const airspeedKind = z
  .enum(['cas', 'ias'])
  .meta({ description: 'Kind of the speeds; ias needs the airspeed calibration of the definition.' });

export const notes = z
  .array(manualNote)
  .max(16)
  .meta({ description: 'In the order in which the manual applies them.' });

export const tableMembers = {
  ...sheetMembers,
  airspeed: airspeedKind.meta({ description: 'Kind of the speeds, where a column holds one.' }).exactOptional(),
  notes: notes.exactOptional(),
  workedExamples: workedExamples.exactOptional(),
};

export const tableBody = {
  columns: z
    .array(tableColumn)
    .min(2)
    .max(12)
    .meta({ description: 'Axes, outputs and the printed standard temperature, each once, in the order of the rows.' }),
  rows: z
    .array(z.array(cell).min(2).max(12))
    .min(2)
    .max(mostRows)
    .meta({ description: 'One row for each combination printed. A combination that is blank has no row.' }),
};

/** A table of the manual, as printed. */
export const manualTable = z
  .strictObject({ ...tableMembers, ...tableBody })
  .meta({ id: 'ManualTable', description: 'A table of the flight manual, as printed. It is never extrapolated.' });

/** Speeds by mass. */
export const manualSpeedTable = z
  .strictObject({
    id,
    configurations: sheetConfigurations,
    page,
    airspeed: airspeedKind,
    columns: z.array(speedColumn).min(2).max(7).meta({ description: 'Mass and one or more speeds, each once.' }),
    rows: z.array(z.array(cell).min(2).max(7)).min(1).max(60).meta({ description: 'One row a mass, rising.' }),
  })
  .meta({ id: 'ManualSpeedTable', description: 'Speeds of the procedure by mass, as printed.' });

export type ManualTableOnWire = z.infer<typeof manualTable>;
export type SpeedTableOnWire = z.infer<typeof manualSpeedTable>;
