import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FitResponse } from '../../src/contract/fit/fit-response.ts';
import { exampleTakeoff } from '../../src/http/document/example-takeoff.ts';
import { exampleFit } from '../../src/http/routes/aeroplane-fit.ts';
import { madeTables } from '../published/made-tables.ts';
import { builtInFolder } from '../support/catalogue-folder.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

const at = '/v1/aeroplanes/fit';
const trainer = JSON.parse(readFileSync(join(builtInFolder, 'pellibrin-trainer.json'), 'utf8'));
const [table] = exampleFit.tables ?? [];
if (table === undefined) throw new Error('the example has no table');
const { source: _, ...sheet } = table;
const q = <U extends string>(value: number, unit: U) => ({ value, unit });

describe('POST /v1/aeroplanes/fit', () => {
  let app: FastifyInstance;
  beforeAll(async () => {
    app = await testHouse();
  });
  afterAll(() => app.close());
  const answerTo = async (body: object): Promise<FitResponse> => {
    const answered = await post(app, at, body);
    expect(answered.statusCode, answered.body).toBe(200);
    return answered.json();
  };

  // the rows of the example were made by an ODE library with these, 0.8 % of scatter and rounding to 5 m
  it('recovers what the table of its example was made with, and accepts', async () => {
    const answer = await answerTo(exampleFit);
    expect(answer).toMatchObject({ outcome: 'accepted', findings: [] });
    [0.95, 0.004, 0.18, 0.92].forEach((truth, j) => {
      const found = answer.parameters?.[j];
      expect(Math.abs((found?.value as number) - truth)).toBeLessThan(3 * (found?.standardDeviation as number));
    });
    expect(answer.residuals).toHaveLength(24);
    expect(answer.residuals?.[5]).toMatchObject({
      at: '/tables/0/rows/2/3',
      row: 2,
      of: 'takeoffDistance',
      given: q(600, 'm'),
    });
    expect(answer.leaveOneAltitudeOut).toHaveLength(4);
    expect(answer.suggestedMeasurements?.measurements).toHaveLength(5);
  });

  it('gives a member with which the definition answers by fitted physics, near the table', async () => {
    const answer = await answerTo(exampleFit);
    const definition = { ...trainer, fit: answer.fit };
    const row = table.rows[4] as number[];
    const takeoff = (
      await post(app, '/v1/takeoff', {
        ...exampleTakeoff,
        aeroplane: { definition },
        mass: q(730, 'kg'),
        method: 'fitted',
        ruleSet: 'unfactored',
        runway: {
          ...exampleTakeoff.runway,
          slope: q(0, 'percent'),
          surface: { kind: 'paved', state: 'dry' },
          elevation: q(row[0] as number, 'ft'),
        },
        weather: {
          temperature: q(row[1] as number, 'degC'),
          pressure: { pressureAltitude: q(row[0] as number, 'ft') },
          wind: { headwind: q(0, 'kt') },
        },
      })
    ).json();
    expect(takeoff.basis?.method, JSON.stringify(takeoff).slice(0, 400)).toBe('fitted');
    const residual = answer.residuals?.[9];
    expect(Math.abs(takeoff.distances.takeoffDistance.value - (residual?.computed.value ?? 0))).toBeLessThanOrEqual(1);
  });

  it('fits to the tables of the flight manual where the question brings none', async () => {
    const manual = {
      document: 'Invented manual',
      revision: '1',
      tables: [{ id: 'tk-1', for: 'takeoff', configurations: ['takeoff-12'], page: '5-3', ...sheet }],
    };
    const { tables: _tables, ...question } = exampleFit;
    const answer = await answerTo({ ...question, aeroplane: { definition: { ...trainer, flightManual: manual } } });
    const ours = await answerTo(exampleFit);
    expect(answer.outcome).toBe('accepted');
    expect(answer.parameters).toEqual(ours.parameters);
    expect(answer.residuals?.[0]?.at).toBe('/aeroplane/definition/flightManual/tables/0/rows/0/2');
    expect(expectProblem(await post(app, at, question), 'missing').errors).toMatchObject([
      { pointer: '/tables', code: 'missing' },
    ]);
  });

  for (const { id, aeroplane: a, rows, stallSpeed, mustReport } of madeTables.tables.filter(({ id }) =>
    id.startsWith('FAULT'),
  )) {
    it(`names the fault of ${id}: ${mustReport} [${madeTables.source}]`, async () => {
      const span = Math.sqrt(a.aspectRatio * a.area);
      if (a.power?.kind !== 'fixed-pitch') throw new Error('another power');
      const definition = {
        id: 'made',
        revision: '1',
        name: 'Made table',
        category: 'single-piston',
        engines: 1,
        certification: { basis: 'none', screenHeight: q(15.24, 'm') },
        masses: { maximumTakeoff: q(a.mass, 'kg') },
        wing: { area: q(a.area, 'm2'), span: q(span, 'm'), heightAboveGround: q(a.heightOverSpan * span, 'm') },
        drag: { zeroLiftCoefficient: a.groundDrag, oswaldFactor: a.oswaldFactor },
        configurations: {
          takeoff: {
            for: ['takeoff'],
            flap: q(10, 'deg'),
            maximumLift: {
              stallSpeed: q(stallSpeed as number, 'kt'),
              type: 'cas',
              kind: 'one-g',
              mass: q(a.mass, 'kg'),
            },
            groundLiftCoefficient: a.groundLift,
            speeds: { liftOff: { stallRatio: a.speedRatios[0] }, screen: { stallRatio: a.speedRatios[1] } },
          },
        },
        propulsion: {
          kind: 'fixed-pitch',
          staticThrust: q(a.power.staticThrust, 'N'),
          propellerDiameter: q(a.power.diameter, 'm'),
          polarSlopeCoefficient: a.power.slope,
        },
      };
      const names = ['mass', 'pressureAltitude', 'temperature', 'groundRoll', 'takeoffDistance'];
      const units = ['kg', 'ft', 'degC', 'm', 'm'];
      const { findings, outcome } = await answerTo({
        aeroplane: { definition },
        for: 'takeoff',
        configuration: 'takeoff',
        tables: [
          {
            conditions: { surface: { kind: 'paved', state: 'dry' } },
            columns: names.map((name, i) => ({ name, unit: units[i] })),
            rows,
          },
        ],
      });
      const named = findings.map(({ code, column, row }) => {
        const of = column === 'takeoffDistance' ? 'total' : column;
        return code === 'columns-swapped' || of === undefined
          ? code
          : row === undefined
            ? `${code}:${of}`
            : `${code}:${of}@${row}`;
      });
      expect(named).toEqual(mustReport);
      expect(outcome).not.toBe('accepted');
      for (const { message, at } of findings) {
        expect(message).toMatch(/^[A-Z].*\.$/);
        expect(at).toMatch(/^\/(tables|aeroplane)/);
      }
    });
  }

  it('reads measured runs and stall speeds', async () => {
    const run = (pressureAltitude: number, celsius: number, groundRoll: number, takeoffDistance: number) => ({
      mass: q(730, 'kg'),
      pressureAltitude: q(pressureAltitude, 'ft'),
      temperature: q(celsius, 'degC'),
      headwind: q(0, 'kt'),
      slope: q(0, 'percent'),
      surface: { kind: 'paved', state: 'dry' },
      uncertaintyPercent: 3,
      groundRoll: q(groundRoll, 'm'),
      takeoffDistance: q(takeoffDistance, 'm'),
    });
    const { tables: _tables, ...question } = exampleFit;
    const runs = [run(0, 15, 265, 525), run(2000, 15, 320, 665), run(4000, 30, 440, 975)];
    const answer = await answerTo({ ...question, runs });
    expect(answer.outcome).toBe('accepted');
    expect(answer.residuals?.[3]?.at).toBe('/runs/1/takeoffDistance');
    // 1.54 at 730 kg and 12.9 m2 is 24.25 m/s
    const stalls = [
      { cas: q(24.25, 'm/s'), mass: q(730, 'kg'), uncertaintyPercent: 1 },
      { cas: q(24.25, 'm/s'), mass: q(730, 'kg'), uncertaintyPercent: 1 },
    ];
    const withStalls = await answerTo({ ...question, runs, stalls });
    expect(withStalls.maximumLift?.coefficient).toBeCloseTo(1.54, 2);
    expect(withStalls.maximumLift?.deviationPercent).toBeCloseTo(Math.SQRT2, 2);
  });

  it('refuses what cannot be read, all of it at once', async () => {
    const { errors } = expectProblem(
      await post(app, at, {
        ...exampleFit,
        configuration: 'landing-24',
        free: ['approachAngle'],
        tables: [{ ...table, conditions: { surface: table.conditions.surface }, rows: [...table.rows, [0, 0, 230]] }],
      }),
      'contradiction',
    );
    expect(errors.map(({ pointer, code }: { pointer: string; code: string }) => `${code} ${pointer}`)).toEqual([
      'contradiction /tables/0/rows/12',
      'missing /tables/0/conditions/mass',
      'contradiction /free/0',
      'contradiction /configuration',
    ]);
  });

  it('gives the same bytes for the same question', async () => {
    const [one, other] = [await post(app, at, exampleFit), await post(app, at, exampleFit)];
    expect(one.body).toBe(other.body);
    const again = await post(app, at, one.json().question);
    expect(again.json().parameters).toEqual(one.json().parameters);
  });

  it('holds the fit of a definition against it', async () => {
    const { fit: member } = await answerTo(exampleFit);
    const { wind: _wind, ...still } = exampleTakeoff.weather;
    const takeoff = member?.takeoff?.['takeoff-12'];
    const fits = { takeoff: { 'landing-24': takeoff, other: { ...takeoff, correlation: [[1]] } } };
    const { errors } = expectProblem(
      await post(app, '/v1/speeds', {
        aeroplane: { definition: { ...trainer, fit: fits } },
        mass: q(700, 'kg'),
        configuration: 'takeoff-12',
        weather: still,
      }),
      'contradiction',
    );
    expect(errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual(
      expect.arrayContaining([
        '/aeroplane/definition/fit/takeoff/landing-24',
        '/aeroplane/definition/fit/takeoff/other',
        '/aeroplane/definition/fit/takeoff/other/correlation',
      ]),
    );
  });
});
