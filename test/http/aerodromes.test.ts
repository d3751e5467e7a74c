import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectProblem } from '../support/expect-problem.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const metres = (value: number) => ({ value, unit: 'm' });
const question = {
  aeroplane: { id: 'pellibrin-trainer' },
  mass: { value: 700, unit: 'kg' },
  configuration: 'takeoff-12',
  weather: {
    temperature: { value: 15, unit: 'degC' },
    dewPoint: { value: 5, unit: 'degC' },
    pressure: { qnh: { value: 1015, unit: 'hPa' } },
    wind: 'calm',
  },
  ruleSet: 'eu-class-b',
  rounding: 'none',
};
const dry = { state: 'dry' };
const runwayOf = (aerodrome: string, end: string, start: unknown, more: object = {}) => ({
  aerodrome,
  end,
  start,
  surface: dry,
  ...more,
});

async function answered(runway: object, url = '/v1/takeoff', more: object = {}) {
  const response = await post(app, url, { ...question, runway, ...more });
  expect(response.statusCode, response.body).toBe(200);
  return response.json();
}

function available(answer: { assessment: { checks: { code: string; available?: { value: number } }[] } }) {
  return Object.fromEntries(answer.assessment.checks.map(({ code, available }) => [code, available?.value]));
}

async function faults(runway: object, url = '/v1/takeoff', more: object = {}) {
  const response = await post(app, url, { ...question, runway, ...more });
  return expectProblem(response, response.json().code).errors;
}

const landing = { configuration: 'landing-38' };

describe('a runway end on file', () => {
  it('is asked by its name, echoed whole, and asked again gives the same bytes', async () => {
    const c1 = runwayOf('tavolny-regional', '12', { point: 'C1' });
    const answer = await answered(c1);
    expect(answer.question.runway).toMatchObject({
      designator: '12',
      directionReference: 'true',
      surface: { kind: 'paved', state: 'dry' },
      start: { point: 'C1' },
      declared: { tora: metres(720), toda: metres(945), asda: metres(785) },
      onFile: { aerodrome: 'tavolny-regional', revision: '2', full: { tora: metres(1465) } },
    });
    // the line on file, from 745 m on: 95 - 225/460 x 0.9 m up there, and its later points 745 m nearer
    const { points } = answer.question.runway.slope.profile;
    expect(points[0]).toEqual([0, 94.559783]);
    expect(points.slice(1)).toEqual([
      [235, 94.1],
      [720, 97.6],
      [785, 97.9],
      [945, 98.2],
    ]);
    const first = await post(app, '/v1/takeoff', { ...question, units: 'm-kt-kg', runway: c1 });
    const again = await post(app, '/v1/takeoff', answer.question);
    expect(again.body).toBe(first.body);
  });

  it('lets a start offset move every declared distance by exactly itself, and a named point by nothing', async () => {
    const whole = available(await answered(runwayOf('tavolny-regional', '12', 'threshold')));
    expect(whole).toEqual({ 'takeoff-run': 1465, 'takeoff-distance': 1690, 'accelerate-stop': 1530 });
    const later = available(await answered(runwayOf('tavolny-regional', '12', { offset: metres(137) })));
    expect(later).toEqual({ 'takeoff-run': 1328, 'takeoff-distance': 1553, 'accelerate-stop': 1393 });
    const fromC = available(await answered(runwayOf('tavolny-regional', '12', { point: 'C' })));
    expect(fromC).toEqual({ 'takeoff-run': 1045, 'takeoff-distance': 1270, 'accelerate-stop': 1110 });
    const landed = await answered(runwayOf('karvendal-club', '08', { offset: metres(100) }), '/v1/landing', landing);
    expect(available(landed)).toEqual({ 'landing-distance': 715 });
  });

  it('takes LDA and the ground line from the displaced threshold in a landing', async () => {
    const answer = await answered(runwayOf('tavolny-regional', '30', 'threshold'), '/v1/landing', landing);
    expect(available(answer)).toEqual({ 'landing-distance': 1345 });
    expect(answer.question.runway.slope.profile.points.slice(0, 2)).toEqual([
      [0, 96.734021],
      [365, 94.1],
    ]);
  });

  it('takes what the question puts in its place, and says it in the echo and in a note', async () => {
    const declared = { tora: metres(600), toda: metres(600), asda: metres(600) };
    const answer = await answered(runwayOf('karvendal-club', '08', 'threshold', { declared }));
    expect(available(answer)).toEqual({ 'takeoff-run': 600 });
    expect(answer.question.runway.declared).toEqual({ ...declared, lda: metres(815) });
    expect(answer.question.runway.onFile.changed[0]).toBe('declared/tora 600 m in place of 815 m');
    const note = answer.advisory.cautions.find(({ code }: { code: string }) => code === 'runway-changed');
    expect(note?.message).toContain('declared/tora 600 m in place of 815 m');
  });

  it('cautions where a point is given as much as the whole runway', async () => {
    const declared = { tora: metres(815), toda: metres(815), asda: metres(815) };
    const answer = await answered(runwayOf('karvendal-club', '08', { point: 'B' }, { declared }));
    const codes = answer.advisory.cautions.map(({ code }: { code: string }) => code);
    expect(codes).toContain('point-at-full-length');
    const honest = await answered(runwayOf('karvendal-club', '08', { point: 'B' }));
    expect(honest.advisory.cautions.map(({ code }: { code: string }) => code)).not.toContain('point-at-full-length');
  });

  it.each([
    ['an aerodrome', runwayOf('karvendal-klub', '08', 'threshold'), '/runway/aerodrome', 'Perhaps karvendal-club.'],
    ['a runway end', runwayOf('karvendal-club', '09', 'threshold'), '/runway/end', 'Perhaps 08.'],
    [
      'a point of another case',
      runwayOf('tavolny-regional', '12', { point: 'c1' }),
      '/runway/start/point',
      'Perhaps C1.',
    ],
    ['a point never cut short', runwayOf('tavolny-regional', '12', { point: 'C12' }), '/runway/start/point', undefined],
    ['a point of the other end', runwayOf('tavolny-regional', '30', { point: 'C' }), '/runway/start/point', undefined],
  ])('refuses %s that is not on file', async (_, runway, pointer, hint) => {
    const [fault, ...others] = await faults(runway);
    expect(others).toEqual([]);
    expect([fault?.code, fault?.pointer]).toEqual(['unknown-id', pointer]);
    if (hint === undefined) expect(fault?.hint).toBeUndefined();
    else expect(fault?.hint).toContain(hint.replace(/Perhaps |\.$/g, ''));
  });

  it('refuses a movement for which nothing is declared, by name', async () => {
    const [up] = await faults(runwayOf('ostrelle-high', '17', 'threshold'));
    expect([up?.code, up?.pointer]).toEqual(['contradiction', '/runway/end']);
    expect(up?.message).toMatch(/17 of ostrelle-high is not declared for a takeoff: none of TORA, TODA, ASDA/);
    const [down] = await faults(runwayOf('ostrelle-high', '35', 'threshold'), '/v1/landing', landing);
    expect(down?.message).toMatch(/not declared for a landing: none of LDA/);
  });

  it('tells a missing aerodrome together with every other fault', async () => {
    const found = await faults(runwayOf('nowhere', '08', 'threshold'), '/v1/takeoff', {
      mass: { value: 7000, unit: 'kg' },
    });
    expect(found.map(({ pointer }) => pointer).sort()).toEqual(['/mass', '/runway/aerodrome']);
  });

  describe('with obstacles on file', () => {
    const twin = { aeroplane: { id: 'duvassel-twin' }, mass: { value: 1990, unit: 'kg' }, configuration: 'takeoff-13' };
    const onFile = {
      from: 'end-of-toda',
      list: [
        { distance: metres(285), height: metres(11) },
        { distance: metres(1140), height: metres(43) },
      ],
    };
    const taken = async (start: unknown, more: object = {}) =>
      answered(runwayOf('tavolny-regional', '30', start, more), '/v1/takeoff', twin);
    const clearances = ({ obstaclePath }: { obstaclePath: { obstacles: { clearance: { value: number } }[] } }) =>
      obstaclePath.obstacles.map(({ clearance }) => clearance.value);

    it('counts them in a takeoff from any start point, and echoes them', async () => {
      for (const start of ['threshold', { offset: metres(200) }, { point: 'D' }]) {
        const answer = await taken(start);
        expect(answer.question.runway.obstacles).toEqual(onFile);
        expect(clearances(answer)).toHaveLength(2);
        const check = answer.assessment.checks.at(-1);
        expect([check.code, check.available.value]).toEqual(['obstacle-all-engines', Math.min(...clearances(answer))]);
      }
    });

    // ground on file: 97.6 m at 0, 94.1 at 485, 91.6 at 1 690, the end of TODA
    it.each([
      ['the threshold', 'threshold', 1690, 91.6 - 97.6],
      ['a start offset of 200 m', { offset: metres(200) }, 1490, 91.6 - (97.6 - (3.5 * 200) / 485)],
      ['point D at 380 m', { point: 'D' }, 1310, 91.6 - (97.6 - (3.5 * 380) / 485)],
    ])('measures them from the end of TODA as by hand from brake release: %s', async (_, start, whole, fall) => {
      const list = onFile.list.map(({ distance, height }) => ({
        distance: metres(whole + distance.value),
        height: metres(height.value + fall),
      }));
      const [byFile, byHand] = [await taken(start), await taken(start, { obstacles: { from: 'brake-release', list } })];
      for (const [i, clearance] of clearances(byFile).entries()) {
        expect(clearance).toBeCloseTo(clearances(byHand)[i] as number, 4);
      }
    });

    it('comes nearer to them by a start offset, and lets them govern', async () => {
      const [whole, later] = [await taken('threshold'), await taken({ offset: metres(600) })];
      for (const [i, clearance] of clearances(later).entries())
        expect(clearance).toBeLessThan(clearances(whole)[i] ?? 0);
      const high = { from: 'end-of-toda', list: [{ distance: metres(900), height: metres(300) }] };
      const blocked = await taken('threshold', { obstacles: high });
      expect([blocked.outcome, blocked.assessment.governing]).toEqual(['not-enough', 'obstacle-all-engines']);
    });

    it('takes those of the question in their place, all of them, and says so', async () => {
      const own = { from: 'brake-release', list: [{ distance: metres(2400), height: metres(52) }] };
      const answer = await taken('threshold', { obstacles: own });
      expect(answer.question.runway.obstacles).toEqual(own);
      expect(clearances(answer)).toHaveLength(1);
      const note = answer.advisory.cautions.find(({ code }: { code: string }) => code === 'runway-changed');
      expect(note.message).toMatch(/obstacles\/from brake-release in place of end-of-toda.*obstacles\/list replaced/);
    });

    it('has none in a landing, nor off the other end', async () => {
      const lander = { ...twin, configuration: 'landing-37' };
      const landed = await answered(runwayOf('tavolny-regional', '30', 'threshold'), '/v1/landing', lander);
      expect(landed.question.runway.obstacles).toBeUndefined();
      const other = await answered(runwayOf('tavolny-regional', '12', 'threshold'), '/v1/takeoff', twin);
      expect(other.obstaclePath).toBeUndefined();
      expect(other.basis.notGiven).toContain('/runway/obstacles');
    });
  });

  it('turns a magnetic wind by the variation on file', async () => {
    const wind = {
      from: { value: 84 - 3.2, unit: 'deg' },
      fromReference: 'magnetic',
      speed: { value: 10, unit: 'kt' },
    };
    const { wind: along } = await answered(runwayOf('karvendal-club', '08', 'threshold'), '/v1/takeoff', {
      weather: { ...question.weather, wind },
    });
    expect(along.headwind.value).toBeCloseTo(10, 9);
    expect(along.crosswind.value).toBeCloseTo(0, 9);
  });
});

describe('GET /v1/aerodromes', () => {
  it('lists what is on file and gives each whole', async () => {
    const { aerodromes } = (await app.inject('/v1/aerodromes')).json();
    expect(aerodromes.map(({ id }: { id: string }) => id)).toEqual([
      'karvendal-club',
      'mellgrund-meadow',
      'ostrelle-high',
      'tavolny-regional',
    ]);
    for (const { id, name, ends } of aerodromes) {
      expect(name).toMatch(/\(invented\)$/);
      const whole = (await app.inject(`/v1/aerodromes/${id}`)).json();
      expect(whole.ends.map(({ designator }: { designator: string }) => designator)).toEqual(ends);
    }
    expectProblem(await app.inject('/v1/aerodromes/karvendal'), 'not-found');
  });
});
