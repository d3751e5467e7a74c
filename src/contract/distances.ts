import { z } from 'zod';
import { altitude, time } from './answer-parts.ts';

export const method = z.enum(['flight-manual', 'fitted', 'stated', 'geometry']).meta({
  description:
    "The flight manual's own table, physics fitted to it, physics on stated figures, or on the wing's geometry.",
});

export const bandedDistance = z
  .strictObject({
    value: z.number(),
    unit: z.enum(['m', 'ft']),
    low: z.number().meta({ description: 'Lower end of the 90 % band.' }),
    high: z.number().meta({ description: 'Upper end of the 90 % band.' }),
    method,
    edge: z
      .string()
      .meta({ description: 'The table of the flight manual whose edge stands for what lies beyond it.' })
      .exactOptional(),
  })
  .meta({ id: 'BandedDistance', description: 'A distance as stated, without any factor, with its 90 % band.' });

/** Distances that the answers to a takeoff and to a landing share. */
export const distancesShape = {
  screenHeight: altitude,
  groundRoll: bandedDistance,
  airDistance: bandedDistance,
};
/** Absent where the flight manual gives a distance and physics none. */
export const timesShape = { groundRollTime: time.exactOptional(), airTime: time.exactOptional() };
