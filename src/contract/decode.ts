import { z } from 'zod';
import { advisory, modelVersion, pressure, sources, temperature } from './answer-parts.ts';
import { asOf, reference, rounding, units } from './question-frame.ts';
import { reportText, wind as windOnWire } from './weather.ts';

/** What POST /v1/weather/decode is asked and answers. */
export const decodeRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    report: reportText.meta({
      description: 'A METAR, SPECI or TAF as received, on one line, of at most 512 characters.',
    }),
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({ id: 'DecodeRequest', description: 'A report of the weather to be read.' });

const dayTime = z
  .strictObject({ day: z.number().int(), hour: z.number().int(), minute: z.number().int() })
  .meta({ id: 'DayTime', description: 'A day of some month and a time of it, UTC.' });

/** A figure as written, and between which true values it is written so. */
function rounded(of: typeof temperature, id: string) {
  return z
    .strictObject({ written: of, low: of, high: of })
    .meta({ id, description: 'As written, and what it rounds.' });
}

const group = z
  .strictObject({
    at: z.number().int().meta({ description: 'Characters before it.' }),
    text: z.string(),
    readAs: z.string().meta({ description: 'wind, temperature, visibility ...; not-understood where it is none.' }),
  })
  .meta({ id: 'ReportGroup', description: 'A group of the report and what it was read as.' });

const change = z
  .strictObject({
    heading: z.string().meta({ description: 'As written.' }),
    kind: z.enum(['from', 'becoming', 'temporary', 'probable']),
    percent: z.union([z.literal(30), z.literal(40)]).exactOptional(),
    from: dayTime,
    until: dayTime.exactOptional(),
    wind: windOnWire.exactOptional(),
  })
  .meta({ id: 'ForecastChange', description: 'A part of a forecast after its first.' });

const common = {
  station: z.string(),
  time: dayTime.meta({ description: 'Of the observation, or of issue.' }),
  age: z
    .number()
    .int()
    .meta({ description: 'Minutes before the time of the question; below 0 where it is later.' })
    .exactOptional(),
  corrected: z.boolean(),
  wind: windOnWire
    .meta({ description: 'As a question would have it; absent where it is not reported.' })
    .exactOptional(),
  groups: z.array(group).meta({ description: 'The whole report, group by group.' }),
  notUnderstood: z.array(group).meta({ description: 'Groups from which nothing was taken.' }),
};

export const decodeResponse = z
  .strictObject({
    outcome: z.literal('read'),
    advisory,
    observation: z
      .strictObject({
        kind: z.enum(['METAR', 'SPECI']),
        ...common,
        automatic: z.boolean(),
        temperature: rounded(temperature, 'ReportedTemperature').exactOptional(),
        dewPoint: rounded(temperature, 'ReportedDewPoint').exactOptional(),
        qnh: rounded(pressure, 'ReportedQnh').exactOptional(),
      })
      .meta({ id: 'Observation', description: 'What a METAR or SPECI says.' })
      .exactOptional(),
    forecast: z
      .strictObject({
        ...common,
        amended: z.boolean(),
        cancelled: z.boolean(),
        from: dayTime.exactOptional(),
        until: dayTime.exactOptional(),
        changes: z.array(change),
        extremes: z.array(z.strictObject({ kind: z.enum(['highest', 'lowest']), temperature, at: dayTime })),
      })
      .meta({ id: 'Forecast', description: 'What a TAF says.' })
      .exactOptional(),
    basis: z
      .strictObject({ sources, modelVersion })
      .meta({ id: 'DecodeBasis', description: 'What the reading rests on.' }),
    question: z
      .strictObject({ ...decodeRequest.shape, units, rounding })
      .meta({ id: 'DecodeQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'DecodeResponse', description: 'A report, group by group, with what was understood of it.' });

export type DecodeRequest = z.infer<typeof decodeRequest>;
export type DecodeResponse = z.infer<typeof decodeResponse>;
