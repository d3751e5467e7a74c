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

const questions = [
  ['/v1/takeoff', exampleTakeoff, '/distances/takeoffDistance'],
  ['/v1/landing', exampleLanding, '/distances/landingDistance'],
] as const;

describe.each(questions)('select in %s', (url, example, distance) => {
  const asked = async (more: object) => post(app, url, { ...example, ...more });

  it('holds the answer to the members named, and outcome and advisory, each as it is in the whole answer', async () => {
    const whole = (await asked({})).json();
    const part = (await asked({ select: ['/assessment/checks', distance, '/wind/headwind'] })).json();
    expect(part).toEqual({
      outcome: whole.outcome,
      advisory: whole.advisory,
      wind: { headwind: whole.wind.headwind },
      distances: { [distance.slice('/distances/'.length)]: whole.distances[distance.slice('/distances/'.length)] },
      assessment: { checks: whole.assessment.checks },
    });
    expect(Object.keys(part)).toEqual(['outcome', 'advisory', 'wind', 'distances', 'assessment']);
  });

  it('holds it to outcome and advisory where nothing is named', async () => {
    expect(Object.keys((await asked({ select: [] })).json())).toEqual(['outcome', 'advisory']);
  });

  it('answers a pointer that this answer lacks with the rest, and one that no answer has with 422', async () => {
    const { runway } = example as { runway: object };
    const calm = { ...example.weather, wind: { headwind: { value: 3, unit: 'kt' } } };
    const lacking = await asked({ runway, weather: calm, select: ['/wind/crosswind', '/shortfall'] });
    expect([lacking.statusCode, Object.keys(lacking.json())]).toEqual([200, ['outcome', 'advisory']]);
    const { errors } = expectProblem(await asked({ select: ['/wind', '/distance', '/working'] }), 'unknown-member');
    expect(errors.map(({ pointer, code }) => `${code} ${pointer}`)).toEqual([
      'unknown-member /select/1',
      'contradiction /select/2',
    ]);
  });

  it('is echoed with the question, which can be sent again', async () => {
    const select = ['/question', distance];
    const first = (await asked({ select, detail: ['sensitivities'] })).json();
    expect(first.question).toMatchObject({ select, detail: ['sensitivities'] });
    expect((await post(app, url, first.question)).json()).toEqual(first);
  });

  it('refuses more pointers, or longer ones, than there are members to name', async () => {
    expectProblem(await asked({ select: Array.from({ length: 65 }, () => '/air') }), 'out-of-range');
    expectProblem(await asked({ select: [`/${'a'.repeat(256)}`] }), 'out-of-range');
    expectProblem(await asked({ detail: ['workings'] }), 'unknown-id');
  });
});
