import type { FastifyInstance } from 'fastify';
import { surfaceList, toSurfaceList } from '../../contract/surface-list.ts';
import { addResource } from '../resource.ts';

export function surfaces(app: FastifyInstance): void {
  addResource(app, {
    url: '/v1/surfaces',
    operationId: 'listSurfaces',
    summary: 'Which runway surfaces are there, and what is known of each?',
    description:
      'Kinds and states of the runway with the friction taken where the question gives none, and its source.',
    tag: 'lists',
    response: surfaceList,
    answer: toSurfaceList(),
  });
}
