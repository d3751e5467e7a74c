import type { FastifyInstance } from 'fastify';
import type { Catalogue } from '../../catalogue/read-catalogue.ts';
import { aeroplaneDefinition } from '../../contract/aeroplane-definition.ts';
import { aeroplaneList, toListedAeroplane } from '../../contract/aeroplane-list.ts';
import { addResource, addResourceById } from '../resource.ts';

/** The aeroplanes on file: in short, and each whole. */
export function aeroplanes(app: FastifyInstance, catalogue: Catalogue): void {
  const entries = catalogue.list();
  addResource(app, {
    url: '/v1/aeroplanes',
    operationId: 'listAeroplanes',
    summary: 'Which aeroplanes are on file?',
    description:
      "The aeroplanes that a question may name by id: the invented ones that come with the service, unless they are switched off, and those of the operator's own folder.",
    tag: 'lists',
    response: aeroplaneList,
    answer: { aeroplanes: entries.map(({ definition, digest }) => toListedAeroplane(definition, digest)) },
  });
  addResourceById(app, {
    url: '/v1/aeroplanes/:id',
    operationId: 'getAeroplane',
    summary: 'What is on file of one aeroplane?',
    description: 'The whole definition, the same JSON that a question may carry inline.',
    tag: 'lists',
    response: aeroplaneDefinition,
    parameter: 'id',
    answers: new Map(entries.map(({ definition }) => [definition.id, definition])),
    of: 'aeroplane',
  });
}
