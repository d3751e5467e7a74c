import type { FastifyReply } from 'fastify';
import type { Problem } from '../contract/problem.ts';
import { answerHeaders } from './answer-headers.ts';

export const problemMediaType = 'application/problem+json';

/** Answers with a problem; the text is the same for the same request. */
export function sendProblem(reply: FastifyReply, problem: Problem, headers: Record<string, string> = {}): FastifyReply {
  return reply
    .code(problem.status)
    .headers({ ...answerHeaders, ...headers })
    .type(problemMediaType)
    .send(JSON.stringify(problem));
}

/** A whole HTTP/1.1 response with a problem, for a socket whose request never became one; the connection closes after it. */
export function rawProblem(problem: Problem): string {
  const body = JSON.stringify(problem);
  return [
    `HTTP/1.1 ${problem.status} ${problem.title}`,
    `content-type: ${problemMediaType}`,
    `content-length: ${Buffer.byteLength(body)}`,
    ...Object.entries(answerHeaders).map(([name, value]) => `${name}: ${value}`),
    'connection: close',
    '',
    body,
  ].join('\r\n');
}
