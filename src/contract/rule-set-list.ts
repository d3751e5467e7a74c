import { z } from 'zod';
import type { RuleSet } from '../planning/rules/rule-set.ts';
import { references } from '../references.ts';

const listedRuleSet = z
  .strictObject({
    id: z.string().meta({ description: 'What a question writes as its ruleSet.' }),
    title: z.string().meta({ description: 'Whose rules these are.' }),
    source: z.string().meta({ description: 'Key of the source; GET /v1/sources has it in full.' }),
    sourceTitle: z.string().meta({ description: 'The source in words.' }),
    creditedHeadwind: z.number().min(0).max(1).meta({ description: 'Part of a headwind that counts, a ratio.' }),
    creditedTailwind: z.number().min(1).max(3).meta({ description: 'What a tailwind counts for, a ratio.' }),
  })
  .meta({ id: 'ListedRuleSet', description: 'A set of operating rules, in short.' });

/** The answer of GET /v1/rule-sets. */
export const ruleSetList = z
  .strictObject({ ruleSets: z.array(listedRuleSet) })
  .meta({ id: 'RuleSetList', description: 'The rule sets that a question may name.' });

export function toListedRuleSet({ id, title, source, windCredit }: RuleSet): z.infer<typeof listedRuleSet> {
  return {
    id,
    title,
    source,
    sourceTitle: references[source].title,
    creditedHeadwind: windCredit.headwind,
    creditedTailwind: windCredit.tailwind,
  };
}
