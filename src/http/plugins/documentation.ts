import helmet from '@fastify/helmet';
import swagger from '@fastify/swagger';
import swaggerUi from '@fastify/swagger-ui';
import type { FastifyInstance } from 'fastify';
import { fastifyZodOpenApiPlugin, fastifyZodOpenApiTransformers } from 'fastify-zod-openapi';
import { documentHead } from '../document/document-head.ts';

/** Gathers every route into one OpenAPI document. Must come before the routes. */
export async function documentation(app: FastifyInstance): Promise<void> {
  await app.register(fastifyZodOpenApiPlugin);
  await app.register(swagger, { openapi: documentHead, ...fastifyZodOpenApiTransformers });
}

/** Serves the document and a page to browse it. Must come after the routes. */
export async function documentPages(app: FastifyInstance): Promise<void> {
  let text: string | undefined;
  app.get('/openapi.json', { schema: { hide: true } }, (_request, reply) => {
    text ??= JSON.stringify(app.swagger());
    return reply.type('application/json; charset=utf-8').header('x-content-type-options', 'nosniff').send(text);
  });
  await app.register(async (pages) => {
    await pages.register(helmet);
    await pages.register(swaggerUi, { routePrefix: '/docs' });
  });
}
