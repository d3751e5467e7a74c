import type { FastifyInstance } from 'fastify';
import { type Problem, problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

/** Refuses every query parameter, since no route takes one: what is ignored in silence misleads. */
export function parameters(app: FastifyInstance): void {
  app.addHook('onRequest', (request, reply, done) => {
    const start = request.url.indexOf('?');
    const problem = start < 0 ? undefined : queryProblem(request.url.slice(start + 1));
    if (problem === undefined) done();
    else sendProblem(reply, problem);
  });
}

function queryProblem(query: string): Problem | undefined {
  try {
    decodeURIComponent(query);
  } catch {
    return problemOf('unreadable', 'The query of the request target is not percent-encoded UTF-8.');
  }
  const names = [...new URLSearchParams(query).keys()];
  const [first] = names;
  if (first === undefined) return undefined;
  const repeated = names.find((name, i) => names.indexOf(name) !== i);
  return repeated === undefined
    ? problemOf('unknown-parameter', `There is no query parameter ${shown(first)}; the question goes into the body.`)
    : problemOf('repeated-parameter', `The query parameter ${shown(repeated)} is repeated.`);
}

function shown(name: string): string {
  return JSON.stringify(name.slice(0, 64).replace(/\p{Cs}/gu, ''));
}
