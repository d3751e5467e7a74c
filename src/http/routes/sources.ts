import type { FastifyInstance } from 'fastify';
import { sourceList, toSourceList } from '../../contract/source-list.ts';
import { addResource } from '../resource.ts';

export function sources(app: FastifyInstance): void {
  addResource(app, {
    url: '/v1/sources',
    operationId: 'listSources',
    summary: 'Where do the numbers come from?',
    description: 'Every source that an answer may name, with how well it is confirmed.',
    tag: 'lists',
    response: sourceList,
    answer: toSourceList(),
  });
}
