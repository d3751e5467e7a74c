import { z } from 'zod';
import { unitFamilies } from '../units/presentation.ts';
import { aeroplaneDefinition } from './aeroplane-definition.ts';
import { mass } from './quantities.ts';
import { runway } from './runway.ts';
import { id, shortText } from './text.ts';
import { weather } from './weather.ts';

export const aeroplane = z
  .union([
    z.strictObject({
      id,
      revision: shortText.meta({ description: 'If given, the revision must be the one on file.' }).exactOptional(),
    }),
    z.strictObject({ definition: aeroplaneDefinition }),
  ])
  .meta({ id: 'Aeroplane', description: 'The aeroplane: an id of the catalogue or a whole definition.' });

export const reference = shortText.meta({ description: "The caller's own reference, echoed and not used." });
export const asOf = z.iso
  .datetime({ offset: true })
  .max(40)
  .meta({ description: 'The time the question is asked for, RFC 3339; echoed.' });
export const units = z.enum(unitFamilies).meta({
  description: 'Units of the answer: metres, knots, kilograms (altitudes in feet); feet, knots, pounds; or SI.',
});
export const rounding = z
  .enum(['safe', 'none'])
  .meta({ description: 'safe rounds what is required up and what is available down; none shows numbers unrounded.' });

export const takeoffRequest = z
  .strictObject({
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane,
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
export type AeroplaneOnWire = z.infer<typeof aeroplane>;
