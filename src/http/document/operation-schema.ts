import type { FastifySchema } from 'fastify';
import type { FastifyZodOpenApiSchema } from 'fastify-zod-openapi';
import type * as z from 'zod';
import { type ProblemCode, problem, problemForms } from '../../contract/problem.ts';
import { problemMediaType } from '../problems.ts';

interface Described {
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: string;
  readonly response: z.ZodType;
  readonly request?: z.ZodType;
  readonly params?: z.ZodObject;
  /** media types beside JSON, with what they are */
  readonly forms?: Readonly<Record<string, { readonly description: string }>>;
}

const ofEveryPath: readonly ProblemCode[] = ['unreadable', 'not-acceptable', 'headers-too-large', 'our-fault', 'busy'];
const ofBodies: readonly ProblemCode[] = ['too-slow', 'too-large', 'unsupported-media', 'out-of-range'];
const ofIds: readonly ProblemCode[] = ['not-found'];

/** What the document says of a route: texts, bodies, and each status a caller must be ready for. */
export function operationSchema(described: Described): FastifySchema {
  const { operationId, summary, description, tag, request, response, params, forms = {} } = described;
  const problems = [...ofEveryPath, ...(request ? ofBodies : []), ...(params ? ofIds : [])];
  const statuses = problems
    .map((code) => problemForms[code].status)
    .sort((a, b) => a - b)
    .map((status) => [status, problemResponse(status)] as const);
  const schema: FastifyZodOpenApiSchema = {
    operationId,
    summary,
    description,
    tags: [tag],
    ...(request === undefined
      ? {}
      : { body: { required: true, content: { 'application/json': { schema: request } } } }),
    ...(params === undefined ? {} : { params }),
    response: {
      200: {
        description: 'The answer.',
        content: {
          'application/json': { schema: response },
          ...Object.fromEntries(Object.entries(forms).map(([type, form]) => [type, { schema: asText(form) }])),
        },
      },
      ...Object.fromEntries(statuses),
    },
  };
  return schema as FastifySchema;
}

function asText({ description }: { readonly description: string }) {
  return { type: 'string', description };
}

function problemResponse(status: number) {
  const codes = Object.entries(problemForms)
    .filter(([, form]) => form.status === status)
    .map(([code]) => code);
  return {
    description: `A problem: ${codes.join(', ')}.`,
    content: { [problemMediaType]: { schema: problem } },
  };
}
