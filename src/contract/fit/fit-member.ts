import { z } from 'zod';
import { approachAngle, mass, pressureAltitude, temperature } from '../quantities.ts';
import { id, shortText } from '../text.ts';

const range = <Quantity extends z.ZodType>(quantity: Quantity) => z.strictObject({ from: quantity, to: quantity });

const sd = z.number().min(0).max(1);
const angleSd = z.strictObject({ value: z.number().min(0).max(10), unit: z.literal('deg') });

const correlation = z
  .array(z.array(z.number().min(-1).max(1)).max(4))
  .max(4)
  .meta({ description: 'Between the parameters with a standard deviation, in their order.' });

const heldTo = {
  fittedTo: z
    .string()
    .max(64)
    .regex(/^[0-9a-f]{64}$/)
    .meta({ description: 'SHA-256, hex, of the tables, runs and stall speeds it was fitted to.' }),
  modelVersion: shortText.meta({ description: 'The model it was fitted with.' }),
};

const found = {
  errors: z
    .strictObject({
      rmsPercent: z.number().min(0).max(100),
      greatestPercent: z.number().min(0).max(1000),
    })
    .meta({ id: 'FitErrors', description: '100 ln(computed/given): root mean square, and the greatest.' }),
  conditions: z
    .strictObject({ mass: range(mass), pressureAltitude: range(pressureAltitude), temperature: range(temperature) })
    .meta({ id: 'FitConditions', description: 'Range of the conditions it was fitted to.' }),
};

export const takeoffFit = z
  .strictObject({
    ...heldTo,
    thrustFactor: z.number().min(0.5).max(1.5).meta({ description: 'On all thrust.' }),
    airDragShiftCoefficient: z
      .number()
      .min(-0.05)
      .max(0.1)
      .meta({ description: "Added to the configuration's drag coefficient in the air." }),
    altitudeLapseCoefficient: z
      .number()
      .min(0)
      .max(0.5)
      .meta({ description: 'Of piston power with altitude.' })
      .exactOptional(),
    temperatureExponent: z
      .number()
      .min(0)
      .max(2)
      .meta({ description: 'Of piston power with temperature.' })
      .exactOptional(),
    dryAir: z
      .literal(true)
      .meta({ description: 'The distances are for dry air; else moisture is in them and takes no power again.' })
      .exactOptional(),
    standardDeviations: z
      .strictObject({
        thrustFactor: sd.exactOptional(),
        airDragShiftCoefficient: sd.exactOptional(),
        altitudeLapseCoefficient: sd.exactOptional(),
        temperatureExponent: sd.exactOptional(),
      })
      .meta({ id: 'TakeoffFitDeviations', description: 'Of the parameters that were fitted; a held one has none.' }),
    correlation,
    ...found,
  })
  .meta({ id: 'TakeoffFit', description: 'What was fitted to distances of a takeoff configuration.' });

export const landingFit = z
  .strictObject({
    ...heldTo,
    brakingFrictionCoefficient: z
      .number()
      .min(0.05)
      .max(1)
      .meta({ description: 'On the whole weight, on the surface of the tables.' }),
    approachAngle: approachAngle.meta({ description: 'With which the arc alone, without float, gives the distances.' }),
    standardDeviations: z
      .strictObject({ brakingFrictionCoefficient: sd.exactOptional(), approachAngle: angleSd.exactOptional() })
      .meta({ id: 'LandingFitDeviations', description: 'Of the parameters that were fitted; a held one has none.' }),
    correlation,
    ...found,
  })
  .meta({ id: 'LandingFit', description: 'What was fitted to distances of a landing configuration.' });

/** What POST /v1/aeroplanes/fit gives, kept with the definition. */
export const fit = z
  .strictObject({
    takeoff: z
      .record(id, takeoffFit)
      .meta({ description: 'By configuration, 1 to 24.', minProperties: 1, maxProperties: 24 })
      .exactOptional(),
    landing: z
      .record(id, landingFit)
      .meta({ description: 'By configuration, 1 to 24.', minProperties: 1, maxProperties: 24 })
      .exactOptional(),
  })
  .meta({
    id: 'Fit',
    description: 'Physics fitted to published or measured distances, as POST /v1/aeroplanes/fit gives it.',
  });

export type FitOnWire = z.infer<typeof fit>;
export type TakeoffFitOnWire = z.infer<typeof takeoffFit>;
export type LandingFitOnWire = z.infer<typeof landingFit>;
