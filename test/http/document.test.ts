import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problemForms } from '../../src/contract/problem.ts';
import { serviceName, serviceVersion } from '../../src/http/service-version.ts';
import { post, testHouse } from '../support/house.ts';
import { root } from '../support/sources.ts';

interface Operation {
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tags: readonly string[];
  readonly requestBody?: { readonly content: Readonly<Record<string, { readonly example?: unknown }>> };
  readonly responses: Readonly<Record<string, { readonly content: Readonly<Record<string, unknown>> }>>;
}
interface Document {
  readonly openapi: string;
  readonly info: { readonly version: string };
  readonly tags: readonly { readonly name: string }[];
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>;
  readonly components: Readonly<Record<string, Readonly<Record<string, unknown>>>>;
}

let app: FastifyInstance;
let text: string;
let document: Document;
let operations: { readonly path: string; readonly method: string; readonly operation: Operation }[];

beforeAll(async () => {
  app = await testHouse();
  text = (await app.inject('/openapi.json')).body;
  document = JSON.parse(text);
  operations = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  );
});
afterAll(() => app.close());

describe('the OpenAPI document', () => {
  it('is 3.1 and names every path of the service once', () => {
    expect(document.openapi).toMatch(/^3\.1\./);
    expect(operations.map(({ path, method }) => `${method} ${path}`).sort()).toEqual([
      'get /health/live',
      'get /health/ready',
      'get /v1/aerodromes',
      'get /v1/aerodromes/{id}',
      'get /v1/aeroplanes',
      'get /v1/aeroplanes/{id}',
      'get /v1/rule-sets',
      'get /v1/sources',
      'get /v1/surfaces',
      'get /version',
      'post /v1/aeroplanes/fit',
      'post /v1/aeroplanes/proof',
      'post /v1/aeroplanes/proofread',
      'post /v1/aeroplanes/tables',
      'post /v1/air',
      'post /v1/airspeed',
      'post /v1/landing',
      'post /v1/landing/choices',
      'post /v1/speeds',
      'post /v1/takeoff',
      'post /v1/takeoff/choices',
      'post /v1/weather/decode',
    ]);
  });

  it('is the same when built again', async () => {
    const again = await testHouse();
    expect((await again.inject('/openapi.json')).body).toBe(text);
    await again.close();
  });

  it('is the one checked in; npm run openapi writes it', () => {
    const held = readFileSync(join(root, 'openapi', 'openapi.json'), 'utf8');
    expect(held === `${JSON.stringify(document, undefined, 2)}\n`, 'run npm run openapi').toBe(true);
  });

  it('has texts, an own id and a known tag for every operation', () => {
    const tags = document.tags.map(({ name }) => name);
    expect(new Set(operations.map(({ operation }) => operation.operationId)).size).toBe(operations.length);
    for (const { path, operation } of operations) {
      expect(operation.summary, path).toMatch(/\?$/);
      expect(operation.description, path).toMatch(/\.$/);
      expect(
        operation.tags.every((tag) => tags.includes(tag)),
        path,
      ).toBe(true);
    }
  });

  it('resolves every reference, and uses every component', () => {
    const used = new Set([...text.matchAll(/"\$ref":"#\/components\/schemas\/([^"]+)"/g)].map(([, name]) => name));
    expect([...used].sort()).toEqual(Object.keys(document.components['schemas'] ?? {}).sort());
    expect(text.match(/"\$ref":"(?!#\/components\/schemas\/)/g)).toBeNull();
  });

  it('tells every status as a problem, with codes that exist', () => {
    const statuses = new Set(Object.values(problemForms).map(({ status }) => String(status)));
    for (const { path, method, operation } of operations) {
      const { 200: answer, ...problems } = operation.responses;
      const forms = path === '/v1/aeroplanes/proof' ? ['text/csv', 'text/html'] : [];
      expect(Object.keys(answer?.content ?? {}), path).toEqual(['application/json', ...forms]);
      expect(Object.keys(problems), path).toEqual(expect.arrayContaining(['400', '500', '503']));
      if (method === 'post') expect(Object.keys(problems), path).toEqual(expect.arrayContaining(['413', '415', '422']));
      for (const [status, { content }] of Object.entries(problems)) {
        expect(statuses).toContain(status);
        expect(Object.keys(content)).toEqual(['application/problem+json']);
      }
    }
  });

  it('bounds every number that a question may carry', () => {
    const open: string[] = [];
    const walk = (node: unknown, at: string): void => {
      if (typeof node !== 'object' || node === null) return;
      const { type, minimum, maximum, $ref } = node as Record<string, unknown>;
      const bounded = typeof minimum === 'number' && typeof maximum === 'number';
      if ((type === 'number' || type === 'integer') && !bounded) open.push(at);
      if (typeof $ref === 'string' && !seen.has($ref)) {
        seen.add($ref);
        walk(document.components['schemas']?.[$ref.split('/').at(-1) as string], $ref);
      }
      for (const [name, child] of Object.entries(node)) walk(child, `${at}/${name}`);
    };
    const seen = new Set<string>();
    for (const { path, operation } of operations) walk(operation.requestBody, path);
    expect(seen.size).toBeGreaterThan(30);
    expect(open).toEqual([]);
  });

  it('shows an example for each question, and the service answers it', async () => {
    const questions = operations.filter(({ method }) => method === 'post');
    expect(questions).toHaveLength(12);
    for (const { path, operation } of questions) {
      const example = operation.requestBody?.content['application/json']?.example;
      const answered = await post(app, path, example);
      expect(answered.statusCode, `${path} ${answered.body}`).toBe(200);
      expect(JSON.parse(answered.body)).toHaveProperty('outcome');
    }
  });

  it('carries the version of package.json', () => {
    const { name, version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
    expect([serviceName, serviceVersion, document.info.version]).toEqual([name, version, version]);
  });
});

describe('the pages for people', () => {
  it('load nothing from elsewhere', async () => {
    const { body, headers } = await app.inject('/docs/');
    expect(body).not.toMatch(/(?:src|href)="https?:/);
    expect(headers['content-security-policy']).toMatch(/default-src 'self'/);
    expect(headers['content-security-policy']).not.toMatch(/upgrade-insecure-requests/);
    expect(headers).not.toHaveProperty('strict-transport-security');
    const sources = [...body.matchAll(/(?:src|href)="\.\/(static\/[^"]+)"/g)].map(([, path]) => path);
    expect(sources.length).toBeGreaterThan(3);
    for (const path of sources) expect((await app.inject(`/docs/${path}`)).statusCode, path).toBe(200);
  });
});
