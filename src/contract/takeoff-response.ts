import { z } from 'zod';
import { outcomes } from '../planning/answer.ts';
import { aeroplaneUnderstood } from './aeroplane-choice.ts';
import {
  advisory,
  air,
  altitude,
  assumption,
  digest,
  measure,
  modelVersion,
  quantity,
  source,
  sources,
  speed,
  speedSet,
  time,
} from './answer-parts.ts';
import { rounding, units } from './question-frame.ts';
import { takeoffRequest } from './takeoff-request.ts';
import { id } from './text.ts';

const method = z.enum(['flight-manual', 'fitted', 'stated', 'geometry']).meta({
  description:
    "The flight manual's own table, physics fitted to it, physics on stated figures, or on the wing's geometry.",
});

const bandedDistance = z
  .strictObject({
    value: z.number(),
    unit: z.enum(['m', 'ft']),
    low: z.number().meta({ description: 'Lower end of the 90 % band.' }),
    high: z.number().meta({ description: 'Upper end of the 90 % band.' }),
    method,
  })
  .meta({ id: 'BandedDistance', description: 'A distance as stated, without any factor, with its 90 % band.' });

const factor = z
  .strictObject({ code: z.string(), value: z.number(), because: z.string(), source, status: z.string() })
  .meta({ id: 'Factor', description: 'A factor of the rule set and what it is for.' });

const startsFrom = z.enum(['reference', 'credited', 'flight-manual']).meta({
  description:
    'The distance the factors multiply: credited wind on a paved, dry, level runway; credited wind on the runway as given; or the flight manual.',
});

const check = z
  .strictObject({
    code: z.string().meta({ description: 'Stable name of the check.' }),
    of: z.string().meta({ description: 'What is compared.' }),
    startsFrom,
    distance: quantity.meta({ description: 'Before factors.' }).exactOptional(),
    factors: z.array(factor),
    alternative: z
      .strictObject({
        startsFrom,
        distance: quantity,
        factors: z.array(factor),
        required: quantity,
        because: z.string(),
      })
      .meta({ id: 'AlternativeReading', description: 'Another reading of the rule, shown and not chosen.' })
      .exactOptional(),
    required: quantity.exactOptional(),
    available: quantity.exactOptional(),
    margin: quantity.meta({ description: 'Available less required.' }).exactOptional(),
    marginPercent: z.number().meta({ description: 'The margin as per cent of required.' }).exactOptional(),
    result: z.enum(['passes', 'fails', 'not-assessed']),
    why: z.string().meta({ description: 'Why it is not assessed.' }).exactOptional(),
    source,
  })
  .meta({ id: 'Check', description: 'One comparison of the rule set.' });

const shortfall = z
  .strictObject({
    at: z.string().meta({ description: 'JSON pointer into the question, or the speed or gradient that falls short.' }),
    axis: z.string().exactOptional(),
    table: z.string().exactOptional(),
    given: measure,
    bound: measure,
    side: z.enum(['above', 'below']).meta({ description: 'On which side of the bound the given number lies.' }),
  })
  .meta({ id: 'Shortfall', description: 'Why there are no distances, in numbers.' });

/** The question as understood: it can be sent again as it stands. */
export const takeoffQuestion = z
  .strictObject({
    ...takeoffRequest.shape,
    aeroplane: aeroplaneUnderstood,
    units,
    rounding,
  })
  .meta({
    id: 'TakeoffQuestion',
    description: 'The question as understood, with what was filled in. It can be sent again as it stands.',
  });

const bandContribution = z
  .strictObject({
    of: z.string().meta({ description: 'What may be off.' }),
    groundRollPercent: z.number(),
    airDistancePercent: z.number(),
    takeoffDistancePercent: z.number(),
  })
  .meta({
    id: 'BandContribution',
    description: 'By how much each distance moves when one input is one standard deviation less favourable.',
  });

export const takeoffResponse = z
  .strictObject({
    outcome: z.enum(outcomes).meta({ description: 'The answer, or the name of why there is none.' }),
    advisory,
    air,
    wind: z
      .strictObject({
        headwind: speed.meta({ description: 'Positive on the nose.' }),
        crosswind: speed.meta({ description: 'Size of the wind across the runway.' }).exactOptional(),
        crosswindFrom: z.enum(['left', 'right']).exactOptional(),
        creditedHeadwind: speed.meta({ description: 'What the rule set lets be taken into account.' }),
      })
      .meta({ id: 'WindComponents', description: 'The wind along and across the runway.' }),
    speeds: z
      .strictObject({ stall: speedSet, rotation: speedSet, liftOff: speedSet, screen: speedSet })
      .meta({ id: 'TakeoffSpeeds', description: 'The speeds in the order of time.' }),
    distances: z
      .strictObject({
        screenHeight: altitude,
        groundRoll: bandedDistance,
        airDistance: bandedDistance,
        takeoffDistance: bandedDistance,
        groundRollTime: time,
        airTime: time,
      })
      .meta({ id: 'TakeoffDistances', description: 'As stated, no factor, all engines.' })
      .exactOptional(),
    assessment: z
      .strictObject({
        ruleSet: id,
        checks: z.array(check),
        governing: z.string().meta({ description: 'Code of the check with the least margin.' }).exactOptional(),
      })
      .meta({ id: 'Assessment', description: 'What the rule set asks and whether it is met.' })
      .exactOptional(),
    shortfall: z.array(shortfall).exactOptional(),
    basis: z
      .strictObject({
        method,
        band: z.array(bandContribution).meta({ description: 'What the 90 % bands are made of.' }).exactOptional(),
        assumed: z.array(assumption),
        notGiven: z.array(z.string()).meta({ description: 'JSON pointers of what could have been given.' }),
        sources,
        modelVersion,
        digests: z.strictObject({ aeroplane: digest, rules: digest }),
      })
      .meta({ id: 'Basis', description: 'What the answer rests on.' }),
    question: takeoffQuestion,
  })
  .meta({ id: 'TakeoffResponse', description: 'The answer to a takeoff.' });

export type TakeoffResponse = z.infer<typeof takeoffResponse>;
export type TakeoffQuestion = z.infer<typeof takeoffQuestion>;
