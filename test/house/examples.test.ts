import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { buildApp } from '../../src/http/app.ts';
import { readExamples } from '../support/examples.ts';

describe('openapi/examples', () => {
  let app: FastifyInstance;
  beforeAll(async () => {
    app = await buildApp({ catalogue: readCatalogue({ builtIn: true }) });
  });
  afterAll(() => app.close());

  it.each(readExamples().map((example) => [example.title, example] as const))('%s', async (_, example) => {
    const { method, path, body, status, answer } = example;
    const response = await app.inject({
      method,
      url: path,
      ...(body === undefined ? {} : { payload: body as object }),
    });
    expect(response.statusCode).toBe(status);
    expect(response.body).toBe(JSON.stringify(answer));
  });
});
