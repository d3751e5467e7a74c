import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const q = (value: number, unit: string) => ({ value, unit });
async function decoded(report: string, more: object = {}) {
  const reply = await post(app, '/v1/weather/decode', { report, ...more });
  expect(reply.statusCode, reply.body).toBe(200);
  return reply.json();
}

describe('POST /v1/weather/decode', () => {
  it('reads a METAR with what each figure rounds [WMO FM 15: halves of a degree up, whole hectopascals down, read]', async () => {
    const report = 'METAR ZZKV 111150Z 23009G21KT 200V270 9999 -RA SCT030 M00/M03 Q1009 NOSIG';
    const { outcome, observation, advisory } = await decoded(report, {
      asOf: '2026-06-11T12:10:00Z',
      rounding: 'none',
    });
    expect(outcome).toBe('read');
    expect(advisory.sentence).toBe('METAR of ZZKV: 11 groups, all of them understood.');
    expect(observation).toMatchObject({
      kind: 'METAR',
      station: 'ZZKV',
      time: { day: 11, hour: 11, minute: 50 },
      age: 20,
      wind: {
        from: q(230, 'deg'),
        fromReference: 'true',
        speed: q(9, 'kt'),
        gust: q(21, 'kt'),
        variable: { from: q(200, 'deg'), to: q(270, 'deg') },
      },
      notUnderstood: [],
    });
    expect(observation.temperature.low.value).toBeCloseTo(-0.5, 9);
    expect(observation.temperature.high.value).toBeCloseTo(0, 9);
    expect(observation.qnh.written.value).toBeCloseTo(1009, 9);
    expect(observation.qnh.high.value).toBeCloseTo(1010, 9);
    expect(observation.groups.map(({ text }: { text: string }) => text).join(' ')).toBe(report);
  });

  it('reads a TAF with its changes and extremes', async () => {
    const { forecast } = await decoded(
      'TAF ZZKV 111100Z 1112/1206 24012KT CAVOK TX24/1115Z PROB30 TEMPO 1120/1122 20015G28KT',
    );
    expect(forecast).toMatchObject({
      from: { day: 11, hour: 12, minute: 0 },
      until: { day: 12, hour: 6, minute: 0 },
      wind: { speed: q(12, 'kt') },
      changes: [{ heading: 'PROB30 TEMPO 1120/1122', kind: 'temporary', percent: 30, wind: { gust: q(28, 'kt') } }],
      extremes: [{ kind: 'highest', temperature: q(24, 'degC'), at: { day: 11, hour: 15, minute: 0 } }],
    });
  });

  it('lists what it did not understand with its place, and makes no wind of a wind that is not reported', async () => {
    const { observation } = await decoded('METAR ZZKV 111150Z /////KT 9999 ABC12 18/09 Q1009');
    expect(observation.notUnderstood).toEqual([{ at: 32, text: 'ABC12', readAs: 'not-understood' }]);
    expect(observation.wind).toBeUndefined();
  });

  it('refuses what is no report, with the place', async () => {
    const reply = await post(app, '/v1/weather/decode', { report: 'METAR ZZKV 111150Z 23009 18/09' });
    expect(reply.statusCode).toBe(422);
    const { errors } = expectProblem(reply, reply.json().code);
    expect(errors[0]).toMatchObject({ pointer: '/report', code: 'wrong-type', received: '23009' });
  });
});
