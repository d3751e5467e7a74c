import { z } from 'zod';
import { shortText } from '../text.ts';
import { manualGraph } from './manual-graph.ts';
import { manualSpeedTable, manualTable } from './manual-table.ts';

/** Tables, speed tables and graphs of a manual at most, together; our choice. */
export const mostSheets = 24;

/** What was typed in from the flight manual of an aeroplane. */
export const flightManual = z
  .strictObject({
    document: shortText.meta({ description: 'Title or number of the document.' }),
    revision: shortText.meta({ description: 'Its revision.' }),
    tables: z.array(manualTable).max(mostSheets).exactOptional(),
    speedTables: z.array(manualSpeedTable).max(mostSheets).exactOptional(),
    graphs: z.array(manualGraph).max(mostSheets).exactOptional(),
  })
  .meta({
    id: 'FlightManual',
    description:
      "The flight manual's own figures, as printed, with their notes: at most 24 tables and graphs together.",
  });

export type FlightManualOnWire = z.infer<typeof flightManual>;
