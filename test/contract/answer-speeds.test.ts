import { describe, expect, it } from 'vitest';
import { answerSpeeds } from '../../src/contract/answer-speeds.ts';
import { type SpeedsRequest, type SpeedsResponse, speedsRequest, speedsResponse } from '../../src/contract/speeds.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { stallSpeedsInTurns } from '../published/level-turn.ts';
import { named, sampleDefinition, sampleLookup, withMember } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const lookup = sampleLookup(sampleDefinition());

const question: SpeedsRequest = {
  aeroplane: { id: 'sample-tourer' },
  mass: { value: 1030, unit: 'kg' },
  configuration: 'takeoff-10',
  weather: {
    temperature: { value: 15, unit: 'degC' },
    pressure: { pressureAltitude: { value: 0, unit: 'm' } },
  },
  rounding: 'none',
};

function told(request: SpeedsRequest): SpeedsResponse {
  expect(speedsRequest.safeParse(request).error).toBeUndefined();
  const answer = answerSpeeds(request, lookup, stamp);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer));
  expect(speedsResponse.safeParse(answer).error).toBeUndefined();
  return answer;
}

describe('speeds from gate to gate', () => {
  it.each(stallSpeedsInTurns)('$title', ({ inputs, expected, tolerance }) => {
    const { speeds, loadFactor } = told({ ...question, bank: { value: inputs.bank_deg, unit: 'deg' } });
    const scale = inputs.stall_kt / speeds.stall.eas.value;
    expect(Math.abs((speeds.stallInBank?.eas.value as number) * scale - expected)).toBeLessThanOrEqual(tolerance);
    expect((loadFactor as number) * Math.cos((inputs.bank_deg * Math.PI) / 180)).toBeCloseTo(1, 12);
  });

  it('gives back the stated stall and lift-off speeds at their own mass, and the square root of mass at another', () => {
    const { speeds } = told(question);
    expect(speeds.stall.cas).toEqual({ value: expect.closeTo(50, 9), unit: 'kt' });
    expect(speeds.liftOff?.cas.value).toBeCloseTo(60, 9);
    expect(speeds.screen?.stallRatio).toBeCloseTo(1.25, 12);
    const light = told({ ...question, mass: { value: 1030 * 0.81, unit: 'kg' } }).speeds;
    expect(light.stall.eas.value / speeds.stall.eas.value).toBeCloseTo(0.9, 12);
  });

  it('shows landing speeds for a landing configuration, and no takeoff speeds', () => {
    const { speeds } = told({ ...question, configuration: 'landing-full' });
    expect(Object.keys(speeds)).toEqual(['stall', 'landingReference', 'touchdown']);
    expect(speeds.landingReference?.stallRatio).toBeCloseTo(1.3, 12);
  });

  it('says which takeoff speeds it took', () => {
    const silent = withMember(sampleDefinition(), '/configurations/takeoff-10/speeds', undefined);
    const { basis } = told({ ...question, aeroplane: { definition: silent } });
    expect(basis.assumed.map(({ at }) => at)).toContain(
      '/aeroplane/definition/configurations/takeoff-10/speeds/liftOff',
    );
  });

  it('refuses all that is wrong at once', () => {
    const answer = answerSpeeds(
      {
        ...question,
        configuration: 'takeoff-1',
        mass: { value: 2270, unit: 'kg' },
        weather: { ...question.weather, dewPoint: { value: 16, unit: 'degC' } },
      },
      lookup,
      stamp,
    );
    expect(isRefused(answer) && named(answer.refused)).toEqual([
      'implausible /mass',
      'unknown-id /configuration',
      'contradiction /weather/dewPoint',
    ]);
  });
});
