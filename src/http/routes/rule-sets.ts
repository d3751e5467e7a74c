import type { FastifyInstance } from 'fastify';
import { ruleSetList } from '../../contract/rule-set-list.ts';
import { toRuleSetList } from '../../contract/to-rule-set-list.ts';
import { ruleSets as all } from '../../planning/rules/rule-sets.ts';
import { addResource } from '../resource.ts';

export function ruleSets(app: FastifyInstance): void {
  addResource(app, {
    url: '/v1/rule-sets',
    operationId: 'listRuleSets',
    summary: 'Which rule sets are there?',
    description:
      'The operating rules that a question may name, whole: to whom they apply, what they credit of the wind, every factor with its source, and what they ask of the climb.',
    tag: 'lists',
    response: ruleSetList,
    answer: toRuleSetList(all),
  });
}
