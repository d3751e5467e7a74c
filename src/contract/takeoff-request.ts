import { z } from 'zod';
import { takeoffDetail } from './detail.ts';
import { takeoffProcedure } from './procedure.ts';
import { airspeed } from './quantities.ts';
import { questionShape } from './question-shape.ts';

export const takeoffRequest = z
  .strictObject({
    ...questionShape('takeoff', takeoffProcedure, takeoffDetail),
    decisionSpeed: airspeed
      .meta({
        description:
          'Decision speed V1, calibrated, of an aeroplane with more than one engine; absent: that of the balanced field, within the range for the declared distances.',
      })
      .exactOptional(),
  })
  .meta({ id: 'TakeoffRequest', description: 'A takeoff: aeroplane, mass, configuration, runway, weather, rules.' });

export type TakeoffRequest = z.infer<typeof takeoffRequest>;
