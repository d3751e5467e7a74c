import { z } from 'zod';
import { manualPhases } from '../../performance/flight-manual/flight-manual.ts';
import { mass, screenHeight } from '../quantities.ts';
import { surface } from '../runway.ts';
import { id, shortText, text } from '../text.ts';

const { kind, state, grass, firmness, contaminant } = surface.shape;

/** A surface as a flight manual names it. */
export const manualSurface = z.strictObject({ kind, state, grass, firmness, contaminant }).meta({
  id: 'ManualSurface',
  description: 'A surface that a sheet or a note is for. What it leaves out it does not tell apart.',
});

export const sheetConfigurations = z
  .array(id)
  .min(1)
  .max(24)
  .meta({ description: 'Ids of the configurations of this aeroplane that it is for.' });
export const page = shortText.meta({ description: 'Page or figure of the document.' });

/** Members that tables and graphs share. */
export const sheetMembers = {
  id,
  for: z.enum(manualPhases).meta({ description: 'What the figures are of.' }),
  configurations: sheetConfigurations,
  page,
  conditions: z
    .strictObject({
      surface: manualSurface.meta({ description: 'The runway of the figures as printed, level.' }),
      mass: mass
        .meta({ description: 'The one mass of the figures, where mass is no column and no axis.' })
        .exactOptional(),
      technique: text(200).meta({ description: 'How it is flown, as printed.' }).exactOptional(),
      screenHeight: screenHeight
        .meta({
          description: "Absent: on takeoff the certification's own, on landing 50 ft.",
        })
        .exactOptional(),
    })
    .meta({ id: 'ManualConditions', description: 'What holds for every figure of the sheet.' }),
  contains: z
    .strictObject({
      factor: z
        .number()
        .min(1)
        .max(3)
        .meta({ description: 'Printed distance over the distance flown, where the figures are factored.' })
        .exactOptional(),
      windAllowance: z
        .literal(true)
        .meta({
          description: 'The headwind column credits half of a headwind and one and a half of a tailwind already.',
        })
        .exactOptional(),
    })
    .meta({ id: 'ManualContains', description: 'What the printed figures hold already.' })
    .exactOptional(),
};
