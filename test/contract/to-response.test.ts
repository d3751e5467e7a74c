import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { type TakeoffResponse, takeoffResponse } from '../../src/contract/takeoff-response.ts';
import { toQuestion } from '../../src/contract/to-question.ts';
import { toResponse } from '../../src/contract/to-response.ts';
import { wholeRequest } from '../../src/contract/whole-request.ts';
import type { TakeoffAnswer } from '../../src/planning/answer.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { sampleAnswer } from '../support/sample-answer.ts';
import { sampleDefinition, sampleLookup, sampleTakeoff, withMember } from '../support/sample-questions.ts';

const lawful = z.compile(takeoffResponse, { strict: true });
const stamp = { modelVersion: '9.9.9', rulesDigest: 'digest of the rules' };

function shownAs(
  asked: { units?: string | undefined; rounding?: string | undefined },
  answer: TakeoffAnswer = sampleAnswer(),
): TakeoffResponse {
  const request = withMember(withMember(sampleTakeoff(), '/units', asked.units), '/rounding', asked.rounding);
  const lookup = sampleLookup(sampleDefinition());
  const question = toQuestion(request, lookup);
  if (isRefused(question)) throw new Error(JSON.stringify(question));
  return toResponse(answer, wholeRequest(request, lookup.aerodromes, 'takeoff'), question, stamp);
}

/** Members of the document's blocks in its order, as the contract prints them. */
const order: Record<string, string[]> = {
  '': ['outcome', 'advisory', 'air', 'wind', 'speeds', 'distances', 'assessment', 'shortfall', 'basis', 'question'],
  '/advisory': ['notice', 'sentence', 'cautions'],
  '/advisory/cautions/0': ['code', 'severity', 'message', 'at', 'value', 'threshold', 'source'],
  '/air': [
    'temperature',
    'temperatureDeviation',
    'pressure',
    'pressureAltitude',
    'density',
    'densityRatio',
    'densityAltitude',
    'dewPoint',
    'relativeHumidity',
  ],
  '/wind': ['headwind', 'crosswind', 'crosswindFrom', 'creditedHeadwind'],
  '/speeds': ['stall', 'rotation', 'liftOff', 'screen'],
  '/speeds/liftOff': ['cas', 'eas', 'tas', 'ias', 'stallRatio'],
  '/distances': ['screenHeight', 'groundRoll', 'airDistance', 'takeoffDistance', 'groundRollTime', 'airTime'],
  '/distances/groundRoll': ['value', 'unit', 'low', 'high', 'method'],
  '/assessment': ['ruleSet', 'checks', 'governing'],
  '/assessment/checks/0': [
    'code',
    'of',
    'startsFrom',
    'distance',
    'factors',
    'alternative',
    'required',
    'available',
    'margin',
    'marginPercent',
    'result',
    'source',
  ],
  '/assessment/checks/0/factors/0': ['code', 'value', 'because', 'source', 'status'],
  '/assessment/checks/1': ['code', 'of', 'startsFrom', 'factors', 'result', 'why', 'source'],
  '/shortfall/0': ['at', 'axis', 'table', 'given', 'bound', 'side'],
  '/basis': ['method', 'band', 'assumed', 'notGiven', 'sources', 'modelVersion', 'digests'],
  '/basis/digests': ['aeroplane', 'rules'],
  '/question': [
    'reference',
    'asOf',
    'aeroplane',
    'mass',
    'configuration',
    'runway',
    'weather',
    'ruleSet',
    'stage',
    'units',
    'rounding',
  ],
};

describe('the gate out', () => {
  it.each(unitFamilies.flatMap((units) => ['safe', 'none'].map((rounding) => ({ units, rounding }))))(
    'is in its own form in $units, $rounding',
    (asked) => {
      const response = shownAs(asked);
      expect(takeoffResponse.safeParse(response).error).toBeUndefined();
      expect(lawful.safeParse(response).success).toBe(true);
      expect(JSON.parse(JSON.stringify(response))).toEqual(response);
    },
  );

  it.each(Object.entries(order))('keeps the order of %s', (pointer, members) => {
    const block = pointer
      .split('/')
      .slice(1)
      .reduce<unknown>((node, name) => (node as Record<string, unknown>)[name], shownAs({ units: 'si' }));
    expect(Object.keys(block as object)).toEqual(members);
  });

  it('rounds in metres, knots, kilograms, by hand', () => {
    const { air, wind, speeds, distances, assessment, advisory, shortfall, basis } = shownAs({ units: 'm-kt-kg' });
    expect(air).toEqual({
      temperature: { value: 31, unit: 'degC' },
      temperatureDeviation: { value: 18.7, unit: 'deltaC' },
      pressure: { value: 964.21, unit: 'hPa' },
      pressureAltitude: { value: 1366, unit: 'ft' },
      density: { value: 1.0955, unit: 'kg/m3' },
      densityRatio: 0.8943,
      densityAltitude: { value: 3769, unit: 'ft' },
      dewPoint: { value: 18, unit: 'degC' },
      relativeHumidity: { value: 45.93, unit: 'percent' },
    });
    expect(wind).toEqual({
      headwind: { value: -8, unit: 'kt' },
      crosswind: { value: 5.7, unit: 'kt' },
      crosswindFrom: 'right',
      creditedHeadwind: { value: -12, unit: 'kt' },
    });
    expect(speeds.liftOff).toEqual({
      cas: { value: 58.5, unit: 'kt' },
      eas: { value: 58.5, unit: 'kt' },
      tas: { value: 62, unit: 'kt' },
      ias: { value: 56.6, unit: 'kt' },
      stallRatio: 1.204,
    });
    expect(distances).toEqual({
      screenHeight: { value: 50, unit: 'ft' },
      groundRoll: { value: 603, unit: 'm', low: 398, high: 907, method: 'stated' },
      airDistance: { value: 286, unit: 'm', low: 192, high: 422, method: 'stated' },
      takeoffDistance: { value: 888, unit: 'm', low: 612, high: 1286, method: 'stated' },
      groundRollTime: { value: 30.9, unit: 's' },
      airTime: { value: 7.7, unit: 's' },
    });
    expect(assessment?.checks[0]).toMatchObject({
      distance: { value: 767, unit: 'm' },
      factors: [{ value: 1.25 }, { value: 1.4286 }],
      alternative: { distance: { value: 969, unit: 'm' }, required: { value: 1114, unit: 'm' } },
      required: { value: 1037, unit: 'm' },
      available: { value: 829, unit: 'm' },
      margin: { value: -207, unit: 'm' },
      marginPercent: -19.91,
    });
    expect(advisory.cautions[0]).toMatchObject({ value: { value: -206, unit: 'm' }, threshold: 0.1235 });
    expect(shortfall?.[0]).toMatchObject({ given: { value: 31, unit: 'degC' }, bound: { value: 30, unit: 'degC' } });
    expect(basis.band?.[0]).toEqual({
      of: 'wind',
      groundRollPercent: 7.82,
      airDistancePercent: 4.17,
      takeoffDistancePercent: 6.64,
    });
    expect(basis.assumed.map(({ value, effectPercent }) => [value, effectPercent])).toEqual([
      [1.1, 3.12],
      ['m-kt-kg', undefined],
      [{ value: 1, unit: 's' }, undefined],
    ]);
  });

  it('rounds feet to five, the safe way', () => {
    const { distances, assessment } = shownAs({ units: 'ft-kt-lb' });
    expect(distances?.groundRoll).toEqual({ value: 1980, unit: 'ft', low: 1305, high: 2975, method: 'stated' });
    expect(assessment?.checks[0]).toMatchObject({
      required: { value: 3400, unit: 'ft' },
      available: { value: 2720, unit: 'ft' },
      margin: { value: -680, unit: 'ft' },
    });
  });

  it('shows numbers as they are when asked not to round', () => {
    const { distances, assessment, air } = shownAs({ units: 'si', rounding: 'none' });
    const given = sampleAnswer();
    expect(distances?.groundRoll).toEqual({ ...given.distances?.groundRoll, unit: 'm' });
    expect(assessment?.checks[0]?.margin?.value).toBe(-206.3);
    expect(assessment?.checks[0]?.factors[1]?.value).toBe(1 / 0.7);
    expect(air.densityRatio).toBe(0.894299);
  });

  test.prop([
    fc.constantFrom(...unitFamilies),
    fc.double({ min: 1, max: 9000, noNaN: true }),
    fc.double({ min: 1, max: 9000, noNaN: true }),
  ])('never shows less required, more available or a wider margin than there is', (units, required, available) => {
    const answer = sampleAnswer();
    const [check] = answer.assessment?.checks ?? [];
    const margin = available - required;
    const checks = [{ ...(check as NonNullable<typeof check>), required, available, margin }];
    const exact = shownAs({ units, rounding: 'none' }, { ...answer, assessment: { ruleSet: 'unfactored', checks } });
    const safe = shownAs({ units, rounding: 'safe' }, { ...answer, assessment: { ruleSet: 'unfactored', checks } });
    const [before, after] = [exact.assessment?.checks[0], safe.assessment?.checks[0]];
    const slack = 1e-4;
    expect(after?.required?.value).toBeGreaterThanOrEqual((before?.required?.value as number) - slack);
    expect(after?.available?.value).toBeLessThanOrEqual((before?.available?.value as number) + slack);
    expect(after?.margin?.value).toBeLessThanOrEqual((before?.margin?.value as number) + slack);
    expect(after?.margin?.unit).toBe(units === 'ft-kt-lb' ? 'ft' : 'm');
  });

  it('leaves out what there is not', () => {
    const { distances, assessment, shortfall, ...rest } = sampleAnswer();
    const response = shownAs({ units: 'si' }, { ...rest, basis: { ...rest.basis, assumed: [] } });
    expect([distances, assessment, shortfall].every(Boolean)).toBe(true);
    expect(Object.keys(response)).toEqual(['outcome', 'advisory', 'air', 'wind', 'speeds', 'basis', 'question']);
    expect(lawful.safeParse(response).success).toBe(true);
  });

  it('lists every source that it names, once', () => {
    const keys = shownAs({ units: 'si' }).basis.sources.map(({ key }) => key);
    expect(keys).toEqual(['Iso2533', 'EuAirOps305', 'EuAirOps305Amc2', 'EuAirOps305Amc1', 'Judgement', 'Raymer']);
  });

  it('echoes a question that can be sent again and means the same', () => {
    const { question } = shownAs({});
    expect(question).toMatchObject({
      units: 'm-kt-kg',
      rounding: 'safe',
      aeroplane: { id: 'sample-tourer', revision: '3' },
    });
    const again = takeoffRequest.parse(question);
    const lookup = sampleLookup(sampleDefinition());
    const silent = withMember(withMember(sampleTakeoff(), '/units', undefined), '/rounding', undefined);
    expect({ ...toQuestion(again, lookup), defaulted: [] }).toEqual({ ...toQuestion(silent, lookup), defaulted: [] });
  });

  it('carries its stamp', () => {
    const { modelVersion, digests } = shownAs({}).basis;
    expect({ modelVersion, digests }).toEqual({
      modelVersion: '9.9.9',
      digests: { aeroplane: 'digest of sample-tourer', rules: 'digest of the rules' },
    });
  });

  it.each([Number.NaN, Infinity, -Infinity])('%s anywhere is not in its own form', (value) => {
    const response = shownAs(
      { units: 'si', rounding: 'none' },
      { ...sampleAnswer(), air: { ...sampleAnswer().air, densityRatio: value } },
    );
    expect(lawful.safeParse(response).success).toBe(false);
  });
});
