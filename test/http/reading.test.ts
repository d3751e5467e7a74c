import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ProblemCode } from '../../src/contract/problem.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

const question = {
  elevation: { value: 1000, unit: 'ft' },
  weather: { temperature: { value: 15, unit: 'degC' }, pressure: { qnh: { value: 1013.25, unit: 'hPa' } } },
};
const text = JSON.stringify(question);
const url = '/v1/air';
let app: FastifyInstance;

beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

/** The question with the elevation's number written as given. */
function elevated(literal: string): string {
  return text.replace('1000', literal);
}

describe('a JSON body', () => {
  it('is answered where it is in order', async () => {
    const answered = await post(app, url, text);
    expect(answered.statusCode).toBe(200);
    expect(answered.headers).toMatchObject({
      'content-type': 'application/json; charset=utf-8',
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
    });
    expect(JSON.parse(answered.body)).toMatchObject({ outcome: 'computed' });
  });

  const refused: [string, string | Uint8Array, ProblemCode, string?][] = [
    ['1e400', elevated('1e400'), 'not-finite', '/elevation/value'],
    ['-1e400', elevated('-1e400'), 'not-finite', '/elevation/value'],
    ['1e308', elevated('1e308'), 'out-of-range', '/elevation/value'],
    ['NaN', elevated('NaN'), 'unreadable', '/elevation/value'],
    ['Infinity', elevated('Infinity'), 'unreadable', '/elevation/value'],
    ['a trailing comma', `${text.slice(0, -1)},}`, 'unreadable'],
    ['a comment', `${text}// note`, 'unreadable', ''],
    ['digits in quotation marks', elevated('"1000"'), 'wrong-type', '/elevation/value'],
    ['true for a number', elevated('true'), 'wrong-type', '/elevation/value'],
    ['null for a number', elevated('null'), 'wrong-type', '/elevation/value'],
    ['a list for a number', elevated('[]'), 'wrong-type', '/elevation/value'],
    ['a member twice', `{"elevation":1,${text.slice(1)}`, 'duplicate-member', '/elevation'],
    ['a member and its escape', text.replace('"unit"', '"unit":"m","\\u0075nit"'), 'duplicate-member'],
    ['__proto__', `{"__proto__":{},${text.slice(1)}`, 'unreadable', '/__proto__'],
    ['__proto__ escaped', `{"\\u005f_proto__":{},${text.slice(1)}`, 'unreadable', '/__proto__'],
    ['constructor.prototype', `{"constructor":{"prototype":{}},${text.slice(1)}`, 'unreadable', '/constructor'],
    ['an unknown member', `{"elevaton":1,${text.slice(1)}`, 'unknown-member', '/elevaton'],
    ['5 000 levels', '['.repeat(5_000) + ']'.repeat(5_000), 'too-deep'],
    ['13 levels', '['.repeat(13) + ']'.repeat(13), 'too-deep'],
    ['30 000 values', `[${Array(30_000).fill(0).join(',')}]`, 'too-many-tokens'],
    ['more than 64 KiB', `"${'x'.repeat(64 * 1024)}"`, 'too-large'],
    ['half a megabyte of brackets', '['.repeat(500_000), 'too-large'],
    ['invalid UTF-8', Uint8Array.from([0x7b, 0xff, 0x7d]), 'unreadable'],
    ['an overlong form', Uint8Array.from([0x22, 0xc0, 0xaf, 0x22]), 'unreadable'],
    ['a byte order mark', `\ufeff${text}`, 'unreadable'],
    ['half a surrogate pair', `{"reference":"\\ud800",${text.slice(1)}`, 'wrong-type', '/reference'],
    ['NUL in text', `{"reference":"a\\u0000b",${text.slice(1)}`, 'wrong-type', '/reference'],
    ['a line break in text', `{"reference":"a\\r\\nb",${text.slice(1)}`, 'wrong-type', '/reference'],
    ['nothing', '', 'unreadable'],
    ['a list', '[]', 'wrong-type', ''],
    ['null', 'null', 'wrong-type', ''],
  ];

  it.each(refused)('is refused with %s', async (_, body, code, pointer) => {
    const { errors } = expectProblem(await post(app, url, body), code);
    if (pointer !== undefined) expect(errors).toMatchObject([{ code, pointer }]);
  });

  it('reads -0 as 0, and one number however it is written', async () => {
    const zero = (await post(app, url, elevated('0'))).body;
    expect((await post(app, url, elevated('-0'))).body).toBe(zero);
    expect((await post(app, url, elevated('-0.0e5'))).body).toBe(zero);
    const thousand = (await post(app, url, text)).body;
    expect((await post(app, url, elevated('1000.0'))).body).toBe(thousand);
    expect((await post(app, url, elevated('1e3'))).body).toBe(thousand);
    expect((await post(app, url, JSON.stringify(question, undefined, 2))).body).toBe(thousand);
  });

  it('is told unprintable text and faults of meaning at once', async () => {
    const body = `{"reference":"\\u0007","colour":1,${elevated('"7"').slice(1)}`;
    const { errors } = expectProblem(await post(app, url, body), 'wrong-type');
    expect(errors.map(({ pointer }) => pointer)).toEqual(['/reference', '/colour', '/elevation/value']);
  });

  it('gets the same bytes for the same fault', async () => {
    const [first, second] = [await post(app, url, '{"a":1}'), await post(app, url, '{"a":1}')];
    expect(first.body).toBe(second.body);
    expect(first.headers['x-request-id']).not.toBe(second.headers['x-request-id']);
  });
});

describe('the media type of a body', () => {
  it.each([
    'application/json',
    'application/json; charset=utf-8',
    'application/json;charset="UTF-8"',
    'Application/JSON ; charset = utf-8',
  ])('may be %s', async (type) => {
    expect((await post(app, url, text, { 'content-type': type })).statusCode).toBe(200);
  });

  it.each([
    'text/plain',
    'application/xml',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
    'application/json; charset=utf-16',
    'application/json; charset=utf-8; charset=latin1',
    'application/jsonp',
    'application/merge-patch+json',
    'nonsense',
    '',
  ])('may not be %j', async (type) => {
    const answered = await post(app, url, text, { 'content-type': type });
    expectProblem(answered, 'unsupported-media');
    expect(answered.headers['accept-post']).toBe('application/json');
  });

  it('must be told', async () => {
    expectProblem(await app.inject({ method: 'POST', url }), 'unsupported-media');
    expectProblem(await app.inject({ method: 'POST', url, payload: Buffer.from(text) }), 'unsupported-media');
  });

  it.each(['gzip', 'br', 'deflate', 'zstd', 'x'])('may not come in the coding %s', async (coding) => {
    expectProblem(await post(app, url, text, { 'content-encoding': coding }), 'unsupported-media');
  });
});
