import type { FastifyInstance } from 'fastify';
import { ruleSetList, toListedRuleSet } from '../../contract/rule-set-list.ts';
import { ruleSets as all } from '../../planning/rules/rule-sets.ts';
import { addResource } from '../resource.ts';

export function ruleSets(app: FastifyInstance): void {
  addResource(app, {
    url: '/v1/rule-sets',
    operationId: 'listRuleSets',
    summary: 'Which rule sets are there?',
    description: 'The operating rules that a question may name.',
    tag: 'lists',
    response: ruleSetList,
    answer: { ruleSets: all.map(toListedRuleSet) },
  });
}
