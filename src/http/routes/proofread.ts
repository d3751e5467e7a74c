import type { FastifyInstance } from 'fastify';
import type { CatalogueLookup } from '../../contract/catalogue-lookup.ts';
import { answerProofread } from '../../contract/proofread/answer-proofread.ts';
import { proofreadRequest } from '../../contract/proofread/proofread-request.ts';
import { proofreadResponse } from '../../contract/proofread/proofread-response.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { definitionBody } from '../body-limits.ts';
import { exampleDefinition } from '../document/example-definition.ts';
import { addLongOperation, type WarmUp } from '../operation.ts';

/** A definition in, everything wrong or odd out. */
export function proofread(app: FastifyInstance, lookup: CatalogueLookup, stamp: Stamp): WarmUp {
  const example = { definition: exampleDefinition };
  return addLongOperation(app, {
    url: '/v1/aeroplanes/proofread',
    operationId: 'proofread',
    summary: 'What is wrong or odd about this definition?',
    description:
      "Reads an aeroplane definition, the tables of its flight manual included, and answers with everything for which a question with it would be refused, everything that is odd about it, and what each method lacks for each configuration. Tables are compared with the aeroplane's physics, cell by cell.",
    tag: 'questions',
    request: proofreadRequest,
    response: proofreadResponse,
    example,
    limits: definitionBody,
    warmUp: [],
    work: (request) => answerProofread(request, lookup, stamp),
  });
}
