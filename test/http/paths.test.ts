import fs from 'node:fs';
import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const questions = ['/v1/takeoff', '/v1/speeds', '/v1/airspeed', '/v1/air'];
const lists = [
  '/v1/aerodromes',
  '/v1/aeroplanes',
  '/v1/rule-sets',
  '/v1/sources',
  '/v1/surfaces',
  '/health/live',
  '/health/ready',
  '/version',
];

describe('paths and methods', () => {
  it.each([...lists, '/v1/aeroplanes/pellibrin-trainer', '/openapi.json', '/docs'])('GET %s answers', async (url) => {
    const answered = await app.inject(url);
    expect(answered.statusCode).toBe(200);
    expect(answered.headers['x-content-type-options']).toBe('nosniff');
  });

  it.each(questions.flatMap((url) => ['GET', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'].map((method) => [method, url])))(
    '%s %s is 405 with Allow: POST',
    async (method, url) => {
      const answered = await app.inject({ method: method as 'GET', url: url as string });
      expectProblem(answered, 'method-not-allowed');
      expect(answered.headers['allow']).toBe('POST');
    },
  );

  it.each([...lists, '/v1/aeroplanes/pellibrin-trainer', '/v1/aeroplanes/no-such', '/openapi.json'])(
    'POST %s is 405 with Allow: GET, HEAD, whatever it carries',
    async (url) => {
      for (const answered of [await post(app, url, {}), await post(app, url, 'x', { 'content-type': 'text/plain' })]) {
        expectProblem(answered, 'method-not-allowed');
        expect(answered.headers['allow']).toBe('GET, HEAD');
      }
    },
  );

  it.each(['/', '/v1', '/v2/takeoff', '/v1/takeoff/', '/v1/Takeoff', '//v1/takeoff', '/v1/aeroplanes/a/b', '/.env'])(
    '%s is 404 under every method',
    async (url) => {
      for (const method of ['GET', 'POST', 'DELETE', 'OPTIONS'] as const) {
        expectProblem(await app.inject({ method, url, payload: method === 'POST' ? 'x' : '' }), 'not-found');
      }
    },
  );

  it('HEAD answers as GET without a body', async () => {
    const answered = await app.inject({ method: 'HEAD', url: '/v1/aeroplanes' });
    expect([answered.statusCode, answered.body]).toEqual([200, '']);
  });

  it('an unknown id in the path is 404 with near ids', async () => {
    const { errors } = expectProblem(await app.inject('/v1/aeroplanes/pelibrin-trainer'), 'not-found');
    expect(errors).toMatchObject([{ code: 'not-found', received: 'pelibrin-trainer' }]);
    expect(errors[0]?.hint).toContain('pellibrin-trainer');
  });

  it.each(['..%2f..%2fetc%2fpasswd', '%2e%2e', '..%5c', 'con', '__proto__', 'constructor', '%D0%B0bc', 'a'.repeat(64)])(
    'the id %s is looked up and nothing else',
    async (id) => {
      expectProblem(await app.inject(`/v1/aeroplanes/${id}`), 'not-found');
    },
  );

  it('an id longer than any id is 404', async () => {
    expectProblem(await app.inject(`/v1/aeroplanes/${'a'.repeat(300)}`), 'not-found');
  });

  it.each(['/%zz', '/v1/%', '/%ff'])('%s is not a path', async (url) => {
    expectProblem(await app.inject(url), 'unreadable');
  });
});

describe('query parameters', () => {
  it.each(['?m=1', '?__proto__=1', '?m[]=1', '?m', '?a.b=c', '?constructor[prototype]=1'])(
    '%s is refused',
    async (query) => {
      expectProblem(await post(app, `/v1/air${query}`, '{}'), 'unknown-parameter');
      expectProblem(await app.inject(`/v1/aeroplanes${query}`), 'unknown-parameter');
    },
  );

  it('a repeated one is told as repeated', async () => {
    expectProblem(await app.inject('/v1/aeroplanes?m=1&m=2'), 'repeated-parameter');
    expectProblem(await app.inject('/v1/aeroplanes?m=1&%6d=2'), 'repeated-parameter');
  });

  it('one that is no percent-encoded UTF-8 is unreadable; none after the mark is none', async () => {
    expectProblem(await app.inject('/v1/aeroplanes?m=%zz'), 'unreadable');
    expect((await app.inject('/v1/aeroplanes?')).statusCode).toBe(200);
  });
});

describe('what the caller accepts', () => {
  it.each(['*/*', 'application/json', 'application/*;q=0.1', 'text/html, application/json;q=0.5', 'APPLICATION/JSON'])(
    '%s is served',
    async (accept) => {
      expect((await app.inject({ url: '/v1/sources', headers: { accept } })).statusCode).toBe(200);
    },
  );

  it.each(['text/html', 'application/xml', 'application/json;q=0', 'application/json;q=0, */*', 'image/*', ''])(
    '%j is 406',
    async (accept) => {
      expectProblem(await app.inject({ url: '/v1/sources', headers: { accept } }), 'not-acceptable');
    },
  );

  it('does not matter on the pages for people', async () => {
    const page = await app.inject({ url: '/docs', headers: { accept: 'text/html' } });
    expect(page.statusCode).toBe(200);
    expect(page.headers['content-security-policy']).toBeDefined();
    expect((await app.inject('/v1/sources')).headers['content-security-policy']).toBeUndefined();
  });
});

describe('a file of the pages', () => {
  it('is sent whole, whatever range or age the caller asks for', async () => {
    const whole = await app.inject('/docs/static/swagger-ui.css');
    expect(whole.statusCode).toBe(200);
    expect(whole.headers['content-type']).toBe('text/css; charset=utf-8');
    const headers = { range: 'bytes=9-2', 'if-modified-since': 'Fri, 99 Foo 9999 00:00:00 GMT' };
    const asked = await app.inject({ url: '/docs/static/swagger-ui.css', headers });
    expect([asked.statusCode, asked.body === whole.body]).toEqual([200, true]);
    const head = await app.inject({ method: 'HEAD', url: '/docs/static/swagger-ui.css' });
    expect([head.statusCode, head.body]).toEqual([200, '']);
  });

  it.each(['', 'nothing.js', '%00', '%5c..%5c..%5cpackage.json', '..%2f..%2f..%2fpackage.json', 'a'.repeat(300)])(
    'is not %j',
    async (name) => {
      expectProblem(await app.inject(`/docs/static/${name}`), 'not-found');
    },
  );

  it('is read once, at start: no request reaches the disk', async () => {
    const calls = ['open', 'openSync', 'readFile', 'stat', 'lstat', 'createReadStream'] as const;
    const spies = calls.map((name) => vi.spyOn(fs, name));
    for (const url of ['/docs', '/docs/static/swagger-ui-bundle.js', '/docs/static/none.js', '/v1/aeroplanes/..%2fa']) {
      await app.inject(url);
    }
    expect(spies.map((spy) => spy.mock.calls.length)).toEqual(calls.map(() => 0));
    for (const spy of spies) spy.mockRestore();
  });
});

describe('the request id', () => {
  it.each(['a', 'Flight-7.b_2', 'x'.repeat(64)])('%s is kept', async (id) => {
    expect((await app.inject({ url: '/version', headers: { 'x-request-id': id } })).headers['x-request-id']).toBe(id);
  });

  it.each(['', 'x'.repeat(65), 'a b', 'a"b', '{"level":60}', 'é'])('%j is replaced', async (id) => {
    const { headers } = await app.inject({ url: '/version', headers: { 'x-request-id': id } });
    expect(headers['x-request-id']).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4/);
  });
});
