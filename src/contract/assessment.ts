import { z } from 'zod';
import { quantity, source } from './answer-parts.ts';
import { id } from './text.ts';

export const factor = z
  .strictObject({
    code: z.string(),
    value: z.number(),
    because: z.string(),
    source,
    status: z.string(),
    atLeast: z.literal(true).meta({ description: 'The rule says: or more.' }).exactOptional(),
  })
  .meta({ id: 'Factor', description: 'A factor of the rule set and what it is for.' });

const startsFrom = z.enum(['reference', 'credited', 'level', 'flight-manual']).meta({
  description:
    'The distance the factors multiply: credited wind on a paved, dry, level runway; credited wind on the runway as given; credited wind on that surface and level, where the rules give no credit for a slope that helps; or the flight manual.',
});

const alternative = z
  .strictObject({ startsFrom, distance: quantity, factors: z.array(factor), required: quantity, because: z.string() })
  .meta({ id: 'AlternativeReading', description: 'Another reading of the rule, shown and not chosen.' });

const check = z
  .strictObject({
    code: z.string().meta({ description: 'Stable name of the check.' }),
    of: z.string().meta({ description: 'What is compared.' }),
    startsFrom: startsFrom.exactOptional(),
    distance: quantity.meta({ description: 'Before factors.' }).exactOptional(),
    factors: z.array(factor),
    alternative: alternative.exactOptional(),
    furtherAlternatives: z.array(alternative).exactOptional(),
    required: quantity.exactOptional(),
    available: quantity.exactOptional(),
    margin: quantity.meta({ description: 'Available less required.' }).exactOptional(),
    marginPercent: z.number().meta({ description: 'The margin as per cent of required.' }).exactOptional(),
    result: z.enum(['passes', 'fails', 'not-assessed']),
    why: z.string().meta({ description: 'Why it is not assessed.' }).exactOptional(),
    source,
  })
  .meta({ id: 'Check', description: 'One comparison of the rule set.' });

export const assessment = z
  .strictObject({
    ruleSet: id,
    basedOn: id.meta({ description: "The rule set that an operator's own is based on." }).exactOptional(),
    checks: z.array(check),
    governing: z.string().meta({ description: 'Code of the check with the least margin.' }).exactOptional(),
  })
  .meta({ id: 'Assessment', description: 'What the rule set asks and whether it is met.' });

export type AssessmentOnWire = z.infer<typeof assessment>;
