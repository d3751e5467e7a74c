import { z } from 'zod';
import { aeroplaneChoice } from './aeroplane-choice.ts';
import { mass } from './quantities.ts';
import { asOf, reference, rounding, units } from './question-frame.ts';
import { runway } from './runway.ts';
import { id } from './text.ts';
import { weather } from './weather.ts';

export const takeoffRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice,
    mass: mass.meta({ description: 'Takeoff mass.' }),
    configuration: id.meta({ description: "One of the aeroplane's takeoff configurations." }),
    runway,
    weather,
    ruleSet: id.meta({ description: 'The rule set to assess by; GET /v1/rule-sets lists them.' }),
    stage: z
      .enum(['dispatch', 'in-flight'])
      .meta({ description: 'Whether the question is asked before departure or in flight.' })
      .exactOptional(),
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
  })
  .meta({ id: 'TakeoffRequest', description: 'A takeoff: aeroplane, mass, configuration, runway, weather, rules.' });

export type TakeoffRequest = z.infer<typeof takeoffRequest>;
