import { z } from 'zod';
import {
  airspeed,
  climbGradient,
  flapAngle,
  headwind,
  manualDistance,
  mass,
  pressureAltitude,
  rateOfClimb,
  slope,
  temperature,
  temperatureAboveStandard,
} from '../quantities.ts';
import type { Q } from '../quantity.ts';
import { manualSurface } from './manual-sheet.ts';

/** The greatest of such a difference in each unit; our choice. */
const greatestWithin = { m: 100, ft: 300, percent: 2, 'ft/min': 100, 'm/s': 3, kt: 5, 'km/h': 10, mph: 6 } as const;
type WithinUnit = keyof typeof greatestWithin;

/** How near to what the manual reads, in the measure of what it reads. */
const within = z
  .discriminatedUnion(
    'unit',
    Object.entries(greatestWithin).map(([unit, most]) =>
      z.strictObject({ value: z.number().min(0).max(most), unit: z.literal(unit as WithinUnit) }),
    ) as unknown as [z.ZodObject, ...z.ZodObject[]],
  )
  .meta({
    id: 'ManualTolerance',
    description: 'Greatest difference from what the manual reads, itself included.',
  }) as unknown as z.ZodType<Q<WithinUnit>>;

/** Something that the manual works out itself, and that its sheet must give again. */
export const workedExample = z
  .strictObject({
    given: z
      .strictObject({
        flap: flapAngle.exactOptional(),
        mass: mass.exactOptional(),
        pressureAltitude: pressureAltitude.exactOptional(),
        temperature: temperature.exactOptional(),
        temperatureDeviation: temperatureAboveStandard.exactOptional(),
        headwind: headwind.meta({ description: 'Negative on the tail. Absent: calm.' }).exactOptional(),
        slope: slope.meta({ description: 'Uphill positive. Absent: level.' }).exactOptional(),
        surface: manualSurface.meta({ description: "Absent: the sheet's own." }).exactOptional(),
      })
      .meta({ id: 'ManualExampleGiven', description: 'What the example is worked for.' }),
    reads: z
      .strictObject({
        groundRoll: manualDistance.exactOptional(),
        takeoffDistance: manualDistance.exactOptional(),
        landingDistance: manualDistance.exactOptional(),
        climbGradient: climbGradient.exactOptional(),
        climbRate: rateOfClimb.exactOptional(),
        liftOff: airspeed.exactOptional(),
        screen: airspeed.exactOptional(),
        landingReference: airspeed.exactOptional(),
      })
      .meta({ id: 'ManualExampleReads', description: 'What the manual reads, one or more.' }),
    within,
  })
  .meta({ id: 'ManualExample', description: 'A worked example of the manual, which its sheet must give again.' });

export const workedExamples = z.array(workedExample).min(1).max(12);

export type WorkedExampleOnWire = z.infer<typeof workedExample>;
