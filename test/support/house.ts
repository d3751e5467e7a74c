import type { FastifyInstance, LightMyRequestResponse } from 'fastify';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { buildApp, type House } from '../../src/http/app.ts';

/** The service as shipped, over the built-in aeroplanes, without its warm-up. */
export function testHouse(house: Partial<House> = {}): Promise<FastifyInstance> {
  return buildApp({ catalogue: readCatalogue({ builtIn: true }), settings: { warmUpRounds: 0 }, ...house });
}

/** Posts a body as application/json; text goes as it stands, all else through JSON.stringify. */
export function post(
  app: FastifyInstance,
  url: string,
  body: unknown,
  headers: Record<string, string> = {},
): Promise<LightMyRequestResponse> {
  const payload = typeof body === 'string' || body instanceof Uint8Array ? Buffer.from(body) : JSON.stringify(body);
  return app.inject({ method: 'POST', url, payload, headers: { 'content-type': 'application/json', ...headers } });
}
