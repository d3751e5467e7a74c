import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import helmet from '@fastify/helmet';
import swagger from '@fastify/swagger';
import swaggerUi from '@fastify/swagger-ui';
import type { FastifyInstance } from 'fastify';
import { fastifyZodOpenApiPlugin, fastifyZodOpenApiTransformers } from 'fastify-zod-openapi';
import { problemOf } from '../../contract/problem.ts';
import { documentHead } from '../document/document-head.ts';
import { sendProblem } from '../problems.ts';
import { keptFiles } from './kept-files.ts';

const require = createRequire(import.meta.url);

/** Gathers every route into one OpenAPI document. Must come before the routes. */
export async function documentation(app: FastifyInstance): Promise<void> {
  const examples = new Map<string, unknown>();
  app.addHook('onRoute', ({ url, config }) => {
    if (config?.example !== undefined) examples.set(url, config.example);
  });
  await app.register(fastifyZodOpenApiPlugin);
  await app.register(swagger, {
    openapi: documentHead,
    transform: fastifyZodOpenApiTransformers.transform,
    transformObject(gathered) {
      const document = fastifyZodOpenApiTransformers.transformObject(gathered);
      addExamples(document as Bodies, examples);
      return document;
    },
  });
}

interface Bodies {
  readonly paths?: Readonly<
    Record<string, { post?: { requestBody?: { content?: Record<string, { example?: unknown }> } } }>
  >;
}

/** The transformer drops the example of a body; this puts it back. */
function addExamples({ paths }: Bodies, examples: ReadonlyMap<string, unknown>): void {
  for (const [url, example] of examples) {
    const content = paths?.[url]?.post?.requestBody?.content?.['application/json'];
    if (content !== undefined) content.example = example;
  }
}

/** Serves the document and a page to browse it. Must come after the routes. */
export async function documentPages(app: FastifyInstance): Promise<void> {
  let text = '';
  app.addHook('onReady', (done) => {
    // now, since gathering takes longer than any request may
    text = JSON.stringify(app.swagger());
    done();
  });
  app.get('/openapi.json', { schema: { hide: true } }, (_request, reply) => {
    return reply.type('application/json; charset=utf-8').header('x-content-type-options', 'nosniff').send(text);
  });
  await app.register(async (pages) => {
    // served over plain HTTP inside a hangar as well: asking browsers for HTTPS would leave the page empty there
    await pages.register(helmet, {
      contentSecurityPolicy: { directives: { upgradeInsecureRequests: null } },
      strictTransportSecurity: false,
    });
    keptFiles(pages, '/docs/static', join(dirname(require.resolve('@fastify/swagger-ui')), 'static'));
    pages.addHook('onRequest', (request, reply, done) => {
      // writing YAML takes longer than any request may
      if (request.routeOptions.url !== '/docs/yaml') done();
      else sendProblem(reply, problemOf('not-found', 'There is nothing at this path; the document is /openapi.json.'));
    });
    await pages.register(swaggerUi, { routePrefix: '/docs' });
  });
}
