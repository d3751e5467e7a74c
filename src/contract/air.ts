import { z } from 'zod';
import { advisory, air, assumption, modelVersion, sources } from './answer-parts.ts';
import { elevation } from './quantities.ts';
import { asOf, reference, rounding, units } from './question-frame.ts';
import { stillWeatherChoice } from './weather.ts';

/** What POST /v1/air is asked and answers. */
export const airRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    elevation: elevation
      .meta({ description: 'Height of the aerodrome above mean sea level; needed with a QNH.' })
      .exactOptional(),
    weather: stillWeatherChoice,
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({ id: 'AirRequest', description: 'What is known of the air at an aerodrome.' });

export const airResponse = z
  .strictObject({
    outcome: z.literal('computed').meta({ description: 'The air can always be told.' }),
    advisory,
    air,
    basis: z
      .strictObject({
        assumed: z.array(assumption),
        notGiven: z.array(z.string()).meta({ description: 'JSON pointers of what could have been given.' }),
        sources,
        modelVersion,
      })
      .meta({ id: 'AirBasis', description: 'What the answer rests on.' }),
    question: z
      .strictObject({ ...airRequest.shape, units, rounding })
      .meta({ id: 'AirQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'AirResponse', description: 'Density, pressure altitude and density altitude.' });

export type AirRequest = z.infer<typeof airRequest>;
export type AirResponse = z.infer<typeof airResponse>;
