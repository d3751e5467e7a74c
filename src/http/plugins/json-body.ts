import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

const jsonMediaType = /^application\/json(?:[ \t]*;[ \t]*charset[ \t]*=[ \t]*(?:utf-8|"utf-8"))?(?:[ \t]*;)?[ \t]*$/i;

/** The one parser of the house: it hands the bytes on as they came. */
export function jsonBody(app: FastifyInstance): void {
  app.removeAllContentTypeParsers();
  app.addContentTypeParser('application/json', { parseAs: 'buffer' }, (_request, body, done) => done(null, body));
}

/** Refuses a body that is not plain JSON in UTF-8, before it is read. */
export function jsonOnly(request: FastifyRequest, reply: FastifyReply, done: () => void): void {
  const { 'content-type': type, 'content-encoding': coding } = request.headers;
  if (type === undefined || !jsonMediaType.test(type)) {
    unsupportedMedia(reply, 'The body must be application/json, in UTF-8.');
  } else if (coding !== undefined && coding.toLowerCase() !== 'identity') {
    unsupportedMedia(reply, 'The body must not be compressed.');
  } else done();
}

export function unsupportedMedia(reply: FastifyReply, detail: string): void {
  sendProblem(reply, problemOf('unsupported-media', detail), {
    'accept-post': 'application/json',
    'accept-encoding': 'identity',
  });
}
