import { z } from 'zod';
import { takeoffProcedure } from './procedure.ts';
import { questionShape } from './question-shape.ts';

export const takeoffRequest = z
  .strictObject(questionShape('takeoff', takeoffProcedure))
  .meta({ id: 'TakeoffRequest', description: 'A takeoff: aeroplane, mass, configuration, runway, weather, rules.' });

export type TakeoffRequest = z.infer<typeof takeoffRequest>;
