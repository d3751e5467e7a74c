import { type AddressInfo, connect } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';
import type { FastifyInstance } from 'fastify';
import { request } from 'undici';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ProblemCode } from '../../src/contract/problem.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { testHouse } from '../support/house.ts';
import { answersIn, rawRequest } from '../support/raw-request.ts';

let app: FastifyInstance;
let port: number;
beforeAll(async () => {
  app = await testHouse();
  await app.listen({ port: 0, host: '127.0.0.1' });
  port = (app.server.address() as AddressInfo).port;
});
afterAll(() => app.close());

const json = 'content-type: application/json\r\n';
const get = (more: string) => `GET /health/live HTTP/1.1\r\nhost: a\r\n${more}\r\n`;
const put = (more: string, body = '{}') => `POST /v1/air HTTP/1.1\r\nhost: a\r\n${json}${more}\r\n${body}`;
const chunked = '2\r\n{}\r\n0\r\n\r\n';

describe('bytes that two readers could understand differently', () => {
  const refused: [string, string, ProblemCode][] = [
    [
      'Content-Length beside Transfer-Encoding',
      put('content-length: 2\r\ntransfer-encoding: chunked\r\n', chunked),
      'unreadable',
    ],
    ['two Content-Length', put('content-length: 2\r\ncontent-length: 3\r\n'), 'unreadable'],
    ['Content-Length +2', put('content-length: +2\r\n'), 'unreadable'],
    ['Content-Length "2, 2"', put('content-length: 2, 2\r\n'), 'unreadable'],
    ['Transfer-Encoding xchunked', put('transfer-encoding: xchunked\r\n', chunked), 'unreadable'],
    ['a space before the colon', put('transfer-encoding : chunked\r\n', chunked), 'unreadable'],
    ['chunked then identity', put('transfer-encoding: chunked, identity\r\n', chunked), 'unreadable'],
    ['a bare line feed', `GET /health/live HTTP/1.1\nhost: a\n\n`, 'unreadable'],
    ['a folded header', get('x: a\r\n b\r\n'), 'unreadable'],
    ['NUL in a header', get('x: a\0b\r\n'), 'unreadable'],
    ['no HTTP at all', '\x16\x03\x01\x02\x00\x01\x00', 'unreadable'],
    ['gzip before chunked', put('transfer-encoding: gzip, chunked\r\n', chunked), 'not-implemented'],
    ['two Host fields', 'GET /health/live HTTP/1.1\r\nhost: a\r\nHost: b\r\n\r\n', 'unreadable'],
    ['no Host field', 'GET /health/live HTTP/1.1\r\n\r\n', 'unreadable'],
    ['another service as target', 'GET http://other/health/live HTTP/1.1\r\nhost: a\r\n\r\n', 'unreadable'],
    ['two Content-Type', put('content-type: text/plain\r\ncontent-length: 2\r\n'), 'unreadable'],
    [
      'Transfer-Encoding in HTTP/1.0',
      `POST /v1/air HTTP/1.0\r\n${json}transfer-encoding: chunked\r\n\r\n${chunked}`,
      'unreadable',
    ],
    ['HTTP/0.9', 'GET /health/live\r\n\r\n', 'unreadable'],
    ['20 KB of header', get(`x: ${'y'.repeat(20_000)}\r\n`), 'headers-too-large'],
    ['101 header fields', get('x: y\r\n'.repeat(101)), 'headers-too-large'],
    ['2 500 header fields', get('x: y\r\n'.repeat(2_500)), 'headers-too-large'],
    ['9 KB of target', `GET /${'a'.repeat(9_000)} HTTP/1.1\r\nhost: a\r\n\r\n`, 'too-long'],
    ['an unknown expectation', put('expect: zzz\r\ncontent-length: 2\r\n'), 'expectation-failed'],
    ['CONNECT', 'CONNECT other:443 HTTP/1.1\r\nhost: other:443\r\n\r\n', 'not-implemented'],
  ];

  it.each(refused)('%s: one problem, and the connection closes', async (_, bytes, code) => {
    const { text, closed } = await rawRequest(port, bytes);
    const answers = answersIn(text);
    expect(answers, text).toHaveLength(1);
    expectProblem(answers[0] as (typeof answers)[0], code);
    expect(closed).toBe(true);
  });

  it('nothing behind a refused request is served', async () => {
    const { text } = await rawRequest(
      port,
      put('content-length: 2\r\ntransfer-encoding: chunked\r\n', chunked) + get(''),
    );
    expect(answersIn(text)).toHaveLength(1);
  });
});

describe('lawful bytes', () => {
  it('TRACE is no method of any path', async () => {
    const { text } = await rawRequest(port, 'TRACE /v1/air HTTP/1.1\r\nhost: a\r\n\r\n');
    const [answer] = answersIn(text);
    expectProblem(answer as NonNullable<typeof answer>, 'method-not-allowed');
    expect(answer?.headers['allow']).toBe('POST');
  });

  it('a chunked body is read as any other', async () => {
    const [answer] = answersIn((await rawRequest(port, put('transfer-encoding: chunked\r\n', chunked))).text);
    expectProblem(answer as NonNullable<typeof answer>, 'missing');
  });

  it('a chunked body beyond the limit is 413, without a length to tell it', async () => {
    const chunk = `2000\r\n${' '.repeat(0x2000)}\r\n`;
    const { text } = await rawRequest(port, put('transfer-encoding: chunked\r\n', chunk.repeat(9)), 1000);
    const [answer] = answersIn(text);
    expectProblem(answer as NonNullable<typeof answer>, 'too-large');
  });

  it('100-continue is met', async () => {
    const { text } = await rawRequest(port, put('expect: 100-continue\r\ncontent-length: 2\r\n'));
    expect(text).toMatch(/^HTTP\/1\.1 100 Continue\r\n\r\nHTTP\/1\.1 422 /);
  });

  it('a thousand requests in one go are answered in their order', async () => {
    const many = Array.from({ length: 1000 }, (_, i) => get(`x-request-id: n${i}\r\n`)).join('');
    const answers = answersIn((await rawRequest(port, many, 1500)).text);
    expect(answers.map(({ headers }) => headers['x-request-id'])).toEqual(
      Array.from({ length: 1000 }, (_, i) => `n${i}`),
    );
  });

  it('says nothing of what serves it', async () => {
    const { headers, body, statusCode } = await request(`http://127.0.0.1:${port}/health/ready`);
    expect([statusCode, await body.json()]).toEqual([200, { status: 'ready' }]);
    expect(Object.keys(headers).sort()).toEqual([
      'cache-control',
      'connection',
      'content-length',
      'content-type',
      'date',
      'keep-alive',
      'x-content-type-options',
      'x-request-id',
    ]);
  });
});

describe('while the service closes', () => {
  it('a request in hand is answered and a new one is sent elsewhere', async () => {
    const own = await testHouse();
    let release = () => {};
    own.get('/slow', () => new Promise((resolve) => (release = () => resolve('done'))));
    await own.listen({ port: 0, host: '127.0.0.1' });
    const at = (own.server.address() as AddressInfo).port;
    const socket = connect(at, '127.0.0.1');
    let text = '';
    socket.on('data', (piece) => (text += piece));
    const ended = new Promise((resolve) => socket.on('close', resolve));
    socket.write('GET /slow HTTP/1.1\r\nhost: a\r\n\r\n');
    await pause(100);
    const closed = own.close();
    await pause(50);
    socket.write('GET /health/ready HTTP/1.1\r\nhost: a\r\n\r\n');
    await pause(50);
    release();
    await ended;
    const [inHand, late, ...more] = answersIn(text);
    expect(more).toEqual([]);
    expect(inHand).toMatchObject({ statusCode: 200, body: 'done' });
    expectProblem(late as NonNullable<typeof late>, 'busy');
    expect(late?.headers).toMatchObject({ connection: 'close', 'retry-after': '1' });
    await closed;
  });
});
