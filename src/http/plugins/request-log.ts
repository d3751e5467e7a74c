import type { FastifyInstance } from 'fastify';

/** One line a request, when it is answered: no body, no address, no query. */
export function requestLog(app: FastifyInstance): void {
  app.addHook('onResponse', (request, reply, done) => {
    request.log.info(
      {
        method: request.method,
        route: request.routeOptions.url ?? 'none',
        status: reply.statusCode,
        milliseconds: Math.round(reply.elapsedTime * 1000) / 1000,
      },
      'answered',
    );
    done();
  });
}
