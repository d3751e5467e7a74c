import { z } from 'zod';
import { noteTargets } from '../../performance/flight-manual/flight-manual.ts';
import { massStep, pressureAltitude, slopeStep, temperatureStep, windStep } from '../quantities.ts';
import { text } from '../text.ts';
import { manualSurface } from './manual-sheet.ts';

const changePercent = z
  .number()
  .min(-90)
  .max(500)
  .meta({ description: 'Change for one step of per: 10 is 10 % more, -10 is 10 % less.' });

const says = {
  multiplies: z.enum(noteTargets).meta({
    description:
      'What the change is of: both distances, the ground roll or the whole distance alone, the climb, or the ground roll with the same length added to both distances.',
  }),
  text: text(300).meta({ description: 'The note as printed.' }).exactOptional(),
};

const proportional = {
  changePercent: changePercent.exactOptional(),
  byPressureAltitude: z
    .array(
      z
        .strictObject({
          upTo: pressureAltitude
            .meta({ description: 'Pressure altitude up to which it holds; the last one has none.' })
            .exactOptional(),
          changePercent,
        })
        .meta({ id: 'ManualNoteBand', description: 'The change within a band of pressure altitude.' }),
    )
    .min(2)
    .max(12)
    .meta({ description: 'In place of changePercent: changes by bands of pressure altitude, rising.' })
    .exactOptional(),
  wholeSteps: z
    .literal(true)
    .meta({ description: "Only whole steps count: the manual says 'each full'." })
    .exactOptional(),
  ...says,
};

const limit = 'The most that the note speaks of.';

/** One note, in the order in which the manual applies them. */
export const manualNote = z
  .discriminatedUnion('about', [
    z.strictObject({
      about: z.enum(['headwind', 'tailwind']),
      per: windStep,
      limit: windStep.meta({ description: `${limit} Absent: 20 kt.` }).exactOptional(),
      windAllowance: z
        .literal(true)
        .meta({ description: 'It credits half of a headwind, or one and a half of a tailwind, already.' })
        .exactOptional(),
      ...proportional,
    }),
    z.strictObject({
      about: z.enum(['uphill', 'downhill']),
      per: slopeStep,
      limit: slopeStep.meta({ description: `${limit} Absent: 2 %.` }).exactOptional(),
      ...proportional,
    }),
    z.strictObject({
      about: z.enum(['aboveStandard', 'belowStandard']),
      per: temperatureStep,
      limit: temperatureStep.meta({ description: `${limit} Absent: 40 degC.` }).exactOptional(),
      ...proportional,
    }),
    z.strictObject({
      about: z.enum(['aboveMass', 'belowMass']),
      per: massStep,
      limit: massStep.meta({ description: `${limit} It is off the mass of the conditions.` }),
      ...proportional,
    }),
    z.strictObject({ about: z.literal('surface'), surface: manualSurface, changePercent, ...says }),
  ])
  .meta({
    id: 'ManualNote',
    description:
      'A note of a sheet. Within one note the change is proportional, several notes multiply, and a share of the ground roll is of the roll as corrected so far.',
  });

export type ManualNoteOnWire = z.infer<typeof manualNote>;
