import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { instantFrom, instantNear, reportAge } from '../../src/weather/day-time.ts';
import { type Instant, instantText, readInstant } from '../../src/weather/instant.ts';

const at = (text: string) => readInstant(text) as Instant;

describe('a day without a month', () => {
  it.each([
    [1, 12, 50, '2026-12-01T13:00:00Z', '2026-12-01T12:50:00Z'],
    [30, 23, 50, '2026-12-01T00:10:00Z', '2026-11-30T23:50:00Z'],
    [31, 23, 50, '2027-01-01T00:10:00Z', '2026-12-31T23:50:00Z'],
    [1, 0, 10, '2026-12-31T23:50:00Z', '2027-01-01T00:10:00Z'],
    [31, 12, 0, '2026-02-14T12:00:00Z', '2026-01-31T12:00:00Z'],
    [29, 12, 0, '2027-02-27T12:00:00Z', '2027-01-29T12:00:00Z'],
    [29, 12, 0, '2027-02-28T12:00:00Z', '2027-03-29T12:00:00Z'],
    [29, 12, 0, '2028-03-01T00:00:00Z', '2028-02-29T12:00:00Z'],
    [1, 0, 0, '2026-11-16T00:00:00Z', '2026-11-01T00:00:00Z'],
    [31, 24, 0, '2027-01-01T00:00:00Z', '2027-01-01T00:00:00Z'],
  ])('day %d, %d:%d near %s is %s', (day, hour, minute, near, expected) => {
    expect(instantText(instantNear({ day, hour, minute }, at(near)))).toBe(expected);
  });

  it('goes on from a moment to the first that fits', () => {
    const first = (day: number, hour: number, from: string) =>
      instantText(instantFrom({ day, hour, minute: 0 }, at(from)));
    expect(first(1, 12, '2026-12-01T12:00:00Z')).toBe('2026-12-01T12:00:00Z');
    expect(first(1, 11, '2026-12-01T12:00:00Z')).toBe('2027-01-01T11:00:00Z');
    expect(first(1, 6, '2026-12-31T12:00:00Z')).toBe('2027-01-01T06:00:00Z');
    expect(first(31, 24, '2027-01-01T00:00:00Z')).toBe('2027-01-01T00:00:00Z');
    expect(first(31, 6, '2026-02-01T00:00:00Z')).toBe('2026-03-31T06:00:00Z');
  });

  const times = fc.record({ day: fc.integer({ min: 1, max: 31 }), hour: fc.nat(23), minute: fc.nat(59) });
  test.prop([times, fc.integer({ min: 0, max: 4e9 })])(
    'is within 31 days, and has the day and the time',
    (time, near) => {
      const found = instantNear(time, near);
      expect(Math.abs(found - near)).toBeLessThanOrEqual(31 * 86_400);
      const date = new Date(found * 1000);
      expect([date.getUTCDate(), date.getUTCHours(), date.getUTCMinutes()]).toEqual([time.day, time.hour, time.minute]);
      expect(instantFrom(time, near)).toBeGreaterThanOrEqual(near);
    },
  );

  it('gives a report its age, below 0 for one of a later time', () => {
    expect(reportAge({ day: 1, hour: 12, minute: 50 }, at('2026-12-01T13:20:00Z'))).toBe(1800);
    expect(reportAge({ day: 1, hour: 0, minute: 5 }, at('2026-11-30T23:55:00Z'))).toBe(-600);
  });
});
