import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { collectFaults, mostFaults } from '../../../src/contract/reading/collect-faults.ts';
import { reader } from '../../../src/contract/reading/reader.ts';
import { takeoffRequest } from '../../../src/contract/takeoff-request.ts';
import { type Fault, faultCodes, isRefused } from '../../../src/planning/fault.ts';
import { type Json, mutated, sampleQuestions } from '../../support/takeoff-questions.ts';

const read = reader(takeoffRequest);
const judge = z.compile(takeoffRequest, { strict: true });

function faultsOf(value: unknown): readonly Fault[] {
  const result = read(value);
  return isRefused(result) ? result.refused : [];
}

const [whole] = sampleQuestions();

/** The whole sample with one place changed; undefined takes the member away. */
function changed(path: string, value: unknown): Json {
  const copy = structuredClone(whole) as Json;
  const steps = path.split('/').slice(1);
  const last = steps.pop() as string;
  const at = steps.reduce<Json>((node, step) => node[step] as Json, copy);
  if (value === undefined) delete at[last];
  else at[last] = value;
  return copy;
}

describe('reader', () => {
  it.each(sampleQuestions().map((question, i) => [i, question] as const))('reads sample %i', (_, question) => {
    expect(faultsOf(question)).toEqual([]);
  });

  it('gives the members in the order of the schema, whatever the order received', () => {
    const turned = Object.fromEntries(Object.entries(whole as Json).reverse());
    expect(JSON.stringify(read(turned))).toBe(JSON.stringify(read(whole)));
  });

  const slips: [string, string, unknown, Partial<Fault>][] = [
    ['a number beyond its bounds', '/mass/value', 900_000, { code: 'out-of-range', pointer: '/mass/value' }],
    ['a wrong unit', '/mass/unit', 'lbs', { code: 'unknown-unit', pointer: '/mass/unit', hint: 'Perhaps "lb".' }],
    ['a unit of another quantity', '/mass/unit', 'ft', { code: 'unknown-unit', pointer: '/mass/unit', received: 'ft' }],
    ['a missing unit', '/mass/unit', undefined, { code: 'missing', pointer: '/mass/unit' }],
    ['a bare number', '/mass', 1010, { code: 'wrong-type', pointer: '/mass', hint: 'A number travels with its unit.' }],
    [
      'digits in quotation marks',
      '/mass/value',
      '1000',
      { code: 'wrong-type', pointer: '/mass/value', received: '1000' },
    ],
    ['null', '/mass/value', null, { code: 'wrong-type', pointer: '/mass/value' }],
    ['true', '/mass/value', true, { code: 'wrong-type', pointer: '/mass/value', received: true }],
    ['a list', '/mass', [], { code: 'wrong-type', pointer: '/mass' }],
    ['more than a number can hold', '/mass/value', Number.POSITIVE_INFINITY, { code: 'not-finite' }],
    ['a missing member', '/runway/slope', undefined, { code: 'missing', pointer: '/runway/slope' }],
    ['a member out of place', '/runway/colour', 'red', { code: 'unknown-member', pointer: '/runway/colour' }],
    ['two forms at once', '/weather/pressure/pressureAltitude', { value: 0, unit: 'ft' }, { code: 'exactly-one-of' }],
    ['none of the forms', '/weather/pressure', {}, { code: 'exactly-one-of', pointer: '/weather/pressure' }],
    ['two winds at once', '/weather/wind/headwind', { value: 1, unit: 'kt' }, { code: 'exactly-one-of' }],
    ['a misspelt word for the wind', '/weather/wind', 'clam', { code: 'unknown-id', hint: 'Perhaps "calm".' }],
    ['a word not in the list', '/runway/surface/kind', 'gras', { code: 'unknown-id', hint: 'Perhaps "grass".' }],
    ['a slip inside a form', '/weather/wind/speed/unit', 'knots', { code: 'unknown-unit', hint: 'Perhaps "kt".' }],
    [
      'a missing member of a form',
      '/weather/wind/fromReference',
      undefined,
      { pointer: '/weather/wind/fromReference' },
    ],
    ['text too long', '/reference', 'x'.repeat(65), { code: 'out-of-range', pointer: '/reference' }],
    ['an id that is a path', '/configuration', '../../etc/passwd', { code: 'wrong-type', pointer: '/configuration' }],
    ['a time without its offset', '/asOf', '2026-12-01T10:00:00', { code: 'wrong-type', pointer: '/asOf' }],
  ];

  it.each(slips)('tells %s once', (_, path, value, expected) => {
    const faults = faultsOf(changed(path, value));
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatchObject(expected);
    expect(faultCodes).toContain(faults[0]?.code);
  });

  it('tells a misspelt member once and reads its value as if rightly spelt', () => {
    const wind = { from: { value: 70, unit: 'deg' }, fromReference: 'true', sped: { value: 8, unit: 'kt' } };
    expect(faultsOf(changed('/weather/wind', wind))).toMatchObject([
      { code: 'unknown-member', pointer: '/weather/wind/sped', hint: 'Perhaps speed.' },
    ]);
    const wrong = { ...wind, sped: { value: 8, unit: 'kg' } };
    expect(faultsOf(changed('/weather/wind', wrong)).map(({ code }) => code)).toEqual([
      'unknown-member',
      'unknown-unit',
    ]);
    expect(faultsOf(changed('/weather/wind', { headwnd: { value: 8, unit: 'kt' } }))).toMatchObject([
      { code: 'unknown-member', pointer: '/weather/wind/headwnd', hint: 'Perhaps headwind.' },
    ]);
  });

  it('tells a list that is too short or too long, and faults of its items where its length is right', () => {
    const definition = (configuration: Json) => {
      const [, question] = sampleQuestions() as [Json, Json];
      const inline = (question['aeroplane'] as Json)['definition'] as Json;
      Object.assign((inline['configurations'] as Json)['clean'] as Json, configuration);
      return question;
    };
    const pointer = '/aeroplane/definition/configurations/clean/for';
    expect(faultsOf(definition({ for: [] }))).toMatchObject([{ code: 'out-of-range', pointer }]);
    const thrice = ['takeoff', 'takeoff', 'takeoff'];
    expect(faultsOf(definition({ for: thrice }))).toMatchObject([{ code: 'out-of-range', pointer }]);
    expect(faultsOf(definition({ for: ['takeof'] }))).toMatchObject([{ code: 'unknown-id', pointer: `${pointer}/0` }]);
    expect(faultsOf(definition({ for: 'takeoff' }))).toMatchObject([{ code: 'wrong-type', pointer }]);
  });

  it('tells a name that no id has apart from the value under it, in a pointer of bounded length', () => {
    const [, question] = sampleQuestions() as [Json, Json];
    const inline = (question['aeroplane'] as Json)['definition'] as Json;
    Object.assign(inline['configurations'] as Json, { 'Flaps 10': 10, ['x'.repeat(5000)]: 10 });
    const at = '/aeroplane/definition/configurations';
    expect(faultsOf(question)).toMatchObject([
      { code: 'unknown-member', pointer: `${at}/Flaps 10`, message: 'A member here cannot be named Flaps 10.' },
      { code: 'wrong-type', pointer: `${at}/Flaps 10`, received: 10 },
      { code: 'unknown-member', pointer: `${at}/${'x'.repeat(64)}…` },
      { code: 'wrong-type', pointer: `${at}/${'x'.repeat(64)}…` },
    ]);
  });

  it('tells in which units a number out of range would fit', () => {
    expect(faultsOf(changed('/weather/pressure/qnh', { value: 1009, unit: 'inHg' }))).toMatchObject([
      { code: 'out-of-range', pointer: '/weather/pressure/qnh/value', received: 1009, hint: '1009 would fit in hPa.' },
    ]);
  });

  it('tells five slips at once, in the order of the question', () => {
    const question = changed('/mass/unit', 'stone');
    Object.assign(question['runway'] as Json, { elevation: { value: 99_999, unit: 'ft' }, designator: 7 });
    Object.assign(question['weather'] as Json, {
      pressure: {},
      temprature: (question['weather'] as Json)['temperature'],
    });
    delete (question['weather'] as Json)['temperature'];
    expect(
      faultsOf(question)
        .map(({ code, pointer }) => `${code} ${pointer}`)
        .sort(),
    ).toEqual([
      'exactly-one-of /weather/pressure',
      'out-of-range /runway/elevation/value',
      'unknown-member /weather/temprature',
      'unknown-unit /mass/unit',
      'wrong-type /runway/designator',
    ]);
  });

  it('escapes pointers, echoes no structure and shortens what it repeats', () => {
    expect(faultsOf(changed('/a~1b', 1))[0]?.pointer).toBe('/a~01b');
    const long = { 'x/y~z': { secret: 1 }, ['n'.repeat(10_000)]: 'v'.repeat(10_000) };
    const faults = faultsOf({ ...(whole as Json), ...long });
    expect(faults.map(({ pointer }) => pointer)).toEqual(['/x~1y~0z', `/${'n'.repeat(64)}…`]);
    expect(JSON.stringify(faults)).not.toContain('secret');
    expect(JSON.stringify(faults).length).toBeLessThan(2000);
  });

  it('stops after a hundred', () => {
    const many = Object.fromEntries(Array.from({ length: 5_000 }, (_, i) => [`m${i}`, i]));
    expect(faultsOf(many)).toHaveLength(mostFaults);
  });

  it.each([null, true, 1, 'x', [], [[]]])('refuses %j as a question', (value) => {
    expect(faultsOf(value)).toMatchObject([{ code: 'wrong-type', pointer: '' }]);
  });

  it('passes on a check that only the judge knows', () => {
    const odd = reader(z.strictObject({ a: z.number().refine((n) => n % 2 === 1, 'must be odd') }));
    expect(odd({ a: 3 })).toEqual({ value: { a: 3 } });
    expect(odd({ a: 2 })).toEqual({ refused: [{ pointer: '/a', code: 'implausible', message: 'must be odd' }] });
  });

  test.prop([fc.nat(), fc.nat()], { numRuns: 1000 })(
    'the walk finds a fault exactly where the judge refuses',
    (seed, which) => {
      const samples = sampleQuestions();
      const value = mutated(samples[which % samples.length] as Json, seed);
      const found = collectFaults(takeoffRequest, value);
      expect(found.length > 0, JSON.stringify({ value, found })).toBe(!judge.safeParse(value).success);
    },
  );
});
