import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { post, testHouse } from '../support/house.ts';

const q = (value: number, unit: string) => ({ value, unit });

/** A jet of two engines on a long dry runway, but for what is named. */
function question(some: object = {}, surface: object = { kind: 'paved', state: 'dry' }): object {
  return {
    aeroplane: { id: 'sythelor-jet' },
    mass: q(5600, 'kg'),
    configuration: 'takeoff-16',
    runway: {
      designator: '14',
      direction: q(140, 'deg'),
      directionReference: 'true',
      elevation: q(300, 'ft'),
      slope: q(0, 'percent'),
      surface,
      start: 'threshold',
      declared: { tora: q(1600, 'm'), toda: q(1600, 'm'), asda: q(1600, 'm') },
    },
    weather: { temperature: q(12, 'degC'), pressure: { qnh: q(1012, 'hPa') }, wind: 'calm' },
    ruleSet: 'eu-class-a',
    ...some,
  };
}

describe('an engine failure over HTTP', () => {
  let app: FastifyInstance;
  beforeAll(async () => {
    app = await testHouse();
  });
  afterAll(() => app.close());
  const ask = async (body: object) => (await post(app, '/v1/takeoff', body)).json();

  it('answers with a decision speed, its range, the distances and the climbs, and compares them all', async () => {
    const answer = await ask(question());
    expect(answer.outcome).toBe('enough');
    expect(Object.keys(answer.speeds)).toEqual(['stall', 'decision', 'rotation', 'liftOff', 'screen']);
    const { decision } = answer.speeds;
    expect(decision.range.lowestBecause).toBe('minimum-control-speed-on-the-ground');
    expect(decision.range.lowest.cas).toEqual(q(77, 'kt'));
    expect(decision.cas.value).toBeLessThanOrEqual(answer.speeds.rotation.cas.value);
    const { accelerateStopDistance: stop, accelerateGoDistance: go, balancedFieldLength: field } = answer.engineOut;
    expect(field.value).toBe(Math.max(stop.value, go.value));
    expect(answer.engineOut.climb.map(({ phase }: { phase: string }) => phase)).toEqual([
      'lift-off',
      '400-ft',
      '1500-ft',
    ]);
    expect(answer.assessment.checks.map(({ result }: { result: string }) => result)).toEqual(Array(5).fill('passes'));
  });
  it('takes a decision speed of the question, echoes it, and answers its own question alike', async () => {
    const answer = await ask(question({ decisionSpeed: q(85, 'kt') }));
    expect(answer.speeds.decision).toMatchObject({ cas: q(85, 'kt'), because: 'asked-for' });
    expect(answer.question.decisionSpeed).toEqual(q(85, 'kt'));
    expect((await ask(answer.question)).engineOut).toEqual(answer.engineOut);
  });
  it.each([
    [
      'below control on the ground',
      { decisionSpeed: q(70, 'kt') },
      /below the minimum control speed on the ground, 77 kt/,
    ],
    ['above rotation', { decisionSpeed: q(140, 'kt') }, /above the rotation speed/],
    [
      'of a single',
      {
        aeroplane: { id: 'pellibrin-trainer' },
        configuration: 'takeoff-12',
        mass: q(700, 'kg'),
        decisionSpeed: q(50, 'kt'),
      },
      /has one engine/,
    ],
  ])('refuses a decision speed %s, by name and with numbers', async (_, some, says) => {
    const reply = await post(app, '/v1/takeoff', question({ ...some, ruleSet: 'unfactored' }));
    expect(reply.statusCode).toBe(422);
    expect(reply.json().errors).toMatchObject([{ pointer: '/decisionSpeed', code: 'contradiction' }]);
    expect(reply.json().errors[0].message).toMatch(says);
  });
  it('answers the rejected takeoff where it is asked for, of singles too, and of no landing', async () => {
    const single = { aeroplane: { id: 'pellibrin-trainer' }, configuration: 'takeoff-12', mass: q(700, 'kg') };
    const answer = await ask(question({ ...single, ruleSet: 'unfactored', detail: ['rejected'] }));
    expect(answer.rejected).toMatchObject({
      reactionTime: q(3, 's'),
      transitionTime: q(1, 's'),
      within: { of: 'asda' },
    });
    expect(answer.engineOut).toBeUndefined();
    expect((await ask(question({ ...single, ruleSet: 'unfactored' }))).rejected).toBeUndefined();
    const landing = await post(app, '/v1/landing', {
      ...question(single),
      configuration: 'landing-30',
      detail: ['rejected'],
    });
    expect(landing.statusCode).toBe(422);
    expect(landing.json().errors[0].pointer).toBe('/detail/0');
  });
  it('stops in no less on a wet runway, by the rules of the transport category', async () => {
    const asTransport = {
      aeroplane: {
        basedOn: 'sythelor-jet',
        changes: { certification: { basis: 'cs-25' } },
        because: 'to ask by the rules of the transport category',
      },
      ruleSet: 'us-part-121',
      rounding: 'none',
    };
    const stop = ({ assessment }: { assessment: { checks: { code: string; required: { value: number } }[] } }) =>
      assessment.checks.find(({ code }) => code === 'accelerate-stop-engine-out')?.required.value ?? 0;
    const [dry, wet] = [
      await ask(question(asTransport)),
      await ask(question(asTransport, { kind: 'paved', state: 'wet' })),
    ];
    expect(stop(wet)).toBeGreaterThanOrEqual(stop(dry) - 1e-9);
    expect(wet.engineOut.screenHeight.value).toBeLessThan(dry.engineOut.screenHeight.value);
    expect(dry.engineOut.stopRule).toBe('transport-current');
  });
});
