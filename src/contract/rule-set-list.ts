import { z } from 'zod';
import { quantity, source } from './answer-parts.ts';
import { factor } from './assessment.ts';
import { id } from './text.ts';

const text = z.string();
const texts = z.array(text);
const perUnit = z.number();

const wind = z
  .strictObject({
    headwind: perUnit.meta({ description: 'Part of a headwind that counts, a ratio.' }),
    tailwind: perUnit.meta({ description: 'What a tailwind counts for, a ratio.' }),
    because: text,
    source,
  })
  .meta({ id: 'ListedWindCredit', description: 'What may be taken into account of the wind along the runway.' });

const multiplies = z.enum(['reference', 'credited']).meta({
  description:
    'reference: the distance in the credited wind on a paved, dry, level runway; credited: that on the runway as it is.',
});

const surfaceRule = z
  .strictObject({ when: text.meta({ description: 'The surface.' }), multiplies, factors: z.array(factor) })
  .meta({
    id: 'ListedSurfaceRule',
    description: 'The factors of one kind of surface; the first kind that fits counts.',
  });

const slopeRule = z
  .strictObject({
    unfavourable: z.enum(['uphill', 'downhill']),
    step: quantity,
    factor: factor.meta({ description: 'For one step of slope.' }),
    growth: z.enum(['linear', 'larger-of-linear-and-compound']),
    multiplies,
  })
  .meta({ id: 'ListedSlope', description: 'What a slope the unfavourable way adds; the other way earns nothing.' });

const listedCheck = z
  .strictObject({
    code: text,
    of: text.meta({ description: 'The distance that is multiplied.' }),
    against: text.meta({ description: 'The declared distance it is compared with.' }),
    factor: factor.meta({ description: 'The overall factor; absent: none.' }).exactOptional(),
    onRunway: factor
      .meta({ description: 'The overall factor on the distance on the runway as it is, where it is another one.' })
      .exactOptional(),
    alternatives: z.array(z.strictObject({ factor, because: text })).exactOptional(),
    decides: z.enum(['longer', 'runway']).meta({
      description: 'Of factors and physics: the longer decides, or the runway as it is where physics speaks of it.',
    }),
    notAssessed: text.meta({ description: 'Why the check is never assessed.' }).exactOptional(),
    source,
  })
  .meta({ id: 'ListedCheck', description: 'One comparison that the rules ask for.' });

const listedCase = z
  .strictObject({ when: text, checks: z.array(listedCheck) })
  .meta({ id: 'ListedCase', description: 'What is compared in one case; the first case that fits counts.' });

const demand = z
  .strictObject({
    code: text,
    of: z.enum(['takeoff', 'approach', 'balked-landing']),
    engines: z.enum(['all', 'one-out']),
    gradient: quantity.meta({ description: 'At least.' }),
    positive: z.literal(true).meta({ description: 'Any climb at all, and not less.' }).exactOptional(),
    atHeight: quantity.meta({ description: 'Above the runway.' }).exactOptional(),
    configuration: text,
    when: text.meta({ description: 'Of which aeroplanes.' }),
    source,
    status: text,
  })
  .meta({ id: 'ListedClimb', description: 'A gradient of climb that the rules ask for.' });

const listedPhase = z
  .strictObject({
    source,
    stage: z
      .enum(['dispatch', 'in-flight'])
      .meta({ description: 'Absent: stages are not told apart.' })
      .exactOptional(),
    appliesTo: texts.meta({ description: 'What an aeroplane must be besides.' }),
    wind,
    surfaces: z.array(surfaceRule),
    slope: slopeRule.exactOptional(),
    cases: z.array(listedCase),
    demands: z.array(demand),
    notApplied: z
      .array(z.strictObject({ factor, why: text }))
      .meta({ description: 'Figures of the rules that no answer uses.' }),
    clearwayRatio: perUnit.meta({ description: 'The most that counts of a clearway, over the run.' }).exactOptional(),
    nothingBeyond: text
      .meta({ description: 'What it means where no clearway or stopway is declared.' })
      .exactOptional(),
  })
  .meta({ id: 'ListedPhase', description: 'What a rule set holds for takeoffs, or for landings at one stage.' });

const listedRuleSet = z
  .strictObject({
    id: id.meta({ description: 'What a question writes as its ruleSet.' }),
    title: text.meta({ description: 'Whose rules these are.' }),
    source,
    sourceTitle: text.meta({ description: 'The source in words.' }),
    operations: z.array(z.enum(['commercial', 'private'])).meta({ description: 'Whose flights the rules are for.' }),
    appliesTo: texts.meta({ description: 'What an aeroplane must be; where it is not, this is the reason given.' }),
    thinMargin: z
      .strictObject({ percent: z.number(), because: text, source })
      .meta({ id: 'ListedThinMargin', description: 'The margin below which an answer is thin.' }),
    takeoff: listedPhase,
    landing: listedPhase,
    landingInFlight: listedPhase.exactOptional(),
  })
  .meta({ id: 'ListedRuleSet', description: 'A set of operating rules, whole.' });

/** The answer of GET /v1/rule-sets. */
export const ruleSetList = z
  .strictObject({
    ruleSets: z.array(listedRuleSet),
    operator: z
      .strictObject({ id: z.literal('operator'), form: text })
      .meta({ id: 'OperatorForm', description: "How a question gives an operator's own rules." }),
  })
  .meta({ id: 'RuleSetList', description: 'The rule sets that a question may name, as data.' });

export type RuleSetList = z.infer<typeof ruleSetList>;
