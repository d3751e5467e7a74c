import { describe, expect, it } from 'vitest';
import { isReportRefused } from '../../src/weather/report-fault.ts';
import { type GivenBeside, reportedWeather, windOf } from '../../src/weather/reported-weather.ts';
import { expectNear } from '../support/near.ts';
import { observed, unrefused } from './observed.ts';

const knot = 1852 / 3600;
const weather = (report: string, given?: GivenBeside) => unrefused(reportedWeather(observed(report), given));
const faults = (report: string, given?: GivenBeside) => {
  const read = reportedWeather(observed(report), given);
  return isReportRefused(read) ? read.refused.map(({ code, at, token, hint }) => ({ code, at, token, hint })) : [];
};
const full = 'METAR ZZAA 011250Z 27015G25KT 240V310 9999 18/09 Q1013';

describe('the weather of a report', () => {
  it('is that of its groups, directions from true north', () => {
    const { temperature, dewPoint, pressure, wind } = weather(full);
    expectNear(temperature, 291.15, 1e-9);
    expectNear(dewPoint, 282.15, 1e-9);
    expect(pressure).toEqual({ kind: 'qnh', value: 101_300 });
    expect(wind).toMatchObject({ kind: 'from', fromReference: 'true' });
    if (wind.kind !== 'from') throw new Error(wind.kind);
    expectNear(wind.from, (270 * Math.PI) / 180, 1e-12);
    expectNear(wind.speed, 15 * knot, 1e-12);
    expectNear(wind.gust, 25 * knot, 1e-12);
    expectNear(wind.variable?.from, (240 * Math.PI) / 180, 1e-12);
    expectNear(wind.variable?.to, (310 * Math.PI) / 180, 1e-12);
  });

  it('takes what is given beside it first, and no dew point beside another temperature', () => {
    const given = {
      temperature: 280,
      wind: { kind: 'calm' },
      pressure: { kind: 'stationPressure', value: 95_000 },
    } as const;
    expect(weather(full, given)).toEqual(given);
  });

  it('keeps a dew point of whole degrees up to a temperature of tenths', () => {
    const { temperature, dewPoint } = weather('METAR ZZAA 011251Z 27015KT 12/12 A2992 RMK T0116');
    expectNear(temperature, 273.15 + 11.6, 1e-9);
    expect(dewPoint).toBe(temperature);
  });

  it('is refused where a needed member is missing, by name and with what may be given', () => {
    expect(faults('METAR ZZAA 011250Z NIL')).toEqual([
      { code: 'missing', at: 22, token: '', hint: 'give the temperature beside the report' },
      { code: 'missing', at: 22, token: '', hint: 'give the pressure beside the report' },
      { code: 'missing', at: 22, token: '', hint: 'give the wind beside the report' },
    ]);
    expect(faults('METAR ZZAA 011250Z AUTO /////KT 18/09 Q1013')).toEqual([
      { code: 'missing', at: 24, token: '/////KT', hint: 'give the wind beside the report' },
    ]);
    expect(faults('METAR ZZAA 011250Z 270P99KT 18/09 Q1013')).toEqual([
      { code: 'out-of-range', at: 19, token: '270P99KT', hint: 'give the wind beside the report' },
    ]);
    expect(faults('METAR ZZAA 011250Z /////KT 18/09 Q1013', { wind: { kind: 'calm' } })).toEqual([]);
  });
});

describe('a reported wind', () => {
  it('from any direction stays one, with its gust', () => {
    const { wind } = observed('METAR ZZAA 011250Z VRB08G20KT 18/09 Q1013');
    const found = windOf(wind);
    expect(found).toMatchObject({ kind: 'variable' });
    expectNear((found as { gust?: number }).gust, 20 * knot, 1e-12);
  });
  it('that is none has a name', () => {
    expect(windOf(undefined)).toBe('not-reported');
    expect(windOf({ kind: 'not-reported' })).toBe('not-reported');
    expect(windOf({ kind: 'beyond-scale', atLeast: 51 })).toBe('beyond-scale');
    expect(windOf(observed('METAR ZZAA 011250Z 00000KT').wind)).toEqual({ kind: 'calm' });
  });
});
