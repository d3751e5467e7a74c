import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import { type Problem, type ProblemCode, problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';
import { unsupportedMedia } from './json-body.ts';

/** What the framework itself may refuse, in our words; all else is our fault. */
const refusals: Readonly<Record<string, readonly [ProblemCode, string]>> = {
  FST_ERR_CTP_BODY_TOO_LARGE: ['too-large', 'The body is larger than this path takes.'],
  FST_ERR_CTP_INVALID_CONTENT_LENGTH: ['unreadable', 'The body is not as long as Content-Length says.'],
  FST_ERR_BAD_URL: ['unreadable', 'The request target is not percent-encoded UTF-8.'],
  FST_ERR_MAX_PARAM_LENGTH: ['not-found', 'There is nothing at this path.'],
  ECONNRESET: ['unreadable', 'The body ended early.'],
};

const media = new Set([
  'FST_ERR_CTP_INVALID_MEDIA_TYPE',
  'FST_ERR_CTP_EMPTY_TYPE',
  'FST_ERR_ROUTE_MISSING_CONTENT_TYPE',
]);

/** Where every throw ends: a refusal of the framework in our form, or a 500 that shows nothing and logs all. */
export function answerError(error: unknown, request: FastifyRequest, reply: FastifyReply): void {
  const code = codeOf(error);
  if (media.has(code)) {
    unsupportedMedia(reply, 'The body must be application/json, in UTF-8.');
    return;
  }
  const refusal = Object.hasOwn(refusals, code) ? refusals[code] : undefined;
  if (refusal !== undefined) {
    sendProblem(reply, problemOf(...refusal), code === 'FST_ERR_CTP_BODY_TOO_LARGE' ? { connection: 'close' } : {});
    return;
  }
  request.log.error({ err: error instanceof Error ? error : { thrown: String(error) } }, 'our fault');
  sendProblem(reply, ourFault());
}

export function ourFault(): Problem {
  return problemOf('our-fault', 'The service failed on this request. Its log knows more, under the request id.');
}

export function lastResort(app: FastifyInstance): void {
  app.setErrorHandler(answerError);
}

function codeOf(error: unknown): string {
  return typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : '';
}
