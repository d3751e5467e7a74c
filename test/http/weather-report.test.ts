import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exampleLanding } from '../../src/http/document/example-landing.ts';
import { exampleTakeoff } from '../../src/http/document/example-takeoff.ts';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const report = 'METAR ZZKV 111150Z 23009G21KT 9999 SCT030 18/09 Q1009 NOSIG';
const q = (value: number, unit: string) => ({ value, unit });
const memberByMember = {
  temperature: q(18, 'degC'),
  dewPoint: q(9, 'degC'),
  pressure: { qnh: q(1009, 'hPa') },
  wind: { from: q(230, 'deg'), fromReference: 'true', speed: q(9, 'kt'), gust: q(21, 'kt') },
};
const asked = (weather: object, more: object = {}, path = '/v1/takeoff') =>
  post(app, path, {
    ...(path.includes('takeoff') ? exampleTakeoff : exampleLanding),
    rounding: 'none',
    ...more,
    weather,
  });

async function answered(weather: object, more: object = {}, path?: string) {
  const reply = await asked(weather, more, path);
  expect(reply.statusCode, reply.body).toBe(200);
  return reply.json();
}
async function faults(weather: object) {
  const reply = await asked(weather);
  expect(reply.statusCode, reply.body).toBe(422);
  return expectProblem(reply, reply.json().code).errors;
}
const codes = (answer: { advisory: { cautions: { code: string }[] } }) =>
  answer.advisory.cautions.map(({ code }) => code);

describe('a question whose weather is a report', () => {
  it.each(['/v1/takeoff', '/v1/landing'])(
    'is answered as if its weather were given member by member: %s',
    async (path) => {
      const [byReport, stated] = [await answered({ report }, {}, path), await answered(memberByMember, {}, path)];
      for (const block of ['outcome', 'air', 'wind', 'speeds', 'assessment'] as const) {
        expect(byReport[block]).toEqual(stated[block]);
      }
      const { takeoffDistance, landingDistance } = byReport.distances;
      const whole = takeoffDistance ?? landingDistance;
      expect(whole.value).toBe((stated.distances.takeoffDistance ?? stated.distances.landingDistance).value);
    },
  );

  it('has the reading of the report in the question as understood, which can be sent again for the same answer', async () => {
    const first = await answered({ report }, { units: 'm-kt-kg' });
    expect(first.question.weather).toEqual({ report, ...memberByMember });
    const again = await post(app, '/v1/takeoff', first.question);
    expect(again.statusCode, again.body).toBe(200);
    expect(again.json()).toEqual(first);
    expect(codes(first)).not.toContain('report-replaced');
  });

  it('takes what stands beside the report, and says what it takes the place of', async () => {
    const answer = await answered({ report, temperature: q(24, 'degC'), wind: 'calm' });
    expect(answer.air.temperature.value).toBeCloseTo(24, 9);
    expect(answer.air.dewPoint).toBeUndefined();
    expect(answer.wind.headwind.value).toBe(0);
    const caution = answer.advisory.cautions.find(({ code }: { code: string }) => code === 'report-replaced');
    expect(caution.message).toBe(
      'The report of ZZKV is not taken as it stands: temperature 24 degC in place of 18 degC; another wind in place of 23009G21KT. That is 2 of its figures.',
    );
  });

  it('tells its age from the time of the question, and nothing of it without one', async () => {
    const old = await answered({ report }, { asOf: '2026-06-11T13:00:00Z' });
    expect(old.advisory.cautions.find(({ code }: { code: string }) => code === 'report-old')).toMatchObject({
      message: 'The report of ZZKV is 70 min older than the time of the question.',
      value: q(4200, 's'),
    });
    expect(codes(await answered({ report }, { asOf: '2026-06-11T12:50:00Z' }))).not.toContain('report-old');
    expect(codes(await answered({ report }))).not.toContain('report-old');
  });

  it('lists what it did not understand, and the state of runways that it did not take', async () => {
    const answer = await answered({
      report: report.replace('SCT030', 'SCT030 XYZ123').replace('Q1009', 'Q1009 R07/290150'),
    });
    expect(codes(answer)).toEqual(expect.arrayContaining(['report-not-understood', 'report-runway-state']));
  });

  it('puts what the report rounds of the wind into the bands', async () => {
    const [byReport, stated] = [await answered({ report }), await answered(memberByMember)];
    const names = (answer: { basis: { band: { of: string }[] } }) => answer.basis.band.map(({ of }) => of);
    expect(names(byReport).filter((name) => !names(stated).includes(name))).toEqual(['rounding of the reported wind']);
    expect(byReport.distances.takeoffDistance.high).toBeGreaterThan(stated.distances.takeoffDistance.high);
  });

  it('counts a direction that varies all round as a tailwind and as a crosswind of the mean', async () => {
    const answer = await answered({ report: report.replace('23009G21KT', 'VRB03KT') });
    expect(answer.wind.headwind.value).toBeCloseTo(-3, 9);
    expect(answer.wind.crosswind.value).toBeCloseTo(3, 9);
    expect(answer.question.weather.wind).toEqual({ from: 'variable', speed: q(3, 'kt') });
  });
});

describe('a report that cannot be taken', () => {
  it.each([
    ['x'.repeat(513), 'out-of-range', /has 513 characters/],
    [report.replace('ZZKV', 'ZZKV\u0007'), 'wrong-type', /control character/],
    [`${report} METAR ZZAA 111150Z 20005KT 9999 18/09 Q1009`, 'exactly-one-of', /./],
    [report.replace('23009G21KT', '37009KT'), 'out-of-range', /37009KT at character 19 has a direction of 370 degrees/],
    [report.replace('18/09', '18/19'), 'implausible', /18\/19 at character \d+ has a dew point above the temperature/],
    [report.replace('23009G21KT', '23009'), 'wrong-type', /23009 at character 19/],
  ])('%s: refused by %s, with the place', async (text, code, message) => {
    const found = await faults({ report: text });
    expect(found.map((fault) => fault.pointer)).toContain('/weather/report');
    expect(found.map((fault) => fault.code)).toContain(code);
    expect(found.map((fault) => fault.message).join(' ')).toMatch(message);
  });

  it('has no temperature or pressure: refused with what may be given instead, and answered with it', async () => {
    const without = report.replace(' 18/09 Q1009', '');
    const found = await faults({ report: without });
    expect(found.map(({ code, hint }) => [code, hint])).toEqual([
      ['missing', 'give the temperature beside the report'],
      ['missing', 'give the pressure beside the report'],
    ]);
    const { temperature, pressure } = memberByMember;
    expect((await answered({ report: without, temperature, pressure })).outcome).toBeDefined();
  });

  it('never becomes a calm: a wind not reported is refused', async () => {
    const [fault] = await faults({ report: report.replace('23009G21KT', '/////KT') });
    expect(fault).toMatchObject({ code: 'missing', hint: 'give the wind beside the report' });
  });
});

describe('a question without a wind', () => {
  const elevation = q(800, 'ft');
  const speeds = { aeroplane: { id: 'pellibrin-trainer' }, mass: q(700, 'kg'), configuration: 'takeoff-12' };
  it.each([
    ['/v1/air', {}],
    ['/v1/speeds', speeds],
  ])('takes the air of a report, whatever its wind: %s', async (path, more) => {
    const { wind: _, ...air } = memberByMember;
    const body = { ...more, elevation, units: 'm-kt-kg', rounding: 'none' };
    const [byReport, stated] = await Promise.all([
      post(app, path, { ...body, weather: { report: report.replace('23009G21KT', '/////KT') } }),
      post(app, path, { ...body, weather: air }),
    ]);
    expect(byReport.statusCode, byReport.body).toBe(200);
    const { question, ...answer } = byReport.json();
    const { question: __, ...same } = stated.json();
    expect(answer).toEqual(same);
    expect(question.weather).toEqual({ report: report.replace('23009G21KT', '/////KT'), ...air });
    const refused = await post(app, path, { ...body, weather: { report: report.replace('18/09', '18/19') } });
    expect(refused.statusCode).toBe(422);
  });
});
