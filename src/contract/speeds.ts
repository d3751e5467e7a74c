import { z } from 'zod';
import { aeroplaneChoice, aeroplaneUnderstood } from './aeroplane-choice.ts';
import { advisory, air, assumption, digest, modelVersion, sources, speedSet } from './answer-parts.ts';
import { bankAngle, elevation, mass } from './quantities.ts';
import { asOf, reference, rounding, units } from './question-frame.ts';
import { id } from './text.ts';
import { stillWeatherChoice } from './weather.ts';

/** What POST /v1/speeds is asked and answers. */
export const speedsRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice,
    mass,
    configuration: id.meta({ description: "One of the aeroplane's configurations." }),
    elevation: elevation
      .meta({ description: 'Height of the aerodrome above mean sea level; needed with a QNH.' })
      .exactOptional(),
    weather: stillWeatherChoice,
    bank: bankAngle.meta({ description: 'Angle of bank of a level turn, for the stall speed in it.' }).exactOptional(),
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({ id: 'SpeedsRequest', description: 'An aeroplane at a mass in a configuration, in this air.' });

export const speedsResponse = z
  .strictObject({
    outcome: z.literal('computed').meta({ description: 'The speeds can always be told.' }),
    advisory,
    air,
    loadFactor: z.number().meta({ description: 'In the level turn that was asked for.' }).exactOptional(),
    speeds: z
      .strictObject({
        stall: speedSet.meta({ description: 'Stall speed, wings level.' }),
        stallInBank: speedSet.meta({ description: 'Stall speed in the level turn.' }).exactOptional(),
        rotation: speedSet.exactOptional(),
        liftOff: speedSet.exactOptional(),
        screen: speedSet.exactOptional(),
        landingReference: speedSet.exactOptional(),
        touchdown: speedSet.exactOptional(),
      })
      .meta({ id: 'Speeds', description: 'Stall speeds and the speeds of the procedure.' }),
    basis: z
      .strictObject({
        assumed: z.array(assumption),
        notGiven: z.array(z.string()).meta({ description: 'JSON pointers of what could have been given.' }),
        sources,
        modelVersion,
        digests: z.strictObject({ aeroplane: digest }),
      })
      .meta({ id: 'SpeedsBasis', description: 'What the answer rests on.' }),
    question: z
      .strictObject({ ...speedsRequest.shape, aeroplane: aeroplaneUnderstood, units, rounding })
      .meta({ id: 'SpeedsQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'SpeedsResponse', description: 'Stall and reference speeds, each in its kinds.' });

export type SpeedsRequest = z.infer<typeof speedsRequest>;
export type SpeedsResponse = z.infer<typeof speedsResponse>;
