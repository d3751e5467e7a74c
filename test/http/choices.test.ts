import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exampleLanding } from '../../src/http/document/example-landing.ts';
import { exampleTakeoff } from '../../src/http/document/example-takeoff.ts';
import { post, testHouse } from '../support/house.ts';

const length = (value: number) => ({ value, unit: 'm' as const });

describe('POST /v1/{takeoff,landing}/choices', () => {
  let app: FastifyInstance;
  beforeAll(async () => {
    app = await testHouse();
  });
  afterAll(() => app.close());

  const { runway, configuration, ...common } = exampleTakeoff;
  const other = {
    ...runway,
    designator: '25',
    direction: { value: 248, unit: 'deg' as const },
    declared: { tora: length(420), toda: length(420), asda: length(420) },
  };

  it('answers each choice as the takeoff alone does, and ranks them', async () => {
    const choices = [
      { name: 'short end', configuration, runway: other },
      { name: 'long end', configuration, runway },
    ];
    const answer = (await post(app, '/v1/takeoff/choices', { ...common, choices })).json();
    expect(answer.choices.map(({ choice }: { choice: number }) => choice)).toEqual([1, 0]);
    for (const found of answer.choices) {
      const { name: _, ...alone } = choices[found.choice] as (typeof choices)[number];
      const one = (await post(app, '/v1/takeoff', { ...common, ...alone })).json();
      expect(found.outcome).toBe(one.outcome);
      expect(found.sentence).toBe(one.advisory.sentence);
      expect(found.assessment).toEqual(one.assessment);
      expect(found.distances).toEqual(one.distances);
    }
    expect(answer.outcome).toBe(answer.choices[0].outcome);
    expect(answer.advisory.sentence).toContain('Best: long end.');
    expect(answer.advisory.notice).toMatch(/^Advisory only/);
  });

  it('points cautions and faults into the choice they belong to', async () => {
    const against = { ...other, direction: { value: 248, unit: 'deg' as const } };
    const choices = [
      { configuration, runway },
      { configuration, runway: against },
    ];
    const answer = (await post(app, '/v1/takeoff/choices', { ...common, choices })).json();
    const pointers = answer.choices.flatMap(({ choice, cautions }: { choice: number; cautions: { at?: string }[] }) =>
      cautions.map(({ at }) => [choice, at ?? ''] as const),
    ) as [number, string][];
    expect(pointers.some(([, at]) => at.startsWith('/choices/'))).toBe(true);
    for (const [choice, at] of pointers) if (at.startsWith('/choices/')) expect(at).toMatch(`/choices/${choice}/`);

    const short = { ...runway, declared: { tora: length(500), toda: length(400) } };
    const bad = [
      { configuration: 'takeoff-99', runway },
      { configuration, runway: short },
    ];
    const refused = await post(app, '/v1/takeoff/choices', {
      ...common,
      mass: { value: 9999, unit: 'kg' },
      choices: bad,
    });
    expect(refused.statusCode).toBe(422);
    const at = refused.json().errors.map(({ pointer }: { pointer: string }) => pointer);
    expect(at).toContain('/choices/0/configuration');
    expect(at.some((pointer: string) => pointer.startsWith('/choices/1/runway/declared'))).toBe(true);
    expect(at.filter((pointer: string) => pointer.startsWith('/mass'))).toHaveLength(1);
  });

  it('compares landings too, and refuses none or more than 24', async () => {
    const { runway: landingRunway, configuration: flap, ...rest } = exampleLanding;
    const one = { configuration: flap, runway: landingRunway };
    const answer = await post(app, '/v1/landing/choices', { ...rest, choices: Array.from({ length: 24 }, () => one) });
    expect(answer.statusCode).toBe(200);
    expect(answer.json().choices.map(({ choice }: { choice: number }) => choice)).toEqual([...Array(24).keys()]);
    for (const choices of [[], Array.from({ length: 25 }, () => one)]) {
      expect((await post(app, '/v1/landing/choices', { ...rest, choices })).statusCode).toBe(422);
    }
  });
});
