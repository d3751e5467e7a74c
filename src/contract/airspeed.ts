import { z } from 'zod';
import { aeroplaneChoice, aeroplaneUnderstood } from './aeroplane-choice.ts';
import { advisory, air, assumption, digest, modelVersion, speed as shownSpeed, sources } from './answer-parts.ts';
import { elevation, flightAltitude, flightPressure, flightSpeed, qnh, temperature } from './quantities.ts';
import { asOf, reference, rounding, units } from './question-frame.ts';

/** What POST /v1/airspeed is asked and answers. */
const speed = z
  .union([
    z.strictObject({ cas: flightSpeed.meta({ description: 'Calibrated airspeed.' }) }),
    z.strictObject({ eas: flightSpeed.meta({ description: 'Equivalent airspeed.' }) }),
    z.strictObject({ tas: flightSpeed.meta({ description: 'True airspeed.' }) }),
    z.strictObject({ mach: z.number().min(0).max(1).meta({ description: 'Mach number.' }) }),
    z.strictObject({
      ias: flightSpeed.meta({ description: "Indicated airspeed; needs the calibration of the question's aeroplane." }),
    }),
  ])
  .meta({ id: 'GivenSpeed', description: 'One speed in exactly one of its kinds.' });

const weather = z
  .strictObject({
    temperature: temperature.meta({ description: 'Static temperature of the air.' }),
    dewPoint: temperature
      .meta({
        description: 'Dew point, not above the temperature. Without it the air is taken as dry, and said to be.',
      })
      .exactOptional(),
    pressure: z
      .union([
        z.strictObject({ qnh }),
        z.strictObject({ pressureAltitude: flightAltitude }),
        z.strictObject({ stationPressure: flightPressure }),
      ])
      .meta({ id: 'FlightPressureForm', description: 'The pressure in exactly one of three forms.' }),
  })
  .meta({ id: 'FlightWeather', description: 'The air around the aeroplane.' });

export const airspeedRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice.exactOptional(),
    speed,
    elevation: elevation.meta({ description: 'Height above mean sea level; needed with a QNH.' }).exactOptional(),
    weather,
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({ id: 'AirspeedRequest', description: 'One speed in one of its kinds, in this air.' });

export const airspeedOutcomes = ['computed', 'not-subsonic', 'outside-calibration'] as const;

export const airspeedResponse = z
  .strictObject({
    outcome: z.enum(airspeedOutcomes).meta({
      description:
        'computed; not-subsonic: the speed or its Mach number is above that of sound; outside-calibration: the calibration does not reach the indicated airspeed.',
    }),
    advisory,
    air,
    speed: z
      .strictObject({
        cas: shownSpeed,
        eas: shownSpeed,
        tas: shownSpeed,
        mach: z.number(),
        ias: shownSpeed.exactOptional(),
      })
      .meta({ id: 'SpeedInItsKinds', description: 'The speed in all its kinds.' })
      .exactOptional(),
    basis: z
      .strictObject({
        assumed: z.array(assumption),
        notGiven: z.array(z.string()).meta({ description: 'JSON pointers of what could have been given.' }),
        sources,
        modelVersion,
        digests: z.strictObject({ aeroplane: digest }).exactOptional(),
      })
      .meta({ id: 'AirspeedBasis', description: 'What the answer rests on.' }),
    question: z
      .strictObject({ ...airspeedRequest.shape, aeroplane: aeroplaneUnderstood.exactOptional(), units, rounding })
      .meta({ id: 'AirspeedQuestion', description: 'The question as understood. It can be sent again as it stands.' }),
  })
  .meta({ id: 'AirspeedResponse', description: 'One speed in all its kinds.' });

export type AirspeedRequest = z.infer<typeof airspeedRequest>;
export type AirspeedResponse = z.infer<typeof airspeedResponse>;
