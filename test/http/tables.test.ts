import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeTableCsv } from '../../src/contract/flight-manual/write-table-csv.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';
import { handbookTakeoff } from '../support/printed-manuals.ts';

const url = '/v1/aeroplanes/tables';
const { columns, rows, ...members } = handbookTakeoff();
const csv = writeTableCsv({ columns, rows });

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

describe(`POST ${url}`, () => {
  it('takes a text of many lines, with CR LF and with LF', async () => {
    for (const text of [csv, csv.replaceAll('\r\n', '\n')]) {
      const answered = await post(app, url, { ...members, csv: text });
      expect(answered.statusCode).toBe(200);
      expect(answered.json().table).toEqual(handbookTakeoff());
    }
  });

  it('takes lines in no other text', async () => {
    const answered = await post(app, url, { ...members, page: 'Fig.\n10-20', csv });
    expectProblem(answered, 'wrong-type');
    expect(answered.json().errors).toMatchObject([{ pointer: '/page' }]);
  });

  it('refuses a control character in the text with its line and column', async () => {
    const answered = await post(app, url, { ...members, csv: csv.replace('1460', '14\u000060') });
    expectProblem(answered, 'unreadable');
    expect(answered.json().errors).toMatchObject([
      { pointer: '/csv', message: expect.stringMatching(/^Line 2, column 4/) },
    ]);
  });

  it('stands beside the aeroplane of an id', async () => {
    expectProblem(await app.inject({ method: 'GET', url }), 'not-found');
    expectProblem(await app.inject({ method: 'PUT', url }), 'method-not-allowed');
    expectProblem(await app.inject({ method: 'POST', url: '/v1/aeroplanes/pellibrin-trainer' }), 'method-not-allowed');
  });
});
