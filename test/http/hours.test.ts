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

const q = (value: number, unit: string) => ({ value, unit });
const forecast =
  'TAF ZZKV 111100Z 1112/1206 24012KT 9999 SCT030 TX24/1115Z TN12/1204Z BECMG 1116/1118 05008KT PROB30 TEMPO 1120/1122 20015G28KT';
const span = { from: '2026-06-11T15:00:00Z', to: '2026-06-11T22:00:00Z' };
const ask = (hours: unknown, body: object = exampleTakeoff, path = '/v1/takeoff') =>
  post(app, path, { ...body, rounding: 'none', hours });

async function hoursOf(hours: unknown, body?: object, path?: string) {
  const reply = await ask(hours, body, path);
  expect(reply.statusCode, reply.body).toBe(200);
  return reply.json().hours;
}
async function faults(hours: unknown) {
  const reply = await ask(hours);
  expect(reply.statusCode, reply.body).toBe(422);
  return expectProblem(reply, reply.json().code).errors;
}

/** The same question with the wind and temperature of an hour for its weather. */
async function alone(wind: unknown, temperature: number) {
  const weather = { ...exampleTakeoff.weather, temperature: q(temperature, 'degC'), wind };
  const { dewPoint: _, ...rest } = weather as typeof weather & { dewPoint?: unknown };
  const reply = await post(app, '/v1/takeoff', { ...exampleTakeoff, rounding: 'none', weather: rest });
  return reply.json();
}
const from = (degrees: number, knots: number) => ({
  from: q(degrees, 'deg'),
  fromReference: 'true',
  speed: q(knots, 'kt'),
});

describe('a question for the hours of a forecast', () => {
  it('is answered for each hour as the same question with the weather of that hour', async () => {
    const [first] = await hoursOf({ forecast, ...span });
    const stated = await alone(from(240, 12), 24);
    expect(first).toMatchObject({
      at: '2026-06-11T15:00:00Z',
      because: 'base',
      considered: 1,
      outcome: stated.outcome,
    });
    expect(first.wholeDistance.value).toBeCloseTo(stated.distances.takeoffDistance.value, 6);
    expect(first.sentence).toBe(stated.advisory.sentence);
  });

  it('takes the least favourable of all that can hold in an hour, found by asking each, and says which', async () => {
    const hours = await hoursOf({ forecast, ...span });
    const at = (hour: number) => hours.find((one: { at: string }) => one.at.includes(`T${hour}:`));
    // within the time of BECMG both winds can hold; 240 degrees is the tailwind of runway 07
    expect(exampleTakeoff.runway).toMatchObject({ designator: '07' });
    expect(at(16)).toMatchObject({ considered: 2, because: 'base' });
    const both = await Promise.all([
      alone(from(240, 12), at(16).temperature.value),
      alone(from(50, 8), at(16).temperature.value),
    ]);
    const longest = Math.max(...both.map((one) => one.distances.takeoffDistance.value));
    expect(at(16).wholeDistance.value).toBeCloseTo(longest, 4);
    expect(at(19)).toMatchObject({ considered: 1, because: 'becoming' });
    expect(at(20)).toMatchObject({ considered: 2, because: 'temporary', change: 'PROB30 TEMPO 1120/1122' });
    expect(at(15)).toMatchObject({ considered: 1, because: 'base' });
  });

  it('has its temperature between the extremes of the forecast, or from the list beside it', async () => {
    const hours = await hoursOf({ forecast, ...span });
    for (const { temperature, temperatureBecause } of hours) {
      expect(temperature.value).toBeGreaterThan(12);
      expect(temperature.value).toBeLessThanOrEqual(24);
      expect(temperatureBecause).toBe('between-extremes');
    }
    const [listed] = await hoursOf({
      forecast,
      ...span,
      temperatures: [{ at: span.from, temperature: q(21, 'degC') }],
    });
    expect(listed).toMatchObject({ temperatureBecause: 'given' });
    expect(listed.temperature.value).toBeCloseTo(21, 9);
  });

  it('has no answer for an hour of which something is not known, and says what', async () => {
    const [hour] = await hoursOf({ forecast, from: '2026-06-11T12:00:00Z', to: '2026-06-11T12:00:00Z' });
    expect(hour).toEqual({
      at: '2026-06-11T12:00:00Z',
      sentence: 'No answer for this hour: temperature not known.',
      considered: 1,
      missing: ['temperature'],
    });
    const [beyond] = await hoursOf({ forecast, from: '2026-06-12T09:00:00Z', to: '2026-06-12T09:00:00Z' });
    expect(beyond.missing).toEqual(['wind', 'temperature']);
  });

  it('is answered for a landing too, and for a list of hours in the place of a forecast', async () => {
    const { temperature, pressure } = exampleLanding.weather;
    const list = [{ at: '2026-06-11T12:00:00+02:00', temperature, pressure, wind: 'calm' }];
    const [hour] = await hoursOf(list, exampleLanding, '/v1/landing');
    expect(hour).toMatchObject({ at: '2026-06-11T10:00:00Z', because: 'given', considered: 1 });
    expect(hour.wind.headwind.value).toBe(0);
    expect(hour.wholeDistance.value).toBeGreaterThan(0);
  });

  it('leaves the answer to the question itself as it is', async () => {
    const [withHours, without] = await Promise.all([
      ask({ forecast, ...span }),
      post(app, '/v1/takeoff', { ...exampleTakeoff, rounding: 'none' }),
    ]);
    const { hours: _, question: __, ...rest } = withHours.json();
    const { question: ___, ...plain } = without.json();
    expect(rest).toEqual(plain);
  });
});

describe('hours that cannot be', () => {
  it('are too many, or the last before the first: refused', async () => {
    expect(await faults({ forecast, from: span.to, to: span.from })).toMatchObject([
      { pointer: '/hours/to', code: 'contradiction' },
    ]);
    expect(await faults({ forecast, from: span.from, to: '2026-06-20T00:00:00Z' })).toMatchObject([
      { pointer: '/hours/to' },
    ]);
  });
  it('have a forecast that cannot be read, or an observation in its place: refused with the place', async () => {
    expect(await faults({ forecast: forecast.replace('24012KT', '24012'), ...span })).toMatchObject([
      { pointer: '/hours/forecast', code: 'wrong-type' },
    ]);
    const [fault] = await faults({ forecast: 'METAR ZZKV 111150Z 23009KT 9999 18/09 Q1009', ...span });
    expect(fault).toMatchObject({ pointer: '/hours/forecast', hint: 'give an observation as report' });
  });
  it('have weather of their own that contradicts itself: refused where it stands', async () => {
    const { temperature, pressure } = exampleTakeoff.weather;
    const hour = { at: span.from, temperature, dewPoint: q(55, 'degC'), pressure, wind: 'calm' };
    expect(await faults([hour])).toMatchObject([{ pointer: '/hours/0/dewPoint', code: 'contradiction' }]);
  });
});
