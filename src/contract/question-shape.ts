import { z } from 'zod';
import { aeroplaneChoice } from './aeroplane-choice.ts';
import { hours } from './hours.ts';
import { mass } from './quantities.ts';
import { asOf, edges, method, reference, rounding, select, units } from './question-frame.ts';
import { ruleSetChoice } from './rule-set-choice.ts';
import { runwayChoice } from './runway-choice.ts';
import { id } from './text.ts';
import { weatherChoice } from './weather.ts';

/** The members of a question of a field length, in the order in which it is read. */
export function questionShape<Procedure extends z.ZodType, Detail extends z.ZodType>(
  phase: 'takeoff' | 'landing',
  procedure: Procedure,
  detail: Detail,
) {
  return {
    reference: reference.exactOptional(),
    asOf: asOf.exactOptional(),
    aeroplane: aeroplaneChoice,
    mass: mass.meta({ description: `${phase === 'takeoff' ? 'Takeoff' : 'Landing'} mass.` }),
    configuration: id.meta({ description: `One of the aeroplane's ${phase} configurations.` }),
    runway: runwayChoice,
    weather: weatherChoice,
    hours: hours.exactOptional(),
    procedure: z.exactOptional(procedure),
    ruleSet: ruleSetChoice,
    stage: z
      .enum(['dispatch', 'in-flight'])
      .meta({ description: 'Whether the question is asked before departure or in flight.' })
      .exactOptional(),
    method: method.exactOptional(),
    edges: edges.exactOptional(),
    units: units.exactOptional(),
    rounding: rounding.exactOptional(),
    detail: z.exactOptional(detail),
    select: select.exactOptional(),
  };
}
