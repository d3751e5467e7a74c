import { z } from 'zod';
import { landingDetail } from './detail.ts';
import { landingProcedure } from './procedure.ts';
import { questionShape } from './question-shape.ts';

export const landingRequest = z
  .strictObject(questionShape('landing', landingProcedure, landingDetail))
  .meta({ id: 'LandingRequest', description: 'A landing: aeroplane, mass, configuration, runway, weather, rules.' });

export type LandingRequest = z.infer<typeof landingRequest>;
