import type { FastifyInstance } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

/** While the service closes: requests in hand are answered, new ones are sent elsewhere. */
export function closing(app: FastifyInstance): void {
  let isClosing = false;
  app.addHook('preClose', (done) => {
    isClosing = true;
    done();
  });
  app.addHook('onRequest', (_request, reply, done) => {
    if (isClosing) {
      sendProblem(reply, problemOf('busy', 'The service is closing.'), { 'retry-after': '1', connection: 'close' });
    } else done();
  });
}
