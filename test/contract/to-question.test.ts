import { describe, expect, it } from 'vitest';
import { type TakeoffRequest, takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { toQuestion } from '../../src/contract/to-question.ts';
import { isRefused } from '../../src/planning/fault.ts';
import type { Question } from '../../src/planning/question.ts';
import { inOtherUnits, numbersIn } from '../support/in-other-units.ts';
import { named, sampleDefinition, sampleLookup, sampleTakeoff, withMember } from '../support/sample-questions.ts';

const lookup = sampleLookup(sampleDefinition(), { ...sampleDefinition(), id: 'other-tourer' });

function asked(request: TakeoffRequest): Question {
  const question = toQuestion(request, lookup);
  if (isRefused(question)) throw new Error(JSON.stringify(question.refused));
  return question;
}

function faultsIn(request: TakeoffRequest) {
  expect(takeoffRequest.safeParse(request).error).toBeUndefined();
  const question = toQuestion(request, lookup);
  return isRefused(question) ? question.refused : [];
}

const runway = '/runway';
const weather = '/weather';

/** One slip of meaning, the one fault it must give, and what it must say. */
const slips: [title: string, pointer: string, value: unknown, fault: string, says: RegExp][] = [
  ['an aeroplane not on file', '/aeroplane/id', 'sample-turer', 'unknown-id /aeroplane/id', /sample-tourer/],
  [
    'another revision than the one on file',
    '/aeroplane/revision',
    '2',
    'contradiction /aeroplane/revision',
    /Revision 3/,
  ],
  [
    'a configuration it does not have',
    '/configuration',
    'takeoff-20',
    'unknown-id /configuration',
    /Perhaps takeoff-10/,
  ],
  ['a landing configuration', '/configuration', 'landing-full', 'contradiction /configuration', /for landing only/],
  ['a mass in the other unit', '/mass', { value: 2227, unit: 'kg' }, 'implausible /mass', /2227 lb would fit/],
  ['a mass below the empty mass', '/mass', { value: 570, unit: 'kg' }, 'implausible /mass', /empty mass is 640 kg/],
  ['a mass a digit short', '/mass', { value: 101, unit: 'kg' }, 'implausible /mass', /576 to 1133 kg/],
  [
    'TODA below TORA',
    `${runway}/declared/toda`,
    { value: 899, unit: 'm' },
    'contradiction /runway/declared/toda',
    /shorter than TORA/,
  ],
  [
    'ASDA below TORA',
    `${runway}/declared/asda`,
    { value: 899, unit: 'm' },
    'contradiction /runway/declared/asda',
    /shorter than TORA/,
  ],
  [
    'a start beyond the runway',
    `${runway}/start/offset`,
    { value: 900, unit: 'm' },
    'contradiction /runway/start/offset',
    /nothing of TORA/,
  ],
  [
    'lining up beyond the rest',
    `${runway}/lineUp/tora`,
    { value: 840, unit: 'm' },
    'contradiction /runway/lineUp/tora',
    /nothing of TORA/,
  ],
  [
    'grass on tarmac',
    `${runway}/surface`,
    { kind: 'paved', state: 'dry', grass: 'short' },
    'contradiction /runway/surface/grass',
    /paved/,
  ],
  [
    'a soft paved runway',
    `${runway}/surface`,
    { kind: 'paved', state: 'dry', firmness: 'soft' },
    'contradiction /runway/surface/firmness',
    /unpaved/,
  ],
  [
    'two norths without the variation',
    `${runway}/magneticVariation`,
    undefined,
    'missing /runway/magneticVariation',
    /magnetic and the wind's is true/,
  ],
  [
    'a dew point above the temperature',
    `${weather}/dewPoint`,
    { value: 31.1, unit: 'degC' },
    'contradiction /weather/dewPoint',
    /above the temperature/,
  ],
  [
    'a gust below the mean',
    `${weather}/wind/gust`,
    { value: 7, unit: 'kt' },
    'contradiction /weather/wind/gust',
    /below the mean/,
  ],
  [
    'extremes changed over',
    `${weather}/wind/variable`,
    { from: { value: 270, unit: 'deg' }, to: { value: 210, unit: 'deg' } },
    'contradiction /weather/wind/variable',
    /not between/,
  ],
  [
    'a pressure altitude in metres called feet',
    `${weather}/pressure`,
    { pressureAltitude: { value: 6000, unit: 'ft' } },
    'contradiction /weather/pressure/pressureAltitude',
    /does not go with an elevation/,
  ],
  [
    'a QNH given as station pressure',
    `${weather}/pressure`,
    { stationPressure: { value: 1060, unit: 'hPa' } },
    'contradiction /weather/pressure/stationPressure',
    /110[89] hPa/,
  ],
  ['a rule set nobody wrote', '/ruleSet', 'eu-clas-b', 'unknown-id /ruleSet', /Perhaps eu-class-b/],
];

describe('the gate in', () => {
  it('makes a question in SI, by hand', () => {
    const { aeroplane, ...question } = asked(sampleTakeoff());
    expect(aeroplane).toBe(lookup.get('sample-tourer')?.aeroplane);
    expect(question).toEqual({
      aeroplaneDigest: 'digest of sample-tourer',
      aeroplaneAt: '/aeroplane',
      mass: 1010,
      configuration: 'takeoff-10',
      runway: {
        designator: '07',
        direction: expect.closeTo(1.2566370614, 9),
        directionReference: 'magnetic',
        magneticVariation: expect.closeTo(0.0523598776, 9),
        elevation: expect.closeTo(381, 9),
        slope: 0.008,
        surface: { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm', rollingFrictionCoefficient: 0.08 },
        start: { kind: 'offset', offset: 60 },
        lineUp: { tora: 10, asda: 14 },
        declared: { tora: 900, toda: 960, asda: 900, lda: 850 },
      },
      weather: {
        temperature: expect.closeTo(304.15, 9),
        dewPoint: expect.closeTo(291.15, 9),
        pressure: { kind: 'qnh', value: 100_900 },
        wind: {
          kind: 'from',
          from: expect.closeTo(4.1887902048, 9),
          fromReference: 'true',
          speed: expect.closeTo(4.1155555556, 9),
          gust: expect.closeTo(7.2022222222, 9),
          variable: { from: expect.closeTo(3.6651914292, 9), to: expect.closeTo(4.7123889804, 9) },
        },
      },
      ruleSet: 'eu-class-b',
      stage: 'dispatch',
      units: 'm-kt-kg',
      defaulted: ['/aeroplane#/configurations/takeoff-10/maximumLift/kind', '/procedure/power', '/procedure/start'],
    });
  });

  it('takes each form of wind, pressure and start', () => {
    const wind = (value: unknown) => asked(withMember(sampleTakeoff(), '/weather/wind', value)).weather.wind;
    expect(wind('calm')).toEqual({ kind: 'calm' });
    expect(wind({ headwind: { value: -3, unit: 'm/s' } })).toEqual({ kind: 'components', headwind: -3 });
    expect(wind({ headwind: { value: 3, unit: 'm/s' }, crosswind: { value: 2, unit: 'm/s' } })).toEqual({
      kind: 'components',
      headwind: 3,
      crosswind: 2,
    });
    const pressure = (value: unknown) =>
      asked(withMember(sampleTakeoff(), '/weather/pressure', value)).weather.pressure;
    expect(pressure({ pressureAltitude: { value: 400, unit: 'm' } })).toEqual({ kind: 'pressureAltitude', value: 400 });
    expect(pressure({ stationPressure: { value: 965, unit: 'hPa' } })).toEqual({
      kind: 'stationPressure',
      value: 96_500,
    });
    const start = (value: unknown) => asked(withMember(sampleTakeoff(), '/runway/start', value)).runway.start;
    expect(start('threshold')).toEqual({ kind: 'threshold' });
    expect(start({ point: 'B2' })).toEqual({ kind: 'point', name: 'B2' });
  });

  it('turns a negative zero into zero', () => {
    const { weather: told } = asked(
      withMember(sampleTakeoff(), '/weather/wind', { headwind: { value: -0, unit: 'kt' } }),
    );
    expect(told.wind).toEqual({ kind: 'components', headwind: 0 });
  });

  it.each(slips)('%s gives one fault', (_, pointer, value, fault, says) => {
    const faults = faultsIn(withMember(sampleTakeoff(), pointer, value));
    expect(named(faults)).toEqual([fault]);
    expect(`${faults[0]?.message} ${faults[0]?.allowed} ${faults[0]?.hint}`).toMatch(says);
  });

  it('gives all faults at once', () => {
    const three = slips
      .filter(([title]) => /mass in the other|TODA|gust/.test(title))
      .reduce((request, [, pointer, value]) => withMember(request, pointer, value), sampleTakeoff());
    expect(named(faultsIn(three)).sort()).toEqual([
      'contradiction /runway/declared/toda',
      'contradiction /weather/wind/gust',
      'implausible /mass',
    ]);
  });

  it('stands on the bounds of the mass: 0.9 of empty and 1.1 of the greatest', () => {
    const at = (value: number) => faultsIn(withMember(sampleTakeoff(), '/mass', { value, unit: 'kg' })).length;
    expect([575.9, 576, 1133, 1133.1].map(at)).toEqual([1, 0, 0, 1]);
  });

  it('lets equal declared distances and an equal dew point stand', () => {
    const equal = withMember(sampleTakeoff(), '/runway/declared/toda', { value: 0.9, unit: 'km' });
    expect(faultsIn(equal)).toEqual([]);
    expect(faultsIn(withMember(sampleTakeoff(), '/weather/dewPoint', { value: 87.8, unit: 'degF' }))).toEqual([]);
  });

  it('takes an inline definition, and what is wrong in it', () => {
    const inline = withMember(sampleTakeoff(), '/aeroplane', { definition: sampleDefinition() });
    const { aeroplaneAt, aeroplaneDigest, aeroplane } = asked(inline);
    expect([aeroplaneAt, aeroplaneDigest]).toEqual(['/aeroplane/definition', 'digest of sample-tourer']);
    expect(aeroplane).toEqual(lookup.get('sample-tourer')?.aeroplane);
    expect(named(faultsIn(withMember(inline, '/aeroplane/definition/engines', 2)))).toEqual([
      'contradiction /aeroplane/definition/engines',
    ]);
  });

  it('says what it fills in', () => {
    const silent = withMember(withMember(sampleTakeoff(), '/units', undefined), '/rounding', undefined);
    const kind = 'configurations/takeoff-10/maximumLift/kind';
    const procedure = ['/procedure/power', '/procedure/start'];
    expect(asked(silent)).toMatchObject({
      units: 'm-kt-kg',
      defaulted: ['/units', '/rounding', `/aeroplane#/${kind}`, ...procedure],
    });
    const inline = withMember(sampleTakeoff(), '/aeroplane', { definition: sampleDefinition() });
    expect(asked(inline).defaulted).toEqual([`/aeroplane/definition/${kind}`, ...procedure]);
    const standing = withMember(inline, '/procedure', { start: 'standing' });
    expect(asked(standing).defaulted).toEqual([`/aeroplane/definition/${kind}`, '/procedure/power']);
  });

  it('the same question in other units is the same question, to 1e-12', () => {
    const inline = withMember(sampleTakeoff(), '/aeroplane', { definition: sampleDefinition() });
    for (const request of [sampleTakeoff(), inline]) {
      const other = inOtherUnits(request);
      expect(takeoffRequest.safeParse(other).error).toBeUndefined();
      const ours = numbersIn(asked(request));
      const theirs = numbersIn(asked(other));
      expect(theirs.map(([path]) => path)).toEqual(ours.map(([path]) => path));
      ours.forEach(([path, value], i) => {
        const apart = Math.abs((theirs[i]?.[1] as number) - value);
        expect(apart, path).toBeLessThanOrEqual(1e-12 * Math.max(Math.abs(value), 1e-3));
      });
    }
  });
});
