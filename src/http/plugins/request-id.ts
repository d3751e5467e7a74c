import { randomUUID } from 'node:crypto';
import type { IncomingMessage } from 'node:http';
import type { FastifyInstance } from 'fastify';

const lawful = /^[A-Za-z0-9._-]{1,64}$/;

/** The caller's id where it is a short plain word, else a random one: a log line is never written by a stranger. */
export function requestIdOf(request: IncomingMessage): string {
  const given = request.headers['x-request-id'];
  return typeof given === 'string' && lawful.test(given) ? given : randomUUID();
}

/** Tells the caller the id under which the log knows the request. */
export function requestId(app: FastifyInstance): void {
  app.addHook('onRequest', (request, reply, done) => {
    reply.header('x-request-id', request.id);
    done();
  });
}
