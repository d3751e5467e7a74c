import { z } from 'zod';
import { outcomes } from '../planning/answer.ts';
import { quantity, temperature as shownTemperature } from './answer-parts.ts';
import { bandedDistance } from './distances.ts';
import { temperature } from './quantities.ts';
import { longestReport, pressure, wind } from './weather.ts';
import { windComponents } from './wind-components.ts';

/** The most hours that one question is answered for: a forecast of three days. */
export const mostHours = 72;

const moment = z.iso.datetime({ offset: true }).max(40);

const listedHour = z.strictObject({
  at: moment.meta({ description: 'The moment the weather is of, RFC 3339.' }),
  temperature,
  dewPoint: temperature.exactOptional(),
  pressure,
  wind,
});

const ofForecast = z.strictObject({
  forecast: z
    .string()
    .min(1)
    .max(longestReport)
    .meta({ description: 'A TAF as received, on one line, of at most 512 characters.' }),
  from: moment.meta({ description: 'Where the first hour begins; the days of the forecast are those nearest to it.' }),
  to: moment.meta({ description: 'The last hour begins here or before.' }),
  temperatures: z
    .array(z.strictObject({ at: moment, temperature }))
    .max(mostHours)
    .meta({ description: 'Of the hours named; else between the highest and the lowest of the forecast.' })
    .exactOptional(),
  pressures: z
    .array(z.strictObject({ at: moment, pressure }))
    .max(mostHours)
    .meta({ description: 'Of the hours named; else the pressure of the question.' })
    .exactOptional(),
});

/** The hours that a question is asked for besides. */
export const hours = z.union([z.array(listedHour).min(1).max(mostHours), ofForecast]).meta({
  id: 'Hours',
  description:
    'Hours for which the same question is answered besides: a list of the weather at each, or a forecast, each hour of which is answered for the least favourable of all that can hold in it.',
});

/** The answer of one hour. */
export const hourAnswer = z
  .strictObject({
    at: z.string().meta({ description: 'Where the hour begins, UTC.' }),
    outcome: z.enum(outcomes).exactOptional(),
    sentence: z.string().meta({ description: 'The answer of this hour in one sentence.' }),
    because: z
      .enum(['base', 'from', 'becoming', 'temporary', 'probable', 'given'])
      .meta({ description: 'What of the forecast the least favourable wind of the hour comes from.' })
      .exactOptional(),
    change: z.string().meta({ description: 'That change as written.' }).exactOptional(),
    considered: z.number().int().meta({ description: 'How many winds can hold in the hour; each was asked.' }),
    temperature: shownTemperature.exactOptional(),
    temperatureBecause: z
      .enum(['given', 'between-extremes'])
      .meta({ description: 'between-extremes: a half cosine between the highest and the lowest of the forecast.' })
      .exactOptional(),
    wind: windComponents.exactOptional(),
    wholeDistance: bandedDistance
      .meta({ description: 'The takeoff or landing distance, without factors.' })
      .exactOptional(),
    governing: z.string().meta({ description: 'Code of the check with the least margin.' }).exactOptional(),
    margin: quantity.meta({ description: 'Of that check.' }).exactOptional(),
    marginPercent: z.number().exactOptional(),
    missing: z
      .array(z.enum(['wind', 'temperature', 'pressure']))
      .meta({ description: 'What neither the forecast nor the question says of this hour.' })
      .exactOptional(),
  })
  .meta({ id: 'HourAnswer', description: 'The answer of one hour, for the least favourable weather in it.' });

export type HoursOnWire = z.infer<typeof hours>;
export type HourAnswer = z.infer<typeof hourAnswer>;
