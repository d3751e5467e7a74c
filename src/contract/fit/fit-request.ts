import { z } from 'zod';
import { landingParameters } from '../../performance/fit/landing-model.ts';
import { aeroplaneChoice } from '../aeroplane-choice.ts';
import { sheetMembers } from '../flight-manual/manual-sheet.ts';
import { tableBody } from '../flight-manual/manual-table.ts';
import {
  airspeed,
  climbHeight,
  headwind,
  manualDistance,
  mass,
  pressureAltitude,
  slope,
  temperature,
} from '../quantities.ts';
import { asOf, reference, rounding, units } from '../question-frame.ts';
import { surface } from '../runway.ts';
import { id, shortText } from '../text.ts';

/** Tables and runs of one fit at most. */
const mostTables = 24;
const mostRuns = 200;

/** Parameters of a fit by their name in the contract. */
export const fitParameters = [
  'thrustFactor',
  'airDragShiftCoefficient',
  'altitudeLapseCoefficient',
  'temperatureExponent',
  ...landingParameters,
] as const;

/** A table as it is fitted to: read as printed, so that the fit may say what is wrong with it. */
export const fitTable = z
  .strictObject({
    source: shortText.meta({ description: 'Document and page.' }).exactOptional(),
    conditions: sheetMembers.conditions,
    contains: sheetMembers.contains,
    ...tableBody,
  })
  .meta({
    id: 'FitTable',
    description:
      'A table of distances as printed, for the configuration of the question. Rows are not held against each other before the fit.',
  });

const percentOf = (what: string) =>
  z
    .number()
    .min(0.1)
    .max(30)
    .meta({ description: `Standard deviation of ${what}, in per cent of it.` });

/** Distances that somebody measured in one run. */
export const measuredRun = z
  .strictObject({
    mass,
    pressureAltitude,
    temperature,
    headwind,
    slope,
    surface: surface.omit({ runwayConditionCode: true, contaminant: true, brakingFrictionCoefficient: true }).meta({
      id: 'FitSurface',
      description: 'The surface it was measured on.',
    }),
    uncertaintyPercent: percentOf('each distance'),
    groundRoll: manualDistance
      .meta({ description: 'From brake release to lift-off, or from touchdown to the stop.' })
      .exactOptional(),
    takeoffDistance: manualDistance.meta({ description: 'From brake release to the screen.' }).exactOptional(),
    landingDistance: manualDistance.meta({ description: 'From the screen to the stop.' }).exactOptional(),
    markers: z
      .array(
        z
          .strictObject({
            distance: manualDistance.meta({ description: 'From brake release.' }),
            groundSpeed: airspeed.exactOptional(),
            cas: airspeed.meta({ description: 'Calibrated airspeed.' }).exactOptional(),
            speedUncertaintyPercent: percentOf('the speed'),
          })
          .meta({
            id: 'SpeedMarker',
            description: 'The speed at a distance, before lift-off: exactly one of groundSpeed and cas.',
          }),
      )
      .max(10)
      .exactOptional(),
    heights: z
      .array(
        z
          .strictObject({ distance: manualDistance.meta({ description: 'From brake release.' }), height: climbHeight })
          .meta({ id: 'HeightAtDistance', description: 'The height at a distance, up to the screen.' }),
      )
      .max(10)
      .exactOptional(),
  })
  .meta({ id: 'MeasuredRun', description: 'One measured takeoff or landing, with its conditions and uncertainty.' });

const measuredStall = z
  .strictObject({
    cas: airspeed.meta({ description: 'Calibrated airspeed, wings level, at a load factor of one.' }),
    mass,
    uncertaintyPercent: percentOf('the speed'),
  })
  .meta({ id: 'MeasuredStall', description: 'A stall speed that was measured in the configuration.' });

export const fitRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice,
    for: z.enum(['takeoff', 'landing']).meta({ description: 'What is fitted.' }),
    configuration: id.meta({ description: "One of the aeroplane's configurations." }),
    tables: z
      .array(fitTable)
      .min(1)
      .max(mostTables)
      .meta({ description: "Absent, and no runs: the tables of the aeroplane's flight manual for the configuration." })
      .exactOptional(),
    runs: z.array(measuredRun).min(1).max(mostRuns).exactOptional(),
    stalls: z
      .array(measuredStall)
      .min(1)
      .max(50)
      .meta({ description: "In place of the definition's maximum lift." })
      .exactOptional(),
    dryAir: z.literal(true).meta({ description: 'The tables state dry air.' }).exactOptional(),
    free: z
      .array(z.enum(fitParameters))
      .min(1)
      .max(4)
      .meta({ description: 'Parameters to fit. Absent: all that the distances show.' })
      .exactOptional(),
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({
    id: 'FitRequest',
    description: 'An aeroplane, and the published or measured distances that its physics is to be fitted to.',
  });

export type FitRequest = z.infer<typeof fitRequest>;
export type FitTableOnWire = z.infer<typeof fitTable>;
export type MeasuredRunOnWire = z.infer<typeof measuredRun>;
