import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { civilDate, daysOfMonth, daysSince1970, instantText, readInstant } from '../../src/weather/instant.ts';

describe('moments', () => {
  it.each([
    ['1970-01-01T00:00:00Z', 0],
    ['2000-02-29T12:00:00Z', 951_825_600],
    ['2026-12-01T16:00:30.5Z', 1_796_140_830.5],
    ['2026-12-01T17:00:00+01:00', 1_796_140_800],
    ['2026-12-01T10:30:00-05:30', 1_796_140_800],
    ['1969-12-31T23:59:59Z', -1],
  ])('%s is %d s since 1970', (text, seconds) => expect(readInstant(text)).toBe(seconds));

  it.each([
    '2026-02-29T00:00:00Z',
    '2026-13-01T00:00:00Z',
    '2026-00-01T00:00:00Z',
    '2026-01-00T00:00:00Z',
    '2026-01-01T24:00:00Z',
    '2026-01-01T00:60:00Z',
    '2026-01-01T00:00:00',
    '2026-01-01 00:00:00Z',
    '2026-01-01',
    '',
  ])('"%s" is none', (text) => expect(readInstant(text)).toBeUndefined());

  test.prop([fc.date({ min: new Date('1800-01-01'), max: new Date('2400-01-01'), noInvalidDate: true })])(
    'agree with the calendar of the language',
    (date) => {
      const text = `${date.toISOString().slice(0, 19)}Z`;
      const seconds = Math.floor(date.getTime() / 1000);
      expect(readInstant(text)).toBe(seconds);
      expect(instantText(seconds)).toBe(text);
      const days = Math.floor(seconds / 86_400);
      expect(civilDate(days)).toEqual({
        years: date.getUTCFullYear(),
        months: date.getUTCMonth() + 1,
        days: date.getUTCDate(),
      });
      expect(daysSince1970(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate())).toBe(days);
      expect(daysOfMonth(date.getUTCFullYear(), date.getUTCMonth() + 1)).toBe(
        new Date(Date.UTC(date.getUTCFullYear(), date.getUTCMonth() + 1, 0)).getUTCDate(),
      );
    },
  );
});
