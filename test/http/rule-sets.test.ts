import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { ruleSets } from '../../src/planning/rules/rule-sets.ts';
import { post, testHouse } from '../support/house.ts';

let app: FastifyInstance;
beforeAll(async () => {
  app = await testHouse();
});
afterAll(() => app.close());

const length = (value: number) => ({ value, unit: 'm' as const });
const definitions = readCatalogue({ builtIn: true })
  .list()
  .map(({ definition }) => definition);

/** A question on a long, level, dry, paved runway in still air, in the first configuration for it. */
function plain(id: string, phase: 'takeoff' | 'landing', more: object): object {
  const definition = definitions.find((one) => one.id === id);
  if (definition === undefined) throw new Error(id);
  const { maximumTakeoff, maximumLanding } = definition.masses;
  const configurations = Object.entries(definition.configurations);
  return {
    aeroplane: { id },
    mass: phase === 'takeoff' ? maximumTakeoff : (maximumLanding ?? maximumTakeoff),
    configuration: configurations.find(([, one]) => one.for.includes(phase))?.[0],
    runway: {
      designator: '09',
      direction: { value: 90, unit: 'deg' },
      directionReference: 'true',
      elevation: length(0),
      slope: { value: 0, unit: 'percent' },
      surface: { kind: 'paved', state: 'dry' },
      start: 'threshold',
      declared: { tora: length(4000), toda: length(4000), asda: length(4000), lda: length(4000) },
    },
    weather: {
      temperature: { value: 15, unit: 'degC' },
      pressure: { qnh: { value: 1013, unit: 'hPa' } },
      wind: 'calm',
    },
    ...more,
  };
}

const singles = ['hobbrick-bush', 'pellibrin-trainer', 'vandrelle-tourer'];
const all = [...singles, 'duvassel-twin', 'gorrendal-utility', 'lummivar-electric', 'sythelor-jet'];
const noJet = { 'sythelor-jet': 'propeller-driven aeroplanes' };
const single = 'more than one engine';
const certified = [
  'takeoff-run-all-engines',
  'takeoff-run-engine-out',
  'takeoff-distance-all-engines',
  'takeoff-distance-engine-out',
  'accelerate-stop',
];

interface Row {
  readonly set: string;
  readonly phase: 'takeoff' | 'landing';
  /** why it does not apply, by aeroplane; all others are spoken of */
  readonly refuses: Readonly<Record<string, string>>;
  /** checks of those it applies to, of all of them or by aeroplane */
  readonly checks: readonly string[] | Readonly<Record<string, readonly string[]>>;
  readonly outcome?: string;
}

const forEach = <T>(ids: readonly string[], value: T) => Object.fromEntries(ids.map((id) => [id, value]));
const onlyMultiTurbine = (pistons: string) => ({
  ...forEach([...singles, 'gorrendal-utility', 'lummivar-electric'], single),
  'duvassel-twin': pistons,
});
const onlyLargePistons = {
  ...forEach([...singles, 'duvassel-twin'], 'begins above 5 700 kg or above 9 passenger seats'),
  ...forEach(['gorrendal-utility', 'lummivar-electric', 'sythelor-jet'], 'piston engines'),
};

/** What each rule set answers to each aeroplane of the catalogue. */
const table: readonly Row[] = [
  { set: 'unfactored', phase: 'takeoff', refuses: {}, checks: ['takeoff-run', 'takeoff-distance'] },
  { set: 'unfactored', phase: 'landing', refuses: {}, checks: ['landing-distance'] },
  { set: 'uk-private-factors', phase: 'takeoff', refuses: noJet, checks: ['takeoff-run', 'takeoff-distance'] },
  { set: 'uk-private-factors', phase: 'landing', refuses: noJet, checks: ['landing-distance'] },
  {
    set: 'eu-class-a',
    phase: 'takeoff',
    refuses: onlyMultiTurbine('jets and turboprops'),
    checks: certified,
  },
  {
    set: 'eu-class-a',
    phase: 'landing',
    refuses: onlyMultiTurbine('jets and turboprops'),
    checks: ['landing-distance'],
  },
  { set: 'eu-class-b', phase: 'takeoff', refuses: noJet, checks: ['takeoff-run'] },
  { set: 'eu-class-b', phase: 'landing', refuses: noJet, checks: ['landing-distance'] },
  { set: 'eu-class-c', phase: 'takeoff', refuses: onlyLargePistons, checks: [] },
  { set: 'eu-class-c', phase: 'landing', refuses: onlyLargePistons, checks: [] },
  { set: 'us-part-91', phase: 'takeoff', refuses: {}, checks: ['takeoff-run'] },
  { set: 'us-part-91', phase: 'landing', refuses: {}, checks: ['landing-distance'] },
  {
    set: 'us-part-121',
    phase: 'takeoff',
    refuses: onlyMultiTurbine('only the rules for turbine engines are held'),
    checks: certified,
  },
  {
    set: 'us-part-121',
    phase: 'landing',
    refuses: onlyMultiTurbine('only the rules for turbine engines are held'),
    checks: ['landing-distance'],
  },
  {
    set: 'us-part-135',
    phase: 'takeoff',
    refuses: {},
    checks: { ...forEach(all, ['takeoff-run']), 'sythelor-jet': certified },
  },
  { set: 'us-part-135', phase: 'landing', refuses: {}, checks: ['landing-distance'] },
  { set: 'us-landing-by-condition-code', phase: 'takeoff', refuses: forEach(all, 'for landings'), checks: [] },
  { set: 'us-landing-by-condition-code', phase: 'landing', refuses: {}, checks: ['landing-distance'] },
];

const cases = table.flatMap((row) => all.map((id) => [row.set, row.phase, id, row] as const));

describe('each rule set, asked about each aeroplane of the catalogue', () => {
  it('leaves out no set, no phase and no aeroplane', () => {
    expect([...all].sort()).toEqual(definitions.map(({ id }) => id).sort());
    expect(table.map(({ set, phase }) => `${set} ${phase}`)).toEqual(
      ruleSets.flatMap(({ id }) => [`${id} takeoff`, `${id} landing`]),
    );
  });

  it.each(cases)('%s, %s, %s', async (set, phase, id, { refuses, checks, outcome }) => {
    const reply = await post(app, `/v1/${phase}`, plain(id, phase, { ruleSet: set }));
    expect(reply.statusCode).toBe(200);
    const answer = reply.json();
    const why = refuses[id];
    if (why !== undefined) {
      expect(answer.outcome).toBe('rule-set-does-not-apply');
      expect(answer.advisory.sentence).toContain(why);
      expect(answer.assessment).toBeUndefined();
      return;
    }
    const codes = answer.assessment.checks.map(({ code }: { code: string }) => code);
    const expected = Array.isArray(checks) ? checks : (checks as Record<string, readonly string[]>)[id];
    expect(codes.filter((code: string) => !/^(climb|obstacle)/.test(code))).toEqual(expected);
    const unassessed = answer.assessment.checks.some(({ result }: { result: string }) => result === 'not-assessed');
    expect(answer.outcome).toBe(outcome ?? (unassessed ? 'nothing-to-compare' : 'enough'));
  });
});

describe('stages', () => {
  const landed = async (id: string, more: object) =>
    (await post(app, '/v1/landing', plain(id, 'landing', more))).json();
  const stageOf = ({ basis }: { basis: { assumed: { at: string; value: unknown }[] } }) =>
    basis.assumed.find(({ at }) => at === '/stage')?.value;
  const codes = ({ advisory }: { advisory: { cautions: { code: string }[] } }) =>
    advisory.cautions.map(({ code }) => code);

  it('take the figure before departure where nothing is said, and say so where the rule knows another', async () => {
    const silent = await landed('pellibrin-trainer', { ruleSet: 'eu-class-b', rounding: 'none' });
    const before = await landed('pellibrin-trainer', { ruleSet: 'eu-class-b', rounding: 'none', stage: 'dispatch' });
    expect([stageOf(silent), stageOf(before)]).toEqual(['dispatch', undefined]);
    expect(silent.assessment).toEqual(before.assessment);
    expect(stageOf(await landed('pellibrin-trainer', { ruleSet: 'us-part-135' }))).toBeUndefined();
  });
  it('ask in flight for 115 % of the distance on the runway as it is, the length before departure beside it', async () => {
    const flying = await landed('pellibrin-trainer', { ruleSet: 'eu-class-b', rounding: 'none', stage: 'in-flight' });
    const [check] = flying.assessment.checks;
    expect(check.required.value / flying.distances.landingDistance.value).toBeCloseTo(1.15, 9);
    expect(check.alternative.required.value / check.alternative.distance.value).toBeCloseTo(1 / 0.7, 9);
    expect(codes(flying)).not.toContain('stage-not-known');
  });
  it('are told where the rules do not know the one that is asked', async () => {
    expect(codes(await landed('sythelor-jet', { ruleSet: 'us-part-121', stage: 'in-flight' }))).toContain(
      'stage-not-known',
    );
    const before = { ruleSet: 'us-landing-by-condition-code', stage: 'dispatch' };
    expect(codes(await landed('sythelor-jet', before))).toContain('stage-not-known');
  });
});

describe('an operator\u2019s own rules', () => {
  const own = (overallFactor: number) => ({
    basedOn: 'eu-class-b',
    name: 'Brindlecombe Air',
    factors: [{ check: 'takeoff-run', overallFactor }],
  });
  const asked = (ruleSet: unknown) => post(app, '/v1/takeoff', plain('pellibrin-trainer', 'takeoff', { ruleSet }));

  it('are used and named, and echoed as they were given', async () => {
    const reply = await asked(own(1.5));
    expect(reply.statusCode).toBe(200);
    const answer = reply.json();
    expect(answer.assessment).toMatchObject({ ruleSet: 'operator', basedOn: 'eu-class-b' });
    expect(answer.assessment.checks[0].factors.at(-1)).toMatchObject({ value: 1.5, source: 'OperatorsOwn' });
    expect(answer.advisory.sentence).toContain('under the factors of Brindlecombe Air');
    expect(answer.question.ruleSet).toEqual(own(1.5));
    expect(answer.basis.sources.map(({ key }: { key: string }) => key)).toContain('OperatorsOwn');
  });
  it('are refused where one is below the rule\u2019s, by name', async () => {
    const reply = await asked(own(1.2));
    expect(reply.statusCode).toBe(422);
    const [fault] = reply.json().errors;
    expect(fault).toMatchObject({ pointer: '/ruleSet/factors/0/overallFactor', code: 'out-of-range', received: 1.2 });
    expect(fault.message).toMatch(/1\.2 is below 1\.25 /);
  });
  it('are refused with what is wrong in them, all at once', async () => {
    const pointersOf = async (ruleSet: unknown) =>
      (await asked(ruleSet)).json().errors.map(({ pointer, code }: Record<string, string>) => `${code} ${pointer}`);
    expect(await pointersOf('eu-clas-b')).toEqual(['unknown-id /ruleSet']);
    expect(await pointersOf(7)).toEqual(['wrong-type /ruleSet']);
    expect(await pointersOf({ ...own(1.5), factors: [] })).toEqual(['out-of-range /ruleSet/factors']);
    const odd = { ...own(1.5), nam: 'x', factors: [{ check: 'takeoff-run', overallFactor: 0.9 }] };
    expect((await pointersOf(odd)).sort()).toEqual([
      'out-of-range /ruleSet/factors/0/overallFactor',
      'unknown-member /ruleSet/nam',
    ]);
    expect(await pointersOf({ ...own(1.5), factors: [{ phase: 'takeoff', kind: 'grass', surfaceFactor: 2 }] })).toEqual(
      ['missing /ruleSet/factors/0/state'],
    );
  });
});

describe('GET /v1/rule-sets and /v1/surfaces', () => {
  it('give every set and every surface as data', async () => {
    const sets = (await app.inject('/v1/rule-sets')).json();
    expect(sets.ruleSets).toHaveLength(ruleSets.length);
    const b = sets.ruleSets.find(({ id }: { id: string }) => id === 'eu-class-b');
    expect(b.landing.cases[0].checks[0].factor.value).toBe(1 / 0.7);
    expect(b.takeoff.demands.map(({ gradient }: { gradient: unknown }) => gradient)).toContainEqual({
      value: 4,
      unit: 'percent',
    });
    const { surfaces } = (await app.inject('/v1/surfaces')).json();
    const wetGrass = surfaces.find(
      ({ kind, state, grass }: Record<string, string>) => kind === 'grass' && state === 'wet' && grass === 'long',
    );
    expect(wetGrass.rolling).toMatchObject({ coefficient: 0.12, source: 'HouseFriction' });
    expect(wetGrass.ruleSets.map(({ ruleSet }: { ruleSet: string }) => ruleSet)).toContain('eu-class-b');
  });
});
