import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

/** Answers what no route takes: 405 with Allow where the path is known under another method, else 404. */
export function knownPaths(app: FastifyInstance): void {
  const methods = new Map<string, { readonly path: RegExp; readonly allowed: Set<string> }>();

  app.addHook('onRoute', ({ url, method }) => {
    const known = methods.get(url) ?? { path: pathPattern(url), allowed: new Set<string>() };
    for (const one of typeof method === 'string' ? [method] : method) known.allowed.add(one);
    methods.set(url, known);
  });

  function answer(request: FastifyRequest, reply: FastifyReply): FastifyReply {
    const path = (request.url.split('?')[0] as string).slice(0, 512);
    const known = [...methods.values()].find((one) => one.path.test(path));
    if (known === undefined) return sendProblem(reply, problemOf('not-found', 'There is nothing at this path.'));
    const allow = [...known.allowed].sort().join(', ');
    return sendProblem(reply, problemOf('method-not-allowed', `This path takes ${allow}.`), { allow });
  }

  app.addHook('onRequest', (request, reply, done) => {
    if (request.is404) answer(request, reply);
    else done();
  });
  app.setNotFoundHandler(answer);
}

/** '/v1/aeroplanes/:id' as an expression; '*' stands for any rest. */
function pathPattern(url: string): RegExp {
  const steps = url
    .split('/')
    .map((step) => (step.startsWith(':') ? '[^/]+' : step === '*' ? '.*' : step.replace(/[.+?^${}()|[\]\\]/g, '\\$&')));
  return new RegExp(`^${steps.join('/')}$`);
}
