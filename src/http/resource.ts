import type { FastifyInstance } from 'fastify';
import * as z from 'zod';
import { type Problem, problemOf } from '../contract/problem.ts';
import { shortened } from '../contract/reading/scalar-faults.ts';
import { unknownId } from '../contract/unknown-id.ts';
import { answerHeaders } from './answer-headers.ts';
import { operationSchema } from './document/operation-schema.ts';
import { answerMediaType } from './operation.ts';
import { sendProblem } from './problems.ts';

interface Described {
  readonly url: string;
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: string;
  readonly response: z.ZodType;
}

/** One GET whose answer is fixed when the house is built. */
export interface Resource extends Described {
  readonly answer: unknown;
}

/** One GET for each id of a list, all fixed when the house is built. */
export interface ResourceById extends Described {
  /** the name of the path's parameter */
  readonly parameter: string;
  readonly answers: ReadonlyMap<string, unknown>;
  /** what the list holds, as in 'aeroplane' */
  readonly of: string;
}

/** Puts a fixed answer on the wire, checked against its schema and written once. */
export function addResource(app: FastifyInstance, resource: Resource): void {
  const text = written(resource.response, resource.answer);
  app.route({
    method: 'GET',
    url: resource.url,
    schema: operationSchema(resource),
    handler: (_request, reply) => reply.headers(answerHeaders).type(answerMediaType).send(text),
  });
}

/** Puts a list of fixed answers on the wire, each under its id; an id is looked up and never used as a path. */
export function addResourceById(app: FastifyInstance, resource: ResourceById): void {
  const { parameter, of, answers } = resource;
  const texts = new Map([...answers].map(([id, answer]) => [id, written(resource.response, answer)]));
  const params = z.object({ [parameter]: z.string().meta({ description: 'An id of the list.' }) });
  app.route({
    method: 'GET',
    url: resource.url,
    schema: operationSchema({ ...resource, params }),
    handler(request, reply) {
      const id = (request.params as Record<string, string>)[parameter] as string;
      const text = texts.get(id);
      if (text !== undefined) return reply.headers(answerHeaders).type(answerMediaType).send(text);
      return sendProblem(reply, absent(of, id, [...answers.keys()]));
    },
  });
}

function absent(of: string, id: string, ids: readonly string[]): Problem {
  const fault = unknownId('', of, shortened(id), ids);
  const detail = fault.hint === undefined ? fault.message : `${fault.message} ${fault.hint}`;
  return problemOf('not-found', detail, [{ ...fault, code: 'not-found' }]);
}

function written(schema: z.ZodType, answer: unknown): string {
  return JSON.stringify(schema.parse(answer));
}
