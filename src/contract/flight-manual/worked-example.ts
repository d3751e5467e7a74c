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
import { manualSurface } from './manual-sheet.ts';

/** How near to what the manual reads, in the measure of what it reads. */
const within = z
  .discriminatedUnion('unit', [
    z.strictObject({ value: z.number().min(0).max(100), unit: z.enum(['m', 'ft']) }),
    z.strictObject({ value: z.number().min(0).max(2), unit: z.literal('percent') }),
    z.strictObject({ value: z.number().min(0).max(100), unit: z.literal('ft/min') }),
    z.strictObject({ value: z.number().min(0).max(5), unit: z.enum(['m/s', 'kt', 'km/h', 'mph']) }),
  ])
  .meta({ id: 'ManualTolerance', description: 'Greatest difference from what the manual reads, itself included.' });

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
