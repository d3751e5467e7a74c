import type { FastifyInstance, FastifyRequest } from 'fastify';
import { type Problem, problemOf } from '../../contract/problem.ts';
import { rawProblem, sendProblem } from '../problems.ts';
import { lastAnswers } from './client-error.ts';

/** More header fields than these are refused; our choice, since no honest caller sends half as many. */
const mostFields = 100;

/**
 * Refuses requests that the HTTP parser lets pass and that two readers could understand differently.
 *
 * @see references.Rfc9110, sec. 7.2 and 10.1.1; RFC 9112, sec. 3.2 and 6.1
 */
export function framing(app: FastifyInstance): void {
  app.addHook('onRequest', (request, reply, done) => {
    const problem = framingProblem(request);
    if (problem === undefined) {
      done();
      return;
    }
    lastAnswers.add(request.raw.socket);
    sendProblem(reply, problem, { connection: 'close' });
  });

  app.server.on('checkExpectation', (_request, response) => {
    response.socket?.end(rawProblem(problemOf('expectation-failed', 'Only 100-continue can be met.')));
  });
  app.server.on('connect', (_request, socket) => {
    socket.end(rawProblem(problemOf('not-implemented', 'The service is no proxy.')));
  });
}

function framingProblem({ raw }: FastifyRequest): Problem | undefined {
  const { rawHeaders } = raw;
  if (rawHeaders.length > 2 * mostFields) {
    return problemOf('headers-too-large', `There are more than ${mostFields} header fields.`);
  }
  if (raw.httpVersionMajor !== 1) return problemOf('unreadable', 'The request is not HTTP/1.1 or HTTP/1.0.');
  let hosts = 0;
  let types = 0;
  for (let i = 0; i < rawHeaders.length; i += 2) {
    const name = rawHeaders[i] as string;
    if (name.length === 4 && name.toLowerCase() === 'host') hosts++;
    if (name.length === 12 && name.toLowerCase() === 'content-type') types++;
  }
  if (types > 1) return problemOf('unreadable', 'The request may carry only one Content-Type field.');
  if (hosts > 1 || (hosts === 0 && raw.httpVersionMinor > 0)) {
    return problemOf('unreadable', 'The request must carry exactly one Host field.');
  }
  if (raw.url?.[0] !== '/') return problemOf('unreadable', 'The request target must be a path.');
  const coding = raw.headers['transfer-encoding'];
  if (coding === undefined) return undefined;
  if (raw.httpVersionMinor === 0) return problemOf('unreadable', 'HTTP/1.0 has no transfer codings.');
  if (coding.toLowerCase() === 'chunked') return undefined;
  return /(^|[, \t])chunked[ \t]*$/i.test(coding)
    ? problemOf('not-implemented', 'The only transfer coding known is chunked.')
    : problemOf('unreadable', 'The last transfer coding must be chunked.');
}
