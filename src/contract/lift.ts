import { z } from 'zod';
import { airspeed, mass } from './quantities.ts';

/** A speed of the procedure: a ratio to the stall speed, or a calibrated airspeed at a mass. */
export const scheduledSpeed = z
  .union([
    z.strictObject({
      stallRatio: z.number().min(1).max(2.5).meta({ description: 'The speed over the stall speed at the same mass.' }),
    }),
    z.strictObject({
      cas: airspeed.meta({ description: 'Calibrated airspeed.' }),
      mass: mass.meta({ description: 'Mass at which it holds; at another it goes with the square root of mass.' }),
    }),
  ])
  .meta({ id: 'ScheduledSpeed', description: 'A speed of the procedure, as a ratio to the stall speed or at a mass.' });

/** Where the wing stops lifting, in exactly one form. */
export const maximumLift = z
  .union([
    z.strictObject({
      coefficient: z.number().min(0.3).max(6).meta({ description: 'Maximum lift coefficient of the whole aeroplane.' }),
    }),
    z.strictObject({
      stallSpeed: airspeed.meta({ description: 'Stall speed, wings level.' }),
      type: z
        .enum(['cas', 'ias'])
        .meta({ description: 'Kind of the stall speed; ias needs the airspeed calibration of the definition.' }),
      kind: z
        .enum(['one-g', 'minimum'])
        .meta({
          description:
            'At a load factor of one, or the older minimum speed in the manoeuvre, about 0.94 of it. Absent: one-g.',
        })
        .exactOptional(),
      mass: mass.meta({ description: 'Mass at which the stall speed was found.' }),
    }),
  ])
  .meta({ id: 'MaximumLift', description: 'The maximum lift, as a coefficient or as a stall speed at a mass.' });

export type ScheduledSpeedOnWire = z.infer<typeof scheduledSpeed>;
export type MaximumLiftOnWire = z.infer<typeof maximumLift>;
