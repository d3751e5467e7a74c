import { z } from 'zod';
import type { Severity } from '../planning/answer.ts';
import { references, type SourceStatus } from '../references.ts';
import { type Kind, unitFamilies, unitFor } from '../units/presentation.ts';
import { shownSchema } from './shown-quantity.ts';

/** Parts that several answers share. */
const sourceKey = z.enum(Object.keys(references) as [keyof typeof references]);
export const source = sourceKey.meta({ description: 'Key of a source; GET /v1/sources and basis.sources name it.' });

const statuses = ['read', 'secondary', 'memory', 'derived', 'judgement'] as const satisfies readonly SourceStatus[];
const severities = ['note', 'caution', 'strong'] as const satisfies readonly Severity[];

export const altitude = shownSchema('AnsweredAltitude', 'altitude', 'An altitude or a height.');
export const speed = shownSchema('AnsweredSpeed', 'speed', 'A speed.');
export const temperature = shownSchema('AnsweredTemperature', 'temperature', 'A temperature.');
export const temperatureDifference = shownSchema(
  'AnsweredTemperatureDifference',
  'temperatureDifference',
  'A temperature difference.',
);
export const pressure = shownSchema('AnsweredPressure', 'pressure', 'A pressure.');
export const density = shownSchema('AnsweredDensity', 'density', 'A density of the air.');
export const percent = shownSchema('AnsweredPercent', 'gradient', 'A proportion in per cent.');
export const rateOfClimb = shownSchema('AnsweredRateOfClimb', 'rateOfClimb', 'A rate of climb.');
export const time = shownSchema('AnsweredTime', 'time', 'A time.');

const kinds: readonly Kind[] = [
  'distance',
  'altitude',
  'depth',
  'speed',
  'mass',
  'temperature',
  'temperatureDifference',
  'pressure',
  'density',
  'gradient',
  'angle',
  'time',
  'force',
  'area',
  'power',
  'rateOfClimb',
  'energy',
];
const units = [...new Set(unitFamilies.flatMap((family) => kinds.map((kind) => unitFor(family, kind))))];

export const quantity = z
  .strictObject({ value: z.number(), unit: z.enum(units) })
  .meta({ id: 'AnsweredQuantity', description: 'A number with its unit, whatever it is of.' });

export const measure = z.union([quantity, z.number()]);

export const severity = z.enum(severities).meta({
  description:
    'note: worth knowing; caution: may change the decision; strong: do not rely on this answer as it stands.',
});

export const caution = z
  .strictObject({
    code: z.string().meta({ description: 'Stable name of the caution.' }),
    severity,
    message: z.string().meta({ description: 'A fact and its effect, with numbers and units.' }),
    at: z.string().meta({ description: 'JSON pointer into the question.' }).exactOptional(),
    value: measure.meta({ description: 'The number the caution is about.' }).exactOptional(),
    threshold: measure.meta({ description: 'The number it was compared with.' }).exactOptional(),
    source: source.exactOptional(),
  })
  .meta({ id: 'Caution', description: 'Something to know before the answer is used.' });

export const advisory = z
  .strictObject({
    notice: z.string().meta({ description: 'What the answer is and what goes before it.' }),
    sentence: z.string().meta({ description: 'The answer in one sentence.' }),
    cautions: z.array(caution),
  })
  .meta({ id: 'Advisory', description: 'The answer in words.' });

export const air = z
  .strictObject({
    temperature,
    temperatureDeviation: temperatureDifference.meta({
      description: 'From the standard temperature at the pressure altitude.',
    }),
    pressure,
    pressureAltitude: altitude,
    density,
    densityRatio: z.number().meta({ description: 'Over 1.225 kg/m3.' }),
    densityAltitude: altitude,
    dewPoint: temperature.exactOptional(),
    relativeHumidity: percent.meta({ description: 'Over water.' }).exactOptional(),
  })
  .meta({ id: 'Air', description: 'The state of the air at the aerodrome.' });

export const speedSet = z
  .strictObject({
    cas: speed.meta({ description: 'Calibrated airspeed.' }),
    eas: speed.meta({ description: 'Equivalent airspeed.' }),
    tas: speed.meta({ description: 'True airspeed.' }),
    ias: speed.meta({ description: "Indicated airspeed, by the aeroplane's own calibration." }).exactOptional(),
    stallRatio: z.number().meta({ description: 'Over the 1-g stall speed at this mass.' }),
  })
  .meta({ id: 'SpeedSet', description: 'One speed in its kinds.' });

export const assumption = z
  .strictObject({
    at: z.string().meta({ description: 'JSON pointer to where it could have been given.' }),
    value: z.union([quantity, z.number(), z.string()]).meta({ description: 'What was taken.' }),
    because: z.string(),
    effectPercent: z
      .number()
      .meta({ description: 'Change of the total distance if the other end of the plausible range is taken.' })
      .exactOptional(),
    source: source.exactOptional(),
  })
  .meta({ id: 'Assumption', description: 'Something taken because it was not given.' });

export const sources = z.array(
  z
    .strictObject({
      key: sourceKey,
      title: z.string(),
      status: z.enum(statuses).meta({
        description:
          'read: the text was seen; secondary: seen as quoted elsewhere; memory: not confirmed; derived: worked out here; judgement: our choice.',
      }),
    })
    .meta({ id: 'Source', description: 'A source of a constant, a formula or a rule.' }),
);

export const modelVersion = z.string().meta({
  description: 'It changes when any number of any answer changes for the same question.',
});
export const digest = z.string().meta({ description: 'SHA-256, hex.' });
