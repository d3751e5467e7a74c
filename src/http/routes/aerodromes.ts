import type { FastifyInstance } from 'fastify';
import type { Catalogue } from '../../catalogue/read-catalogue.ts';
import { aerodromeDefinition } from '../../contract/aerodrome-definition.ts';
import { aerodromeList, toListedAerodrome } from '../../contract/aerodrome-list.ts';
import { addResource, addResourceById } from '../resource.ts';

/** The aerodromes on file: in short, and each whole. */
export function aerodromes(app: FastifyInstance, catalogue: Catalogue): void {
  const entries = catalogue.aerodromes.list();
  addResource(app, {
    url: '/v1/aerodromes',
    operationId: 'listAerodromes',
    summary: 'Which aerodromes are on file?',
    description:
      "The aerodromes whose runway ends a question may name: the invented ones that come with the service, unless they are switched off, and those of the operator's own folder.",
    tag: 'lists',
    response: aerodromeList,
    answer: { aerodromes: entries.map(({ definition, digest }) => toListedAerodrome(definition, digest)) },
  });
  addResourceById(app, {
    url: '/v1/aerodromes/:id',
    operationId: 'getAerodrome',
    summary: 'What is on file of one aerodrome?',
    description: 'The whole definition: its runway ends with slope, surface, declared distances and named points.',
    tag: 'lists',
    response: aerodromeDefinition,
    parameter: 'id',
    answers: new Map(entries.map(({ definition }) => [definition.id, definition])),
    of: 'aerodrome',
  });
}
