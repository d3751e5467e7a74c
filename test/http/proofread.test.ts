import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { exampleDefinition } from '../../src/http/document/example-definition.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const url = '/v1/aeroplanes/proofread';
interface Found {
  readonly kind: string;
  readonly code: string;
  readonly severity: string;
  readonly message: string;
  readonly at: string;
}
const proofread = async (definition: unknown, more: object = {}) => {
  const response = await post(app, url, { definition, ...more });
  expect(response.statusCode).toBe(200);
  return response.json() as {
    outcome: string;
    advisory: { sentence: string; notice: string };
    findings: Found[];
    methods: {
      configuration: string;
      phase: string;
      methods: { method: string; possible: boolean; assumed: string[] }[];
    }[];
    notReviewed: string[];
    basis: { digests: { aeroplane?: string }; modelVersion: string };
  };
};
const codes = ({ findings }: { findings: Found[] }) => findings.map(({ kind, code }) => `${kind} ${code}`);

describe('POST /v1/aeroplanes/proofread', () => {
  it('answers for every aeroplane on file without a fault and without a strong finding, by the digest of the list', async () => {
    for (const { definition, digest } of readCatalogue({ builtIn: true }).list()) {
      const answer = await proofread(definition);
      expect([answer.outcome, answer.basis.digests.aeroplane]).toEqual(['proofread', digest]);
      expect(answer.findings.filter(({ severity }) => severity === 'strong')).toEqual([]);
    }
  });

  it('answers the same question with the same bytes', async () => {
    const body = { definition: exampleDefinition };
    expect((await post(app, url, body)).body).toBe((await post(app, url, body)).body);
  });

  it('says which methods each configuration has what it needs for', async () => {
    const { methods } = await proofread(exampleDefinition);
    const possible = methods.map(({ configuration, phase, methods: each }) => [
      configuration,
      phase,
      each.filter((one) => one.possible).map(({ method }) => method),
    ]);
    expect(possible).toEqual([
      ['takeoff-10', 'takeoff', ['flight-manual', 'stated']],
      ['landing-30', 'landing', ['stated']],
    ]);
    const stated = methods[0]?.methods.find(({ method }) => method === 'stated');
    expect(stated?.assumed).toContain('/configurations/takeoff-10/pullUpLoadFactor');
  });

  it('gives faults of form, of sense and oddities at once, and goes on without what is at fault', async () => {
    const definition = structuredClone(exampleDefinition) as unknown as Record<string, Record<string, unknown>>;
    (definition['masses'] as Record<string, unknown>)['maximumLanding'] = { value: 1200, unit: 'kg' };
    (definition['wing'] as Record<string, unknown>)['sweep'] = { value: 0, unit: 'grad' };
    definition['drag'] = { zeroLiftCoefficient: 0.08, oswaldFactor: 0.72 };
    const answer = await proofread(definition);
    expect(answer.outcome).toBe('proofread-in-part');
    expect(answer.notReviewed).toContain('/wing/sweep');
    expect(codes(answer)).toEqual(
      expect.arrayContaining(['fault unknown-unit', 'fault contradiction', 'oddity drag-unusual']),
    );
    expect(answer.findings.filter(({ kind }) => kind === 'fault').map(({ at }) => at)).toEqual([
      '/wing/sweep/unit',
      '/masses/maximumLanding',
    ]);
    expect(answer.basis.digests).toEqual({});
  });

  it('answers an object that is nothing like a definition with its faults', async () => {
    const answer = await proofread({ question: 'what is this?', wing: [] });
    expect(answer.outcome).toBe('not-readable');
    expect(answer.methods).toEqual([]);
    expect(answer.findings.every(({ kind }) => kind === 'fault')).toBe(true);
  });

  it('refuses a definition that is no object', async () => {
    for (const definition of [null, 7, 'aeroplane', [exampleDefinition]]) {
      expectProblem(await post(app, url, { definition }), 'wrong-type');
    }
  });

  it('takes a body far above that of a question, and refuses one above two mebibytes', async () => {
    const rows = Array.from({ length: 1000 }, (_, i) => [i * 20, 900 - i / 2]);
    const columns = [
      { name: 'pressureAltitude', unit: 'ft' },
      { name: 'climbRate', unit: 'ft/min' },
    ];
    const [table] = exampleDefinition.flightManual?.tables ?? [];
    const sheet = { ...table, notes: [], for: 'climb', columns, rows };
    const tables = Array.from({ length: 24 }, (_, i) => ({ ...sheet, id: `climb-${i}` }));
    const large = { ...exampleDefinition, flightManual: { document: 'Large', revision: '1', tables } };
    expect(JSON.stringify(large).length).toBeGreaterThan(250_000);
    const { findings } = await proofread(large);
    expect(findings.length).toBeGreaterThan(0);
    expectProblem(await post(app, url, `{"definition":{"name":"${'x'.repeat(2 * 1024 * 1024)}"}}`), 'too-large');
    expectProblem(await post(app, '/v1/takeoff', { definition: large }), 'too-large');
  }, 30_000);

  it('refuses half a megabyte of brackets, and more values than any definition has', async () => {
    expectProblem(await post(app, url, '['.repeat(500_000)), 'too-deep');
    expectProblem(await post(app, url, `{"definition":{"rows":[${'1,'.repeat(400_001)}1]}}`), 'too-many-tokens');
  });

  it('serves others while it works', async () => {
    const rows = Array.from({ length: 60 }, (_, i) => [i * 10, (i % 7) * 5, 800 + i, 1500 + 2 * i]);
    const [table] = exampleDefinition.flightManual?.tables ?? [];
    const tables = Array.from({ length: 6 }, (_, i) => ({ ...table, id: `table-${i}`, rows }));
    const long = post(app, url, {
      definition: { ...exampleDefinition, flightManual: { document: 'Long', revision: '1', tables } },
    });
    let done = false;
    void long.then(() => {
      done = true;
    });
    await new Promise((resolve) => setImmediate(resolve));
    expect((await app.inject('/health/live')).statusCode).toBe(200);
    expect(done).toBe(false);
    expect((await long).statusCode).toBe(200);
  }, 30_000);

  it('shows hostile texts as text and nowhere as anything else', async () => {
    const name = '<script>alert(1)</script>';
    const response = await post(app, url, { definition: { ...exampleDefinition, id: name, [name]: name } });
    expect(response.headers['content-type']).toMatch(/^application\/json/);
    expect(response.statusCode).toBe(200);
  });
});
