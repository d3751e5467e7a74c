import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { addOperation, exchange } from '../../src/http/operation.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

const lines: string[] = [];
let app: FastifyInstance;

const operation = {
  operationId: 'odd',
  summary: 'Odd',
  description: 'Odd',
  tag: 'questions',
  request: z.strictObject({ how: z.enum(['nan', 'extra', 'throws', 'well']) }),
  response: z.strictObject({ outcome: z.literal('computed'), value: z.number() }),
  example: { how: 'well' as const },
  warmUp: [],
  answer({ how }: { how: string }) {
    if (how === 'throws') throw new TypeError('secret /etc/place');
    if (how === 'extra') return { outcome: 'computed' as const, value: 1, more: 1 };
    return { outcome: 'computed' as const, value: how === 'nan' ? Number.NaN : 1 };
  },
};

beforeAll(async () => {
  app = await testHouse({ logger: { level: 'info', stream: { write: (line: string) => void lines.push(line) } } });
  const throws: Record<string, () => unknown> = {
    error: () => {
      throw new Error('secret');
    },
    text: () => {
      throw 'secret';
    },
    nothing: () => {
      throw undefined;
    },
    disguised: () => {
      throw { statusCode: 404, message: 'secret', code: 'FST_ERR_NOT_OURS' };
    },
    rejected: () => Promise.reject(new Error('secret')),
    'rejected-nothing': () => Promise.reject(),
    'to-json': () => ({
      toJSON() {
        throw new Error('secret');
      },
    }),
  };
  for (const [name, handler] of Object.entries(throws)) app.get(`/throws/${name}`, handler);
  addOperation(app, { ...operation, url: '/v1/odd' });
});
afterAll(() => app.close());

describe('what nobody caught', () => {
  it.each(['error', 'text', 'nothing', 'disguised', 'rejected', 'rejected-nothing', 'to-json'])(
    '%s is 500, shows nothing, is logged, and the service lives',
    async (name) => {
      lines.length = 0;
      const answered = await app.inject(`/throws/${name}`);
      const { errors } = expectProblem(answered, 'our-fault');
      expect(errors).toEqual([]);
      expect(answered.body).not.toMatch(/secret|stack|node_modules/);
      expect(answered.headers['x-request-id']).toBeDefined();
      expect(lines.some((line) => JSON.parse(line).level === 50)).toBe(true);
      expect((await app.inject('/health/live')).statusCode).toBe(200);
    },
  );
});

describe('an answer that is not in its own form', () => {
  it.each(['nan', 'extra', 'throws'])('%s is our fault, and logged', async (how) => {
    lines.length = 0;
    const answered = await post(app, '/v1/odd', { how });
    expectProblem(answered, 'our-fault');
    expect(answered.body).not.toMatch(/secret|value|NaN/);
    expect(lines.join('')).toMatch(/our fault/);
  });

  it('and one that is, is sent', async () => {
    expect((await post(app, '/v1/odd', { how: 'well' })).body).toBe('{"outcome":"computed","value":1}');
  });

  it('stops the start, when the service asks itself', async () => {
    const own = await testHouse();
    expect(addOperation(own, { ...operation, url: '/v1/odd', warmUp: [{ how: 'nan' }] })).toThrow(/\/value/);
    expect(addOperation(own, { ...operation, url: '/v1/odder', warmUp: [{ how: 'well' }] })).not.toThrow();
    await own.close();
  });

  it('is checked by a compiled schema that agrees with the plain one', () => {
    const answer = exchange({ ...operation, url: '/v1/odd' });
    expect(answer(Buffer.from('{"how":"well"}'))).toBe('{"outcome":"computed","value":1}');
    expect(() => answer(Buffer.from('{"how":"nan"}'))).toThrow(/\/value/);
  });
});

describe('the log', () => {
  it('has one line a request, with the route and without the body', async () => {
    lines.length = 0;
    await post(app, '/v1/air', { reference: 'a tail number' }, { 'x-request-id': 'mine-1' });
    await app.inject('/v1/aeroplanes/no-such-one?x=secret');
    await app.inject('/nowhere');
    expect(lines.map((line) => JSON.parse(line))).toMatchObject([
      { reqId: 'mine-1', method: 'POST', route: '/v1/air', status: 422 },
      { method: 'GET', route: '/v1/aeroplanes/:id', status: 400 },
      { method: 'GET', route: 'none', status: 404 },
    ]);
    expect(lines.join('')).not.toMatch(/tail number|secret|nowhere/);
  });
});
