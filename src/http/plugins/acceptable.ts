import type { FastifyInstance } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

const jsonRanges = new Set(['*/*', 'application/*', 'application/json']);

/** Refuses a caller of the interface who accepts no JSON; the pages of the documentation are not asked. */
export function acceptable(app: FastifyInstance): void {
  app.addHook('onRequest', (request, reply, done) => {
    const { accept } = request.headers;
    if (accept === undefined || request.url.startsWith('/docs') || acceptsJson(accept)) done();
    else sendProblem(reply, problemOf('not-acceptable', 'The answer is application/json.'));
  });
}

/** Whether an Accept field takes application/json; the most specific range that fits decides. */
export function acceptsJson(accept: string): boolean {
  let best = -1;
  let accepted = false;
  for (const part of accept.split(',')) {
    const [range = '', ...parameters] = part.split(';').map((piece) => piece.trim().toLowerCase());
    const rank = [...jsonRanges].indexOf(range);
    if (rank < best || rank < 0) continue;
    best = rank;
    const weight = parameters.find((parameter) => parameter.startsWith('q='));
    accepted = weight === undefined || Number(weight.slice(2)) > 0;
  }
  return accepted;
}
