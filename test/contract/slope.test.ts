import { describe, expect, it } from 'vitest';
import type { SlopeOnWire } from '../../src/contract/slope.ts';
import { type TakeoffRequest, takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { toQuestion } from '../../src/contract/to-question.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planTakeoff } from '../../src/planning/plan-takeoff.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { named, sampleDefinition, sampleLookup, sampleTakeoff, withMember } from '../support/sample-questions.ts';

const lookup = sampleLookup(sampleDefinition());
const tora = 900;
/** TORA 900 m alone, started at the threshold */
const plain = withMember(
  withMember(
    withMember(sampleTakeoff(), '/runway/declared', { tora: { value: tora, unit: 'm' } }),
    '/runway/lineUp',
    undefined,
  ),
  '/runway/start',
  'threshold',
);

function withSlope(slope: SlopeOnWire, request: TakeoffRequest = plain): TakeoffRequest {
  return withMember(request, '/runway/slope', slope);
}

function line(points: [number, number][], units: ['m' | 'ft', 'm' | 'ft'] = ['m', 'm']): SlopeOnWire {
  return { profile: { units, points } };
}

function faultsIn(request: TakeoffRequest) {
  expect(takeoffRequest.safeParse(request).error).toBeUndefined();
  const question = toQuestion(request, lookup);
  return isRefused(question) ? question.refused : [];
}

function planned(request: TakeoffRequest) {
  const question = toQuestion(request, lookup);
  if (isRefused(question)) throw new Error(JSON.stringify(question.refused));
  const answer = planTakeoff(question);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer.refused));
  return { question, answer };
}

describe('a runway with a profile', () => {
  it('gives the answer of its slope where the slope is the same throughout', () => {
    for (const percent of [-3, 0, 1.25]) {
      const rise = (percent / 100) * 900;
      const steady = planned(withSlope({ value: percent, unit: 'percent' })).answer;
      const profiled = planned(
        withSlope(
          line([
            [0, 400],
            [300, 400 + rise / 3],
            [900, 400 + rise],
          ]),
        ),
      ).answer;
      const [one, other] = [steady, profiled].map(({ distances }) => distances?.takeoffDistance);
      expectRatio(other?.value, one?.value ?? 0, 1e-9);
      expectRatio(other?.high, one?.high ?? 0, 1e-9);
      const [check, again] = [steady, profiled].map(({ assessment }) => assessment?.checks[0]);
      expectRatio(again?.required, check?.required ?? 0, 1e-9);
    }
  });

  it('takes each column in its own unit', () => {
    const inMetres = planned(
      withSlope(
        line([
          [0, 0],
          [450, 9],
          [900, 9],
        ]),
      ),
    ).question.runway.profile;
    const inFeet = planned(
      withSlope(
        line(
          [
            [0, 0],
            [450 / 0.3048, 9 / 0.3048],
            [2953, 9 / 0.3048],
          ],
          ['ft', 'ft'],
        ),
      ),
    ).question.runway.profile;
    expect(inMetres?.ends).toEqual([450, 900]);
    expectNear(inFeet?.ends[0], 450, 1e-9);
    expectNear(inFeet?.slopes[0], 0.02, 1e-12);
  });

  it('begins at the start point: an offset moves along it', () => {
    const offset = withMember(plain, '/runway/start', { offset: { value: 450, unit: 'm' } });
    const { runway } = planned(
      withSlope(
        line([
          [0, 0],
          [450, 9],
          [900, 0],
        ]),
        offset,
      ),
    ).question;
    expect(runway.profile).toEqual({ ends: [450], slopes: [-0.02] });
    expectNear(runway.slope, -0.02, 1e-12);
  });

  it('takes one slope to the end of TORA where a factor asks for one, and says so', () => {
    const { question, answer } = planned(
      withSlope(
        line([
          [0, 0],
          [450, 9],
          [900, 9],
        ]),
      ),
    );
    expectNear(question.runway.slope, 0.01, 1e-12);
    const factors = answer.assessment?.checks[0]?.factors ?? answer.assessment?.checks[0]?.alternative?.factors;
    const slope = [...(factors ?? []), ...(answer.assessment?.checks[0]?.alternative?.factors ?? [])].find(
      ({ code }) => code === 'slope',
    );
    expectNear(slope?.value, 1.05, 1e-9);
    const said = answer.basis.assumed.find(({ at }) => at === '/runway/slope/profile');
    expect(said?.because).toMatch(/from the start point to the end of TORA/);
  });

  it('lets what lies beyond TORA count for the path, not for the slope of the factor', () => {
    const request = withMember(plain, '/runway/declared', {
      tora: { value: 900, unit: 'm' },
      toda: { value: 1200, unit: 'm' },
      asda: { value: 900, unit: 'm' },
    });
    const { runway } = planned(
      withSlope(
        line([
          [0, 0],
          [900, 9],
          [1200, 0],
        ]),
        request,
      ),
    ).question;
    expectNear(runway.slope, 0.01, 1e-12);
  });

  it.each<[string, SlopeOnWire, string, RegExp]>([
    [
      'points out of order',
      line([
        [0, 0],
        [500, 1],
        [400, 2],
        [900, 3],
      ]),
      'contradiction /runway/slope/profile/points/2/0',
      /does not come after/,
    ],
    [
      'a stretch steeper than 10 %',
      line([
        [0, 0],
        [100, 10.1],
        [900, 11],
      ]),
      'implausible /runway/slope/profile/points/1/1',
      /slopes 10.1 %/,
    ],
    [
      'a first point behind the start',
      line([
        [10, 0],
        [900, 3],
      ]),
      'contradiction /runway/slope/profile/points/0/0',
      /after the start point/,
    ],
    [
      'an end short of TORA',
      line([
        [0, 0],
        [899, 3],
      ]),
      'contradiction /runway/slope/profile/points/1/0',
      /before the end of TORA 900 m/,
    ],
  ])('refuses %s by name', (_, slope, fault, says) => {
    const faults = faultsIn(withSlope(slope));
    expect(named(faults)).toEqual([fault]);
    expect(faults[0]?.message).toMatch(says);
  });

  it('takes a stretch of exactly 10 %, and a line that ends exactly where TORA does', () => {
    expect(
      faultsIn(
        withSlope(
          line([
            [0, 0],
            [100, 10],
            [900, 10],
          ]),
        ),
      ),
    ).toEqual([]);
  });

  it('asks for a declared distance to cover', () => {
    const nothing = withMember(plain, '/runway/declared', undefined);
    expect(
      named(
        faultsIn(
          withSlope(
            line([
              [0, 0],
              [900, 3],
            ]),
            nothing,
          ),
        ),
      ),
    ).toEqual(['missing /runway/declared']);
  });

  it('is not half a slope and half a profile', () => {
    const both = {
      value: 1,
      unit: 'percent',
      profile: {
        units: ['m', 'm'],
        points: [
          [0, 0],
          [900, 3],
        ],
      },
    };
    expect(takeoffRequest.safeParse(withMember(plain, '/runway/slope', both)).success).toBe(false);
    expect(takeoffRequest.safeParse(withSlope(line([[0, 0]]))).success).toBe(false);
  });
});
