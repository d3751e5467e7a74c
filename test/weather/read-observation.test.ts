import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { notUnderstood, textOf } from '../../src/weather/observation.ts';
import { readObservation } from '../../src/weather/read-observation.ts';
import { isReportRefused } from '../../src/weather/report-fault.ts';
import { expectNear } from '../support/near.ts';
import { malformed } from './malformed.ts';
import { observed } from './observed.ts';
import { wellFormed } from './well-formed.ts';

const unitIn = { kt: 1852 / 3600, 'm/s': 1, 'km/h': 1 / 3.6 };
const rad = (degrees: number) => (degrees * Math.PI) / 180;

describe('well-formed reports of many habits', () => {
  it('are at least 60', () => expect(wellFormed.length).toBeGreaterThanOrEqual(60));

  it.each(wellFormed)('$report', (expected) => {
    const read = observed(expected.report);
    const { wind } = expected;
    if (wind === undefined || typeof wind === 'string') expect(read.wind?.kind).toBe(wind);
    else {
      const found = read.wind as { speed?: { value: number }; gust?: { value: number }; from?: { value: number } };
      expect(read.wind?.kind).toBe(wind.from === 'variable' ? 'variable' : 'from');
      expectNear(found.speed?.value, wind.speed * unitIn[wind.unit], 1e-9);
      if (wind.from !== 'variable') expectNear(found.from?.value, rad(wind.from), 1e-12);
      if (wind.gust === undefined) expect(found.gust).toBeUndefined();
      else expectNear(found.gust?.value, wind.gust * unitIn[wind.unit], 1e-9);
      const sector = (read.wind as { sector?: { from: number; to: number } }).sector;
      if (wind.sector === undefined) expect(sector).toBeUndefined();
      else {
        expectNear(sector?.from, rad(wind.sector[0]), 1e-12);
        expectNear(sector?.to, rad(wind.sector[1]), 1e-12);
      }
    }
    for (const name of ['temperature', 'dewPoint'] as const) {
      const degrees = expected[name];
      if (degrees === undefined) expect(read[name], name).toBeUndefined();
      else expectNear(read[name]?.value, degrees + 273.15, 1e-9);
    }
    if (expected.hPa !== undefined) expectNear(read.qnh?.value, expected.hPa * 100, 1e-9);
    else if (expected.inHg !== undefined) expectNear(read.qnh?.value, expected.inHg * 3386.389, 1e-6);
    else expect(read.qnh).toBeUndefined();
    expect(notUnderstood(read.groups).map(({ token }) => token)).toEqual(expected.notUnderstood ?? []);
    expect(read.runwayStates.length).toBe(expected.runwayStates ?? 0);
    expect(textOf(read.groups, 'trend')).toBe(expected.trend);
  });

  it.each(wellFormed)('every group of "$report" has its place and is named once', ({ report }) => {
    const { groups } = observed(report);
    for (const { at, token } of groups) expect(report.slice(at, at + token.length)).toBe(token);
    expect(groups.map(({ token }) => token)).toEqual(report.replace('=', ' ').split(' ').filter(Boolean));
  });
});

describe('malformed reports', () => {
  it('are at least 60', () => expect(malformed.length).toBeGreaterThanOrEqual(60));

  it.each(malformed)('$report', ({ report, faults }) => {
    const read = readObservation(report);
    if (!isReportRefused(read)) throw new Error('it was read');
    expect(read.refused.map(({ code, at, token }) => [code, at, token])).toEqual(faults);
    for (const { message, allowed, hint } of read.refused) {
      expect(message).toMatch(/^[^.].*\.$/);
      expect(allowed).not.toBe('');
      expect(hint).not.toBe('');
    }
  });
});

describe('marks and remarks', () => {
  it('names kind, station, time and marks', () => {
    const { kind, station, time, automatic, corrected, nil } = observed('SPECI ZZ9A 310007Z AUTO 27015KT 18/09 Q1013');
    expect({ kind, station, time, automatic, corrected, nil }).toEqual({
      kind: 'SPECI',
      station: 'ZZ9A',
      time: { day: 31, hour: 0, minute: 7 },
      automatic: true,
      corrected: false,
      nil: false,
    });
    expect(observed('METAR ZZAA 011250Z CCB 27015KT').corrected).toBe(true);
    expect(observed('METAR ZZAA 011250Z NIL=').nil).toBe(true);
  });

  it('never takes SLP for a QNH, nor a remark for what the body does not report', () => {
    const read = observed('METAR ZZAA 011250Z 27015KT 10SM RMK AO2 SLP133 T01230045 A2992');
    expect([read.qnh, read.temperature, read.dewPoint]).toEqual([undefined, undefined, undefined]);
  });

  it('takes no tenths where two are given', () => {
    const read = observed('METAR ZZAA 011250Z 27015KT 10SM 12/05 A2992 RMK T01230045 T01210045');
    expectNear(read.temperature?.value, 285.15, 1e-9);
  });

  it('takes no sector of a calm', () => {
    const read = observed('METAR ZZAA 011250Z 00000KT 180V240 9999 18/09 Q1013');
    expect(notUnderstood(read.groups)).toEqual([{ at: 27, token: '180V240', as: 'not-understood' }]);
  });
});

describe('any text', () => {
  /** Texts that begin well, so that the body is reached, and go on with scraps of groups. */
  const scraps = fc.constantFrom(
    '0',
    '00000',
    '27015',
    'KT',
    'MPS',
    'G',
    'VRB',
    '/',
    '//',
    'P99',
    'V',
    'Q',
    '1013',
    'A',
    'M',
    'R27',
    ' ',
    ' ',
    'T',
    'RMK',
    'SM',
    'FM',
    'O',
  );
  const texts = fc.oneof(
    fc.string({ maxLength: 512 }),
    fc.string({ unit: 'grapheme-ascii', maxLength: 512 }),
    fc.array(scraps, { maxLength: 40 }).map((parts) => `METAR ZZAA 011250Z ${parts.join('')}`),
  );
  const calmGroup = /(?:^| )00000(?:KT|MPS|KMH)(?: |=|$)/;

  test.prop([texts], { numRuns: 3000 })('never throws, and is calm only by the group for calm', (text) => {
    const read = readObservation(text);
    if (isReportRefused(read)) {
      expect(read.refused.length).toBeGreaterThan(0);
      return;
    }
    if (read.wind?.kind === 'calm') expect(text).toMatch(calmGroup);
    if (read.wind?.kind === 'from' || read.wind?.kind === 'variable') {
      expect(read.wind.speed.value).toBeGreaterThan(0);
      expect(Number.isFinite(read.wind.gust?.value ?? 0)).toBe(true);
    }
  });

  it('of 512 bytes is read in under 2 ms', () => {
    const longest = (piece: string) => `METAR ZZAA 011250Z ${piece.repeat(512)}`.slice(0, 512);
    const worst = ['1', 'M', '/', '1 ', '27015G', 'RASNRASN', 'R27/1200V', 'A A ', 'XKT', '//', 'Q1013 ', '-'].map(
      longest,
    );
    for (const text of worst) {
      let least = Number.POSITIVE_INFINITY;
      for (let run = 0; run < 20; run++) {
        const start = performance.now();
        readObservation(text);
        least = Math.min(least, performance.now() - start);
      }
      expect(least, text.slice(0, 40)).toBeLessThan(2);
    }
  });
});
