import { z } from 'zod';
import { surfaceKinds, surfaceStates } from '../planning/question.ts';
import { id, shortText } from './text.ts';

const ownFactor = z.number().min(1).max(10);

const overall = z
  .strictObject({
    check: id.meta({ description: 'Code of a check of the rule set, for example landing-distance.' }),
    overallFactor: ownFactor,
  })
  .meta({ id: 'OperatorOverallFactor', description: "An operator's own overall factor of one check." });

const ofSurface = z
  .strictObject({
    phase: z.enum(['takeoff', 'landing']),
    kind: z.enum(surfaceKinds),
    state: z.enum(surfaceStates),
    surfaceFactor: ownFactor,
  })
  .meta({
    id: 'OperatorSurfaceFactor',
    description: "An operator's own factor of a kind and state of firm ground on which nothing lies.",
  });

/** The rules to assess by: an id, or an operator's own on top of one. */
export const ruleSetChoice = z
  .union([
    id,
    z.strictObject({
      basedOn: id.meta({ description: 'A rule set of GET /v1/rule-sets.' }),
      name: shortText.meta({ description: 'How sentences call the rules.' }),
      factors: z
        .array(z.union([overall, ofSurface]))
        .min(1)
        .max(50)
        .meta({ description: 'None may be smaller than the one it stands in for.' }),
    }),
  ])
  .meta({
    id: 'RuleSetChoice',
    description:
      "The rule set to assess by; GET /v1/rule-sets lists them. Or an operator's own, stricter than one of them.",
  });

export type RuleSetChoice = z.infer<typeof ruleSetChoice>;
