import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { forecastHours, type HoursAsked } from '../../src/weather/forecast-hours.ts';
import { givenHours } from '../../src/weather/hours.ts';
import { type Instant, instantText, readInstant } from '../../src/weather/instant.ts';
import { notUnderstood } from '../../src/weather/observation.ts';
import { readForecast } from '../../src/weather/read-forecast.ts';
import { isReportRefused } from '../../src/weather/report-fault.ts';
import { expectNear } from '../support/near.ts';
import { forecastOf, unrefused } from './observed.ts';

const knot = 1852 / 3600;
const at = (text: string) => readInstant(text) as Instant;
const asOf = at('2026-12-01T11:30:00Z');

/** Hour, winds that can hold (knots) with their groups, what is missing: a line an hour. */
function lines(report: string, from: string, to: string, more: Partial<HoursAsked> = {}): string[] {
  const hours = unrefused(forecastHours(forecastOf(report), { asOf, from: at(from), to: at(to), ...more }));
  return hours.map(({ at: begins, winds, missing }) => {
    const told = winds.map(({ wind, because, heading, percent }) => {
      const speed = 'speed' in wind ? Math.round(wind.speed / knot) : 0;
      return `${speed} ${because}${heading === undefined ? '' : ` (${heading})`}${percent === undefined ? '' : ` ${percent} %`}`;
    });
    return [instantText(begins).slice(8, 16), ...told, ...missing.map((name) => `no ${name}`)].join(', ');
  });
}
const dry = { pressure: { kind: 'qnh', value: 101_300 }, temperatures: [] } as const;

describe('the hours of a forecast', () => {
  it('are its first part, and FM replaces it at its moment', () => {
    const report = 'TAF ZZAA 011100Z 0112/0218 27010KT 9999 SCT030 FM011430 30018G30KT 9999 BKN020';
    expect(lines(report, '2026-12-01T12:00:00Z', '2026-12-01T16:00:00Z', dry)).toEqual([
      '01T12:00, 10 base, no temperature',
      '01T13:00, 10 base, no temperature',
      '01T14:00, 10 base, 18 from (FM011430), no temperature',
      '01T15:00, 18 from (FM011430), no temperature',
      '01T16:00, 18 from (FM011430), no temperature',
    ]);
  });

  it('have both winds while BECMG lasts', () => {
    const report = 'TAF ZZAA 011100Z 0112/0218 27010KT 9999 BECMG 0114/0116 33005KT BECMG 0117/0118 3000 BR';
    expect(lines(report, '2026-12-01T13:00:00Z', '2026-12-01T17:00:00Z', dry)).toEqual([
      '01T13:00, 10 base, no temperature',
      '01T14:00, 10 base, 5 becoming (BECMG 0114/0116), no temperature',
      '01T15:00, 10 base, 5 becoming (BECMG 0114/0116), no temperature',
      '01T16:00, 5 becoming (BECMG 0114/0116), no temperature',
      '01T17:00, 5 becoming (BECMG 0114/0116), no temperature',
    ]);
  });

  it('have TEMPO, INTER and PROB beside what prevails, where they tell of a wind', () => {
    const report =
      'TAF ZZAA 011100Z 0112/0212 27010KT CAVOK TEMPO 0113/0115 4000 SHRA PROB30 0114/0116 25024G40KT PROB40 TEMPO 0115/0117 VRB25G45KT TSRA INTER 0116/0118 28015KT';
    expect(lines(report, '2026-12-01T13:00:00Z', '2026-12-01T18:00:00Z', dry)).toEqual([
      '01T13:00, 10 base, no temperature',
      '01T14:00, 10 base, 24 probable (PROB30 0114/0116) 30 %, no temperature',
      '01T15:00, 10 base, 24 probable (PROB30 0114/0116) 30 %, 25 temporary (PROB40 TEMPO 0115/0117) 40 %, no temperature',
      '01T16:00, 10 base, 25 temporary (PROB40 TEMPO 0115/0117) 40 %, 15 temporary (INTER 0116/0118), no temperature',
      '01T17:00, 10 base, 15 temporary (INTER 0116/0118), no temperature',
      '01T18:00, 10 base, no temperature',
    ]);
  });

  it('end with the forecast, across the end of a month', () => {
    const report = 'TAF ZZAA 311700Z 3118/0118 09012KT CAVOK FM010000 12008KT CAVOK';
    const newYear = { ...dry, asOf: at('2027-01-01T08:00:00Z') };
    expect(lines(report, '2026-12-31T17:00:00Z', '2026-12-31T18:00:00Z', newYear)).toEqual([
      '31T17:00, no wind, no temperature',
      '31T18:00, 12 base, no temperature',
    ]);
    expect(lines(report, '2026-12-31T23:00:00Z', '2027-01-01T00:00:00Z', newYear)).toEqual([
      '31T23:00, 12 base, no temperature',
      '01T00:00, 8 from (FM010000), no temperature',
    ]);
    expect(lines(report, '2027-01-01T17:00:00Z', '2027-01-01T18:00:00Z', newYear)).toEqual([
      '01T17:00, 8 from (FM010000), no temperature',
      '01T18:00, no wind, no temperature',
    ]);
  });

  it('take hour 24 for the end of a day', () => {
    const report = 'TAF ZZAA 011100Z 0112/0124 27010KT CAVOK BECMG 0122/0124 33020KT';
    expect(lines(report, '2026-12-01T21:00:00Z', '2026-12-02T00:00:00Z', dry)).toEqual([
      '01T21:00, 10 base, no temperature',
      '01T22:00, 10 base, 20 becoming (BECMG 0122/0124), no temperature',
      '01T23:00, 10 base, 20 becoming (BECMG 0122/0124), no temperature',
      '02T00:00, no wind, no temperature',
    ]);
  });

  it('have no wind where one that can hold cannot be told', () => {
    const hour = ['2026-12-01T14:00:00Z', '2026-12-01T14:00:00Z'] as const;
    const none = ['01T14:00, no wind, no temperature'];
    expect(lines('TAF ZZAA 011100Z 0112/0218 27010KT CAVOK FM011400 9999 SCT030', ...hour, dry)).toEqual(none);
    expect(lines('TAF ZZAA 011100Z 0112/0218 27010KT TEMPO 0113/0115 270P99KT', ...hour, dry)).toEqual(none);
    expect(lines('TAF ZZAA 011100Z 0112/0218 CAVOK TEMPO 0113/0115 27030KT', ...hour, dry)).toEqual(none);
    expect(lines('TAF ZZAA 011100Z NIL', ...hour, dry)).toEqual(none);
    expect(lines('TAF AMD ZZAA 011100Z 0112/0218 CNL', ...hour, dry)).toEqual(none);
  });

  it('interpolate temperatures between a highest and a lowest, and only there', () => {
    const report = 'TAF ZZAA 011100Z 0112/0218 27010KT CAVOK TX25/0114Z TN05/0204Z';
    const asked = { asOf, from: at('2026-12-01T13:00:00Z'), to: at('2026-12-02T05:00:00Z') };
    const hours = unrefused(forecastHours(forecastOf(report), asked));
    const of = (text: string) => hours.find((hour) => hour.at === at(text))?.temperature;
    expect(of('2026-12-01T13:00:00Z')).toBeUndefined();
    expectNear(of('2026-12-01T14:00:00Z')?.value, 273.15 + 25, 1e-9);
    // half way of 14 hours: 15; a quarter, at 17:30, would be 15 + 10 cos 45; at 21:00 x = 1/2, at 16:00 x = 1/7
    expectNear(of('2026-12-01T21:00:00Z')?.value, 273.15 + 15, 1e-9);
    expectNear(of('2026-12-01T16:00:00Z')?.value, 273.15 + 15 + 10 * 0.9009688679, 1e-8);
    expectNear(of('2026-12-01T16:00:00Z')?.low, 273.15 + 4.5, 1e-9);
    expectNear(of('2026-12-01T16:00:00Z')?.high, 273.15 + 25.5, 1e-9);
    expectNear(of('2026-12-02T04:00:00Z')?.value, 273.15 + 5, 1e-9);
    expect(of('2026-12-02T05:00:00Z')).toBeUndefined();
    const two = 'TAF ZZAA 011100Z 0112/0218 27010KT CAVOK TX25/0114Z TX27/0215Z';
    const between = unrefused(forecastHours(forecastOf(two), asked)).map(({ temperature }) => temperature);
    expect(between.filter((one) => one !== undefined)).toHaveLength(1);
  });

  it('take listed figures first, and one pressure for all', () => {
    const report = 'TAF ZZAA 011100Z 0112/0218 27010KT CAVOK TX25/0114Z TNM05/0204Z';
    const [first, second] = [at('2026-12-01T14:00:00Z'), at('2026-12-01T15:00:00Z')];
    const metar = { kind: 'qnh', value: 101_300 } as const;
    const listed = { kind: 'qnh', value: 100_900 } as const;
    const hours = unrefused(
      forecastHours(forecastOf(report), {
        asOf,
        from: first,
        to: second,
        temperatures: [{ at: first, value: 290 }],
        pressures: [{ at: second, value: listed }],
        pressure: metar,
      }),
    );
    expect(hours[0]?.temperature).toEqual({ value: 290, because: 'given' });
    expect(hours[1]?.temperature?.because).toBe('between-extremes');
    expect(hours.map(({ pressure }) => pressure)).toEqual([metar, listed]);
    expect(hours.map(({ missing }) => missing)).toEqual([[], []]);
  });

  it('refuse changes that lie outside the forecast, and a forecast without length', () => {
    const refused = (report: string) => {
      const read = forecastHours(forecastOf(report), { asOf, from: asOf, to: asOf });
      return isReportRefused(read) ? read.refused.map(({ code, at: place, token }) => [code, place, token]) : [];
    };
    expect(refused('TAF ZZAA 011100Z 0112/0118 27010KT BECMG 0119/0121 33020KT')).toEqual([
      ['contradiction', 35, 'BECMG 0119/0121'],
    ]);
    expect(refused('TAF ZZAA 011100Z 0112/0118 27010KT FM011000 33020KT')).toEqual([['contradiction', 35, 'FM011000']]);
    expect(refused('TAF ZZAA 011100Z 0112/0118 27010KT TEMPO 0116/0114 33020KT')).toEqual([
      ['contradiction', 35, 'TEMPO 0116/0114'],
    ]);
    expect(refused('TAF ZZAA 011100Z 0112/0112 27010KT')).toEqual([['out-of-range', 17, '0112/0112']]);
    expect(refused('TAF ZZAA 011100Z 0112/0110 27010KT')).toEqual([['out-of-range', 17, '0112/0110']]);
  });

  it('name what was asked the wrong way round', () => {
    const forecast = forecastOf('TAF ZZAA 011100Z 0112/0118 27010KT');
    expect(() => forecastHours(forecast, { asOf, from: asOf, to: asOf - 1 })).toThrow(/^to must/);
    expect(() => forecastHours(forecast, { asOf, from: asOf, to: Number.NaN })).toThrow(/^to must/);
    expect(() => forecastHours(forecast, { asOf, from: 0, to: asOf })).toThrow(/^to must/);
  });
});

describe('a forecast', () => {
  it.each([
    ['TAF ZZAA 011100Z 0112/0218 27010 9999', 'unreadable', 27, '27010'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT 30015KT', 'contradiction', 35, '30015KT'],
    ['TAF ZZAA 011100Z 011218 27010KT', 'unreadable', 17, '011218'],
    ['TAF ZZAA 011100Z 27010KT', 'unreadable', 17, '27010KT'],
    ['TAF ZZAA 011100Z', 'missing', 16, ''],
    ['TAF ZZAA 011100Z 0112/0225 27010KT', 'out-of-range', 17, '0112/0225'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT FM1430 30015KT', 'unreadable', 35, 'FM1430'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT TEMPO 30015KT', 'unreadable', 41, '30015KT'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT PROB20 0114/0116 30015KT', 'unreadable', 35, 'PROB20'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT PROB30', 'unreadable', 35, 'PROB30'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT TX65/0114Z', 'out-of-range', 35, 'TX65/0114Z'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT TX25/14Z', 'unreadable', 35, 'TX25/14Z'],
    ['TAF ZZAA 011100Z 0112/0218 27010KT ZZAB 011100Z', 'exactly-one-of', 40, '011100Z'],
    ['METAR ZZAA 011250Z 27015KT 18/09 Q1013', 'unreadable', 0, 'METAR'],
  ] as const)('%s is refused', (report, code, place, token) => {
    const read = readForecast(report);
    if (!isReportRefused(read)) throw new Error('it was read');
    expect(read.refused[0]).toMatchObject({ code, at: place, token });
  });

  it('takes neither shear aloft nor turbulence nor remarks for a wind', () => {
    const { changes, wind, groups } = forecastOf(
      'TAF ZZAA 011100Z 0112/0218 27010KT P6SM WS020/24045KT QNH2979INS BECMG 0114/0116 9999 510104 RMK 30045KT',
    );
    expect(wind).toMatchObject({ kind: 'from' });
    expect(changes).toHaveLength(1);
    expect(changes[0]?.wind).toBeUndefined();
    expect(notUnderstood(groups)).toEqual([]);
  });

  it('says what is amended, corrected, nil and cancelled', () => {
    expect(forecastOf('TAF AMD ZZAA 011100Z 0112/0218 27010KT')).toMatchObject({ amended: true, corrected: false });
    expect(forecastOf('TAF COR ZZAA 011100Z 0112/0218 27010KT')).toMatchObject({ amended: false, corrected: true });
    expect(forecastOf('TAF ZZAA 011100Z NIL=')).toMatchObject({ nil: true });
    expect(forecastOf('TAF AMD ZZAA 011100Z 0112/0218 CNL=')).toMatchObject({ cancelled: true });
  });

  const scraps = fc.constantFrom(
    'FM011400',
    'BECMG',
    'TEMPO',
    'PROB30',
    '0114/0116',
    '27010KT',
    '00000KT',
    '0',
    'KT',
    'TX25/0114Z',
    'P6SM',
    'RMK',
    'VRB',
    '//',
    'G30',
  );
  const texts = fc.array(scraps, { maxLength: 40 }).map((parts) => `TAF ZZAA 011100Z 0112/0218 ${parts.join(' ')}`);
  test.prop([texts], { numRuns: 1000 })(
    'of any groups never throws, and is calm only by the group for calm',
    (text) => {
      const read = readForecast(text);
      if (isReportRefused(read)) return;
      const hours = forecastHours(read, { asOf, from: at('2026-12-01T12:00:00Z'), to: at('2026-12-02T17:00:00Z') });
      if (isReportRefused(hours)) return;
      expect(hours).toHaveLength(30);
      const calm = hours.some(({ winds }) => winds.some(({ wind }) => wind.kind === 'calm'));
      if (calm) expect(text).toContain('00000KT');
      for (const { winds, missing } of hours) expect(winds.length === 0).toBe(missing.includes('wind'));
    },
  );
});

describe('hours of a list', () => {
  it('are as given', () => {
    const given = {
      at: asOf,
      wind: { kind: 'calm' },
      temperature: 288.15,
      pressure: { kind: 'qnh', value: 101_325 },
    } as const;
    expect(givenHours([given])).toEqual([
      {
        at: asOf,
        winds: [{ wind: { kind: 'calm' }, because: 'given' }],
        temperature: { value: 288.15, because: 'given' },
        pressure: { kind: 'qnh', value: 101_325 },
        missing: [],
      },
    ]);
  });
});
