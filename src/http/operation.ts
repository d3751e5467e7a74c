import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import * as z from 'zod';
import { type Problem, toProblem } from '../contract/problem.ts';
import { reader } from '../contract/reading/reader.ts';
import { readStrictJson } from '../contract/reading/strict-json.ts';
import { completed, type Work } from '../numerics/work.ts';
import { type Fault, isRefused, type Refused } from '../planning/fault.ts';
import { answerHeaders } from './answer-headers.ts';
import type { BodyLimits } from './body-limits.ts';
import { operationSchema } from './document/operation-schema.ts';
import { inSlices } from './in-slices.ts';
import { bestOffer } from './plugins/acceptable.ts';
import { jsonOnly } from './plugins/json-body.ts';
import { sendProblem } from './problems.ts';

declare module 'fastify' {
  interface FastifyContextConfig {
    /** a body that the document shows */
    example?: unknown;
    /** media types that the answer can be written in, the first where the caller does not care; absent: JSON */
    offers?: readonly string[];
  }
}

/** An answer as another media type than JSON. */
export interface Form<Answer> {
  /** with its parameters */
  readonly mediaType: string;
  readonly headers?: Readonly<Record<string, string>>;
  readonly write: (answer: Answer) => string;
  /** what the document says of it */
  readonly description: string;
}

/** One POST of the service: what it reads and what it answers. */
interface OperationShape<Request extends z.ZodType, Response extends z.ZodType> {
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
  /** how much a body may hold; absent: as a question */
  readonly limits?: BodyLimits;
  /** other media types that the answer can be written in */
  readonly forms?: Readonly<Record<string, Form<z.output<Response>>>>;
  /** what the document says of the answer; absent: its schema */
  readonly documented?: z.ZodType;
  /** what the question wants to see of a lawful answer; absent: all of it */
  readonly shown?: (answer: z.output<Response>, question: z.output<Request>) => unknown;
}

/** An operation that is answered at once. */
export interface Operation<Request extends z.ZodType, Response extends z.ZodType>
  extends OperationShape<Request, Response> {
  readonly answer: (question: z.output<Request>) => z.output<Response> | Refused;
}

/** An operation whose answer is long work: other requests are answered between its steps. */
export interface LongOperation<Request extends z.ZodType, Response extends z.ZodType>
  extends OperationShape<Request, Response> {
  readonly work: (question: z.output<Request>) => Work<z.output<Response> | Refused>;
}

/** Answers the bytes of one body: the text of the answer, in one of its media types, or a problem. */
export type Exchange = (body: Uint8Array, mediaType?: string) => string | Problem;

export const answerMediaType = 'application/json; charset=utf-8';
const jsonMediaType = 'application/json';
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
  const { read, write } = gates(operation);
  return (body, mediaType) => {
    const question = read(body);
    return 'problem' in question
      ? question.problem
      : write(operation.answer(question.value), question.value, mediaType);
  };
}

/** The same of a long operation, as work. */
function longExchange<Request extends z.ZodType, Response extends z.ZodType>(
  operation: LongOperation<Request, Response>,
): (body: Uint8Array, mediaType?: string) => Work<string | Problem> {
  const { read, write } = gates(operation);
  return function* (body, mediaType) {
    const question = read(body);
    if ('problem' in question) return question.problem;
    return write(yield* operation.work(question.value), question.value, mediaType);
  };
}

/** From bytes to question, and from answer to text. */
function gates<Request extends z.ZodType, Response extends z.ZodType>(operation: OperationShape<Request, Response>) {
  const { shown, limits, forms = {}, ownText = [] } = operation;
  const readJson = reader(operation.request);
  const lawful = z.compile(operation.response, { strict: true });
  const refused = (by: readonly Fault[]) => ({ problem: toProblem({ refused: by }) });
  return {
    read(body: Uint8Array): { readonly value: z.output<Request> } | { readonly problem: Problem } {
      const json = readStrictJson(body, limits?.json);
      if (isRefused(json)) return { problem: toProblem(json) };
      const question = readJson(json.value);
      const slips = json.slips.filter(({ pointer }) => !ownText.includes(pointer));
      if (isRefused(question)) return refused(together(slips, question.refused));
      return slips.length > 0 ? refused(slips) : question;
    },
    write(
      answer: z.output<Response> | Refused,
      question: z.output<Request>,
      mediaType = jsonMediaType,
    ): string | Problem {
      if (isRefused(answer as object)) return toProblem(answer as Refused);
      if (!lawful.validate(answer)) throw new AnswerFault(faultsOf(operation.response, answer));
      const form = forms[mediaType];
      if (form !== undefined) return form.write(answer as z.output<Response>);
      return JSON.stringify(shown === undefined ? answer : shown(answer as z.output<Response>, question));
    },
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
    ...routeOf(operation),
    handler(request, reply) {
      const mediaType = askedFor(operation, request);
      return send(reply, answerTo(bodyOf(request), mediaType), operation.forms?.[mediaType]);
    },
  });
  return warmUp(operation, answerTo);
}

/** Puts a long operation on the wire; one whose caller has gone is not finished. */
export function addLongOperation<Request extends z.ZodType, Response extends z.ZodType>(
  app: FastifyInstance,
  operation: LongOperation<Request, Response>,
): WarmUp {
  const workOn = longExchange(operation);
  app.route({
    ...routeOf(operation),
    async handler(request, reply) {
      const mediaType = askedFor(operation, request);
      const answered = await inSlices(workOn(bodyOf(request), mediaType), () => !reply.raw.destroyed);
      return answered === undefined ? reply.hijack() : send(reply, answered, operation.forms?.[mediaType]);
    },
  });
  return warmUp(operation, (body) => completed(workOn(body)));
}

function routeOf<Request extends z.ZodType, Response extends z.ZodType>(operation: OperationShape<Request, Response>) {
  return {
    method: 'POST',
    url: operation.url,
    schema: operationSchema({ ...operation, response: operation.documented ?? operation.response }),
    config: { example: operation.example as unknown, offers: offersOf(operation) },
    ...(operation.limits === undefined ? {} : { bodyLimit: operation.limits.bytes }),
    onRequest: jsonOnly,
  } as const;
}

function offersOf({ forms = {} }: { readonly forms?: Readonly<Record<string, unknown>> }): readonly string[] {
  return [jsonMediaType, ...Object.keys(forms)];
}

/** The media type that the caller likes best; one that takes none of them is refused before. */
function askedFor(
  operation: { readonly forms?: Readonly<Record<string, unknown>> },
  { headers }: FastifyRequest,
): string {
  return bestOffer(headers.accept, offersOf(operation)) ?? jsonMediaType;
}

function bodyOf({ body }: FastifyRequest): Uint8Array {
  return (body as Uint8Array | undefined) ?? nothing;
}

function send(
  reply: FastifyReply,
  answered: string | Problem,
  form?: Pick<Form<never>, 'mediaType' | 'headers'>,
): FastifyReply {
  if (typeof answered !== 'string') return sendProblem(reply, answered);
  return reply
    .headers({ ...answerHeaders, ...form?.headers })
    .type(form?.mediaType ?? answerMediaType)
    .send(answered);
}

function warmUp<Request extends z.ZodType, Response extends z.ZodType>(
  { url, warmUp: questions }: OperationShape<Request, Response>,
  answerTo: Exchange,
): WarmUp {
  const bodies = questions.map((question) => new TextEncoder().encode(JSON.stringify(question)));
  return () => {
    for (const body of bodies) {
      const answered = answerTo(body);
      if (typeof answered !== 'string') throw new AnswerFault(`${url} refused: ${answered.detail}`);
    }
  };
}
