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

const metres = (value: number) => ({ value, unit: 'm' });
const bodies = { takeoff: exampleTakeoff, landing: exampleLanding };
type Phase = keyof typeof bodies;

const asked = (phase: Phase, runway: object, more: object = {}) =>
  post(app, `/v1/${phase}`, { ...bodies[phase], ...more, runway: { ...bodies[phase].runway, ...runway } });

async function answered(phase: Phase, runway: object, more: object = {}) {
  const reply = await asked(phase, runway, more);
  expect(reply.statusCode, reply.body).toBe(200);
  return reply.json();
}

async function faults(phase: Phase, runway: object, more: object = {}) {
  const reply = await asked(phase, runway, more);
  expect(reply.statusCode).toBe(422);
  return expectProblem(reply, reply.json().code).errors;
}

const cautionOf = (answer: { advisory: { cautions: { code: string }[] } }, code: string) =>
  answer.advisory.cautions.find((one) => one.code === code);

describe('a runway that cannot be as it is given', () => {
  it('has TODA or ASDA below TORA: refused, both at once, with the numbers', async () => {
    const found = await faults('takeoff', { declared: { tora: metres(900), toda: metres(880), asda: metres(870) } });
    expect(found).toMatchObject([
      {
        pointer: '/runway/declared/toda',
        code: 'contradiction',
        message: 'TODA 880 m is shorter than TORA 900 m, of which it is a part.',
        received: 880,
        allowed: 'at least 900 m',
      },
      { pointer: '/runway/declared/asda', message: 'ASDA 870 m is shorter than TORA 900 m, of which it is a part.' },
    ]);
    const equal = { declared: { tora: metres(900), toda: metres(900), asda: metres(900) } };
    expect((await asked('takeoff', equal)).statusCode).toBe(200);
  });

  it('has a direction and a wind of different references and no variation: refused by name', async () => {
    const [fault, ...others] = await faults('takeoff', { directionReference: 'magnetic' });
    expect(others).toEqual([]);
    expect(fault).toMatchObject({ pointer: '/runway/magneticVariation', code: 'missing' });
    expect(fault?.message).toMatch(/direction is magnetic and the wind's is true/);
    const magneticVariation = { value: 4, unit: 'deg' };
    const known = await answered('takeoff', { directionReference: 'magnetic', magneticVariation });
    expect(known.wind.headwind.value).toBeGreaterThan(0);
  });

  it.each([
    ['kind', { kind: 'asphalt', state: 'dry' }, '/runway/surface/kind', ['paved', 'grass', 'gravel', 'dirt', 'snow']],
    ['state', { kind: 'paved', state: 'moist' }, '/runway/surface/state', ['dry', 'damp', 'wet', 'flooded']],
    [
      'contaminant',
      { kind: 'paved', state: 'contaminated', contaminant: { kind: 'sand' } },
      '/runway/surface/contaminant/kind',
      ['water', 'slush', 'wet-snow', 'dry-snow', 'compacted-snow', 'frost', 'ice', 'wet-ice'],
    ],
  ])('has a surface of no known %s: refused with those there are', async (_, surface, pointer, known) => {
    for (const phase of ['takeoff', 'landing'] as const) {
      const [fault] = await faults(phase, { surface });
      expect(fault).toMatchObject({ pointer, code: 'unknown-id' });
      for (const one of known) expect(fault?.allowed).toContain(`"${one}"`);
    }
  });

  it('is asked under a rule set that is not known: refused with those there are', async () => {
    for (const phase of ['takeoff', 'landing'] as const) {
      const [fault] = await faults(phase, {}, { ruleSet: 'eu-class-d' });
      expect(fault).toMatchObject({ pointer: '/ruleSet', code: 'unknown-id', received: 'eu-class-d' });
      const { ruleSets } = (await app.inject('/v1/rule-sets')).json();
      expect(fault?.allowed).toBe(ruleSets.map(({ id }: { id: string }) => id).join(', '));
    }
  });
});

describe('a clearway', () => {
  const toda = async (length: number) => {
    const declared = { tora: metres(900), toda: metres(length), asda: metres(900) };
    const answer = await answered('takeoff', { declared });
    const check = answer.assessment.checks.find(({ code }: { code: string }) => code === 'takeoff-distance');
    return { available: check.available.value, caution: cautionOf(answer, 'clearway-capped') };
  };
  it('counts up to half the run, and beyond it a caution has what does not count', async () => {
    expect(await toda(1350)).toEqual({ available: 1350, caution: undefined });
    const { available, caution } = await toda(1500);
    expect(available).toBe(1350);
    expect(caution).toMatchObject({ severity: 'caution', value: metres(150), threshold: metres(1350) });
  });
});

describe('a condition code better than what lies there', () => {
  const snow = { kind: 'paved', state: 'contaminated', contaminant: { kind: 'compacted-snow' } };
  it.each(['takeoff', 'landing'] as const)('is not used in a %s: the worse is, with a caution', async (phase) => {
    const temperature = { value: -3, unit: 'degC' };
    const weather = { ...bodies[phase].weather, temperature, dewPoint: { value: -5, unit: 'degC' } };
    const [given, silent] = [
      await answered(phase, { surface: { ...snow, runwayConditionCode: 5 } }, { weather }),
      await answered(phase, { surface: snow }, { weather }),
    ];
    const caution = cautionOf(given, 'condition-code-too-good');
    expect(caution).toMatchObject({ severity: 'caution', value: 5, threshold: 3, source: 'Rcam' });
    expect((caution as unknown as { message: string }).message).toMatch(
      /^Condition code 5 is given, and .* 3 counts\.$/,
    );
    expect(given.distances).toEqual(silent.distances);
    expect(given.assessment).toEqual(silent.assessment);
  });
});

describe('thirds of one code', () => {
  it.each(['takeoff', 'landing'] as const)('equal that code in a %s', async (phase) => {
    for (const code of [5, 3, 1]) {
      const ofThirds = await answered(phase, {
        surface: { kind: 'paved', state: 'wet', runwayConditionCode: [code, code, code] },
      });
      const ofOne = await answered(phase, { surface: { kind: 'paved', state: 'wet', runwayConditionCode: code } });
      const { question: _, ...one } = ofThirds;
      const { question: __, ...other } = ofOne;
      expect(one).toEqual(other);
    }
  });
  it('that differ are said to count by the poorest in a takeoff', async () => {
    const answer = await answered('takeoff', {
      surface: { kind: 'paved', state: 'wet', runwayConditionCode: [5, 3, 4] },
    });
    const said = answer.basis.assumed.find(({ at }: { at: string }) => at === '/runway/surface/runwayConditionCode');
    expect(said).toMatchObject({ value: 3, because: expect.stringMatching(/the poorest counts throughout/) });
  });
});

describe('the climbs that rules ask for', () => {
  const twin = (phase: Phase) => ({
    aeroplane: { id: 'duvassel-twin' },
    mass: { value: 1990, unit: 'kg' },
    configuration: phase === 'takeoff' ? 'takeoff-13' : 'landing-37',
    ruleSet: 'eu-class-b',
    rounding: 'none',
  });
  const climbs = ({ assessment }: { assessment: { checks: { code: string }[] } }) =>
    assessment.checks.filter(({ code }) => code.startsWith('climb')) as Record<string, unknown>[];

  it('are 4 % after takeoff with all engines, and with one out any at 400 ft and 0.75 % at 1 500 ft [CAT.POL.A.340; read]', async () => {
    const answer = await answered('takeoff', {}, twin('takeoff'));
    const [all, low, high] = climbs(answer);
    expect(all).toMatchObject({ code: 'climb-all-engines', required: { value: 4, unit: 'percent' }, result: 'passes' });
    expect(all?.['available']).toEqual(answer.climb.gradient);
    expect(low).toMatchObject({ code: 'climb-engine-out-400-ft', result: 'passes', required: { value: 0 } });
    expect(high).toMatchObject({ code: 'climb-engine-out-1500-ft', result: 'passes', required: { value: 0.75 } });
    const shown = answer.engineOut.climb.slice(1).map(({ gradient }: { gradient: unknown }) => gradient);
    expect([low?.['available'], high?.['available']]).toEqual(shown);
  });
  it('are 2.5 % after a balked landing with all engines, and 0.75 % with one out at 1 500 ft [CAT.POL.A.340; memory]', async () => {
    const [all, out] = climbs(await answered('landing', {}, twin('landing')));
    expect(all).toMatchObject({ code: 'climb-balked-landing-all-engines', required: { value: 2.5, unit: 'percent' } });
    expect(out).toMatchObject({ result: 'passes', required: { value: 0.75 } });
  });
});
