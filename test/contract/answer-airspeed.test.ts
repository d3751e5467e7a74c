import { describe, expect, it } from 'vitest';
import {
  type AirspeedRequest,
  type AirspeedResponse,
  airspeedRequest,
  airspeedResponse,
} from '../../src/contract/airspeed.ts';
import { answerAirspeed } from '../../src/contract/answer-airspeed.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { trueAirspeeds } from '../published/airspeeds.ts';
import { named, sampleDefinition, sampleLookup, withMember } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const bare = withMember({ ...sampleDefinition(), id: 'bare-tourer' }, '/airspeedCalibration', undefined);
const lookup = sampleLookup(sampleDefinition(), bare);
const weather = {
  temperature: { value: 10, unit: 'degC' },
  pressure: { pressureAltitude: { value: 5000, unit: 'ft' } },
} as const;

function told(request: AirspeedRequest): AirspeedResponse {
  expect(airspeedRequest.safeParse(request).error).toBeUndefined();
  const answer = answerAirspeed(request, lookup, stamp);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer));
  expect(airspeedResponse.safeParse(answer).error).toBeUndefined();
  return answer;
}

function faultsIn(request: AirspeedRequest) {
  const answer = answerAirspeed(request, lookup, stamp);
  return isRefused(answer) ? named(answer.refused) : [];
}

describe('one speed in all its kinds', () => {
  it.each(trueAirspeeds)('$title', ({ inputs, expected, tolerance }) => {
    const standard = Math.max(15 - 0.0019812 * inputs.pressure_altitude_ft, -56.5);
    const { speed } = told({
      speed: { cas: { value: inputs.cas_kt, unit: 'kt' } },
      weather: {
        temperature: { value: standard + inputs.isa_dev_C, unit: 'degC' },
        pressure: { pressureAltitude: { value: inputs.pressure_altitude_ft, unit: 'ft' } },
      },
      rounding: 'none',
    });
    expect(Math.abs((speed?.tas.value as number) - expected)).toBeLessThanOrEqual(tolerance);
  });

  it('is the same speed whichever kind it is given in', () => {
    const aeroplane = { id: 'sample-tourer' };
    const first = told({ aeroplane, speed: { cas: { value: 80, unit: 'kt' } }, weather, rounding: 'none' }).speed;
    if (first?.ias === undefined) throw new Error('no indicated airspeed');
    const { eas, tas, mach, ias } = first as Required<typeof first>;
    for (const speed of [{ eas }, { tas }, { mach }, { ias }] as AirspeedRequest['speed'][]) {
      const again = told({ aeroplane, speed, weather, rounding: 'none' }).speed;
      expect(again?.cas.value).toBeCloseTo(80, 9);
      expect(again?.mach).toBeCloseTo(mach, 12);
    }
  });

  it('an indicated airspeed needs an aeroplane, and one with a calibration', () => {
    const speed = { ias: { value: 80, unit: 'kt' } } as const;
    expect(faultsIn({ speed, weather })).toEqual(['missing /aeroplane']);
    expect(faultsIn({ speed, weather, aeroplane: { id: 'bare-tourer' } })).toEqual(['missing /aeroplane/id']);
    expect(faultsIn({ speed, weather, aeroplane: { definition: bare } })).toEqual([
      'missing /aeroplane/definition/airspeedCalibration',
    ]);
    expect(faultsIn({ speed, weather, aeroplane: { id: 'nobody' } })).toEqual(['unknown-id /aeroplane/id']);
  });

  it('names what it cannot tell, with the air that shows it', () => {
    const aeroplane = { id: 'sample-tourer' };
    const low = told({ aeroplane, speed: { ias: { value: 39, unit: 'kt' } }, weather });
    expect([low.outcome, low.speed]).toEqual(['outside-calibration', undefined]);
    const high = { ...weather, pressure: { pressureAltitude: { value: 15, unit: 'km' } } } as const;
    const fast = told({ speed: { cas: { value: 330, unit: 'm/s' } }, weather: high });
    expect([fast.outcome, fast.speed]).toEqual(['not-subsonic', undefined]);
    expect(told({ speed: { tas: { value: 340, unit: 'm/s' } }, weather: high }).outcome).not.toBe(
      'outside-calibration',
    );
  });

  it.each(['cas', 'eas', 'tas', 'mach'])('%s of nothing is nothing', (kind) => {
    const zero = kind === 'mach' ? 0 : ({ value: 0, unit: 'kt' } as const);
    const { speed } = told({ speed: { [kind]: zero } as unknown as AirspeedRequest['speed'], weather });
    expect([speed?.cas.value, speed?.eas.value, speed?.tas.value, speed?.mach]).toEqual([0, 0, 0, 0]);
  });
});
