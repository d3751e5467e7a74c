import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { type AirRequest, type AirResponse, airRequest, airResponse } from '../../src/contract/air.ts';
import { answerAir } from '../../src/contract/answer-air.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { pressureAltitudes } from '../published/faa-knowledge-test.ts';
import { pressureAltitudeProblem } from '../published/pilots-handbook.ts';
import { dryDensityAltitudes } from '../published/standard-atmosphere-inverted.ts';
import { inOtherUnits, numbersIn } from '../support/in-other-units.ts';
import { named } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const mild = { value: 15, unit: 'degC' } as const;

function told(request: AirRequest): AirResponse {
  expect(airRequest.safeParse(request).error).toBeUndefined();
  const answer = answerAir(request, stamp);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer));
  expect(airResponse.safeParse(answer).error).toBeUndefined();
  return answer;
}

function faultsIn(request: AirRequest) {
  expect(airRequest.safeParse(request).error).toBeUndefined();
  const answer = answerAir(request, stamp);
  return isRefused(answer) ? named(answer.refused) : [];
}

describe('the air from gate to gate', () => {
  it.each([...pressureAltitudes, ...pressureAltitudeProblem])('$title', ({ inputs, expected, tolerance }) => {
    const { air } = told({
      elevation: { value: inputs.elevation_ft, unit: 'ft' },
      weather: { temperature: mild, pressure: { qnh: { value: inputs.altimeter_inHg, unit: 'inHg' } } },
      rounding: 'none',
    });
    expect(air.pressureAltitude.unit).toBe('ft');
    expect(Math.abs(air.pressureAltitude.value - expected)).toBeLessThanOrEqual(tolerance);
  });

  it.each(dryDensityAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    const { air } = told({
      weather: {
        temperature: { value: inputs.oat_C, unit: 'degC' },
        pressure: { pressureAltitude: { value: inputs.pressure_altitude_ft, unit: 'ft' } },
      },
      rounding: 'none',
    });
    expect(Math.abs(air.densityAltitude.value - expected)).toBeLessThanOrEqual(tolerance);
  });

  it('asks for the elevation only with a QNH', () => {
    expect(faultsIn({ weather: { temperature: mild, pressure: { qnh: { value: 1013, unit: 'hPa' } } } })).toEqual([
      'missing /elevation',
    ]);
    expect(
      faultsIn({ weather: { temperature: mild, pressure: { stationPressure: { value: 900, unit: 'hPa' } } } }),
    ).toEqual([]);
  });

  it('takes saturated air in whatever units the temperature and the dew point come', () => {
    // 59 degF and 15 degC are one temperature, and differ in the last bit in kelvin; so do others, either way
    for (let celsius = -40; celsius <= 40; celsius += 5) {
      const inC = { value: celsius, unit: 'degC' } as const;
      const inF = { value: celsius * 1.8 + 32, unit: 'degF' } as const;
      for (const [temperature, dewPoint] of [
        [inC, inF],
        [inF, inC],
      ] as const) {
        const pressure = { stationPressure: { value: 950, unit: 'hPa' } } as const;
        expect(told({ weather: { temperature, dewPoint, pressure } }).air.relativeHumidity?.value).toBe(100);
      }
    }
  });

  it('refuses air that is mostly vapour, and a dew point above the temperature', () => {
    const hot = { value: 60, unit: 'degC' } as const;
    const thin = { stationPressure: { value: 400, unit: 'hPa' } } as const;
    expect(faultsIn({ weather: { temperature: hot, dewPoint: hot, pressure: thin } })).toEqual([
      'implausible /weather/dewPoint',
    ]);
    expect(faultsIn({ weather: { temperature: mild, dewPoint: hot, pressure: thin } })).toEqual([
      'contradiction /weather/dewPoint',
    ]);
  });

  it('says that air without a dew point is taken as dry', () => {
    const { basis } = told({
      weather: { temperature: mild, pressure: { pressureAltitude: { value: 0, unit: 'ft' } } },
    });
    expect(basis.notGiven).toEqual(['/weather/dewPoint']);
    expect(basis.assumed.map(({ at }) => at)).toEqual(['/units', '/rounding', '/weather/dewPoint']);
  });

  const corner = (lowest: number, highest: number) => fc.oneof(fc.constant(lowest), fc.constant(highest));
  test.prop([corner(-60, 60), corner(870, 1085), corner(-500, 6000), fc.double({ min: 0, max: 30, noNaN: true })])(
    'answers or refuses at every corner of its bounds, and is the same in other units to 1e-12',
    (temperature, qnh, elevation, spread) => {
      const request: AirRequest = {
        elevation: { value: elevation, unit: 'm' },
        weather: {
          temperature: { value: temperature, unit: 'degC' },
          dewPoint: { value: Math.max(-60, temperature - spread), unit: 'degC' },
          pressure: { qnh: { value: qnh, unit: 'hPa' } },
        },
        units: 'si',
        rounding: 'none',
      };
      const answer = answerAir(request, stamp);
      if (isRefused(answer)) {
        expect(named(answer.refused)).toEqual(['implausible /weather/dewPoint']);
        return;
      }
      const other = told(inOtherUnits({ ...request, units: 'si' }));
      const theirs = numbersIn(other.air);
      numbersIn(answer.air).forEach(([path, value], i) => {
        // deviation and altitudes are small differences of large numbers: the scale is that of the large ones
        const scale = /deviation/i.test(path) ? 300 : Math.max(Math.abs(value), 1e4 * (/Altitude/.test(path) ? 1 : 0));
        expect(Math.abs((theirs[i]?.[1] as number) - value), path).toBeLessThanOrEqual(1e-12 * scale + 1e-15);
      });
    },
  );

  it.each([-1200, 7500])(
    'answers at the bound of the pressure altitude %d m at both bounds of temperature',
    (altitude) => {
      for (const value of [-60, 60]) {
        told({
          weather: {
            temperature: { value, unit: 'degC' },
            pressure: { pressureAltitude: { value: altitude, unit: 'm' } },
          },
        });
      }
    },
  );
});
