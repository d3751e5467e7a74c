import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exampleDefinition } from '../../src/http/document/example-definition.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const url = '/v1/aeroplanes/proof';
const [table] = exampleDefinition.flightManual?.tables ?? [];
if (table === undefined) throw new Error('the example has no table');
const question = { aeroplane: { definition: exampleDefinition }, table: table.id };
const asked = (accept: string, body: object = question) => post(app, url, body, { accept });

describe('POST /v1/aeroplanes/proof', () => {
  it('answers each cell as printed and as read, and says that they are one', async () => {
    const answer = (await asked('application/json')).json();
    expect(answer.outcome).toBe('every-cell-agrees');
    const names: string[] = answer.columns.map(({ name }: { name: string }) => name);
    const column = (name: string) => answer.rows.map((row: unknown[]) => row[names.indexOf(name)]);
    for (const [i, { name }] of table.columns.entries()) {
      expect(column(name)).toEqual(table.rows.map((row) => row[i]));
    }
    for (const name of ['groundRoll', 'takeoffDistance']) {
      expect(column(`${name}Read`)).toEqual(column(name));
      expect(new Set(column(`${name}Agrees`))).toEqual(new Set(['yes']));
      column(`${name}Ratio`).forEach((ratio: number, i: number) => {
        expect(Math.abs(ratio - column(name)[i] / column(`${name}Physics`)[i])).toBeLessThan(0.006);
      });
    }
    expect(answer.counts).toEqual({ cells: 18, differ: [] });
  });

  it('writes the same as CSV: a header of names with units, CR LF, and what it is in every record', async () => {
    const response = await asked('text/csv');
    expect(response.headers['content-type']).toBe('text/csv; charset=utf-8; header=present');
    const lines = response.body.split('\r\n');
    expect(lines[0]).toMatch(
      /^row,pressureAltitude \[ft\],temperature \[degC\],groundRoll \[ft\],groundRollRead \[ft\],/,
    );
    expect(lines).toHaveLength(table.rows.length + 2);
    expect(lines.at(-1)).toBe('');
    for (const line of lines.slice(1, -1))
      expect(line).toMatch(/,"Advisory only; computed, not a page of the flight manual\."$/);
    expect(lines[1]).toMatch(/^0,0,0,800,800,yes,/);
  });

  it('writes a page to print and to sign, which runs and fetches nothing', async () => {
    const response = await asked('text/html,application/xhtml+xml,*/*;q=0.1');
    expect(response.headers['content-type']).toBe('text/html; charset=utf-8');
    expect(response.headers['content-security-policy']).toMatch(
      /^default-src 'none'; style-src 'sha256-[A-Za-z0-9+/=]+'/,
    );
    expect(response.body).toContain('Advisory only; computed, not a page of the flight manual.');
    for (const line of ['Name', 'Date', 'Signature', 'Document and revision in hand', 'Digest of the definition']) {
      expect(response.body).toContain(line);
    }
    expect(response.body).not.toMatch(/<script|src=|href=|url\(|\bon[a-z]+=/i);
    expect(response.body).not.toMatch(/\b(red|green|amber|legal|safe)\b/i);
    expect(response.body).toMatch(/size: A4/);
  });

  it('escapes every text of the definition on the page', async () => {
    const hostile = `"><img src=x onerror='a'>&`;
    const definition = {
      ...exampleDefinition,
      revision: hostile,
      flightManual: {
        document: hostile,
        revision: hostile,
        tables: [
          {
            ...table,
            page: hostile,
            conditions: { ...table.conditions, technique: hostile },
            notes: table.notes?.map((note) => ({ ...note, text: hostile })),
          },
        ],
      },
    };
    const response = await asked('text/html', { ...question, aeroplane: { definition }, reference: hostile });
    expect(response.statusCode).toBe(200);
    expect(response.body).not.toContain('<img');
    expect(response.body.split('&#34;&#62;&#60;img src=x onerror=&#39;a&#39;&#62;&#38;').length).toBeGreaterThanOrEqual(
      6,
    );
  });

  it('answers JSON where the caller does not care, and lists what there is where nothing fits', async () => {
    expect((await post(app, url, question)).headers['content-type']).toMatch(/^application\/json/);
    expect((await asked('*/*')).headers['content-type']).toMatch(/^application\/json/);
    expect((await asked('text/*')).headers['content-type']).toMatch(/^text\/csv/);
    expect((await asked('application/json;q=0.2, text/html;q=0.9')).headers['content-type']).toMatch(/^text\/html/);
    const { detail } = expectProblem(await asked('image/png, text/html;q=0'), 'not-acceptable');
    expect(detail).toBe('The answer is application/json, text/csv or text/html.');
    expectProblem(await post(app, '/v1/takeoff', {}, { accept: 'text/csv' }), 'not-acceptable');
  });

  it('answers a problem as a problem whatever was asked for', async () => {
    const { errors } = expectProblem(
      await asked('text/html', { ...question, table: 'takeoff-10-short-feild' }),
      'unknown-id',
    );
    expect(errors[0]).toMatchObject({ pointer: '/table', allowed: table.id, hint: `Perhaps ${table.id}.` });
    expectProblem(await asked('text/csv', { aeroplane: { id: 'sythelor-jet' }, table: 'x' }), 'unknown-id');
  });

  it('reads indicated speeds back as they are printed', async () => {
    const withSpeed = {
      ...table,
      airspeed: 'ias',
      columns: [...table.columns, { name: 'screen', unit: 'kt' }],
      rows: table.rows.map((row) => [...row, 54]),
    };
    const definition = {
      ...exampleDefinition,
      airspeedCalibration: {
        columns: [
          { name: 'indicated', unit: 'kt' },
          { name: 'calibrated', unit: 'kt' },
        ],
        rows: [
          [40, 46],
          [60, 62],
          [100, 100],
        ],
      },
      flightManual: { ...exampleDefinition.flightManual, tables: [withSpeed] },
    };
    const answer = (await asked('application/json', { ...question, aeroplane: { definition } })).json();
    expect(answer.outcome).toBe('every-cell-agrees');
    const names: string[] = answer.columns.map(({ name }: { name: string }) => name);
    expect(answer.rows[0][names.indexOf('screenRead')]).toBe(54);
  });
});
