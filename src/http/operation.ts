import type { FastifyInstance } from 'fastify';
import * as z from 'zod';
import { type Problem, toProblem } from '../contract/problem.ts';
import { reader } from '../contract/reading/reader.ts';
import { readStrictJson } from '../contract/reading/strict-json.ts';
import { type Fault, isRefused, type Refused } from '../planning/fault.ts';
import { answerHeaders } from './answer-headers.ts';
import { operationSchema } from './document/operation-schema.ts';
import { jsonOnly } from './plugins/json-body.ts';
import { sendProblem } from './problems.ts';

declare module 'fastify' {
  interface FastifyContextConfig {
    /** a body that the document shows */
    example?: unknown;
  }
}

/** One POST of the service: what it reads, what it answers, and the function between. */
export interface Operation<Request extends z.ZodType, Response extends z.ZodType> {
  readonly url: string;
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: string;
  readonly request: Request;
  readonly response: Response;
  /** one request that the document shows */
  readonly example: z.input<Request>;
  /** pointers of texts whose own reader judges their characters: such a text has more than one line */
  readonly ownText?: readonly string[];
  /** the questions that must be answered before the service says ready */
  readonly warmUp: readonly z.input<Request>[];
  readonly answer: (question: z.output<Request>) => z.output<Response> | Refused;
  /** what the document says of the answer; absent: its schema */
  readonly documented?: z.ZodType;
  /** what the question wants to see of a lawful answer; absent: all of it */
  readonly shown?: (answer: z.output<Response>, question: z.output<Request>) => unknown;
}

/** Answers the bytes of one body: the text of the answer, or a problem. */
export type Exchange = (body: Uint8Array) => string | Problem;

export const answerMediaType = 'application/json; charset=utf-8';
const nothing = new Uint8Array(0);

/** What our own answer lacks of its own schema; never shown to the caller. */
export class AnswerFault extends Error {}

/**
 * The whole way of an operation from bytes to text: strict reading, the schema of the request, the answer, the schema of
 * the answer. A number that is not finite fails at the last gate and never becomes null.
 */
export function exchange<Request extends z.ZodType, Response extends z.ZodType>(
  operation: Operation<Request, Response>,
): Exchange {
  const { shown, ownText = [] } = operation;
  const read = reader(operation.request);
  const lawful = z.compile(operation.response, { strict: true });
  return (body) => {
    const json = readStrictJson(body);
    if (isRefused(json)) return toProblem(json);
    const question = read(json.value);
    const slips = json.slips.filter(({ pointer }) => !ownText.includes(pointer));
    if (isRefused(question)) return toProblem({ refused: together(slips, question.refused) });
    if (slips.length > 0) return toProblem({ refused: slips });
    const answer = operation.answer(question.value);
    if (isRefused(answer as object)) return toProblem(answer as Refused);
    if (!lawful.validate(answer)) throw new AnswerFault(faultsOf(operation.response, answer));
    return JSON.stringify(shown === undefined ? answer : shown(answer as z.output<Response>, question.value));
  };
}

function together(slips: readonly Fault[], faults: readonly Fault[]): Fault[] {
  const at = new Set(slips.map(({ pointer }) => pointer));
  return [...slips, ...faults.filter(({ pointer }) => !at.has(pointer))];
}

function faultsOf(schema: z.ZodType, answer: unknown): string {
  const issues = schema.safeParse(answer).error?.issues ?? [];
  return `the answer is not in its own form: ${issues.map(({ path, message }) => `/${path.join('/')} ${message}`).join('; ')}`;
}

/** Answers an operation's own questions once; throws where one of them is not answered. */
export type WarmUp = () => void;

/** Puts an operation on the wire. */
export function addOperation<Request extends z.ZodType, Response extends z.ZodType>(
  app: FastifyInstance,
  operation: Operation<Request, Response>,
): WarmUp {
  const answerTo = exchange(operation);
  app.route({
    method: 'POST',
    url: operation.url,
    schema: operationSchema({ ...operation, response: operation.documented ?? operation.response }),
    config: { example: operation.example },
    onRequest: jsonOnly,
    handler(request, reply) {
      const answered = answerTo((request.body as Uint8Array | undefined) ?? nothing);
      if (typeof answered !== 'string') return sendProblem(reply, answered);
      return reply.headers(answerHeaders).type(answerMediaType).send(answered);
    },
  });
  const questions = operation.warmUp.map((question) => new TextEncoder().encode(JSON.stringify(question)));
  return () => {
    for (const question of questions) {
      const answered = answerTo(question);
      if (typeof answered !== 'string') throw new AnswerFault(`${operation.url} refused: ${answered.detail}`);
    }
  };
}
