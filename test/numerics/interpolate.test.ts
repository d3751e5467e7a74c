import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { interpolate, interpolateHeld } from '../../src/numerics/interpolate.ts';
import { expectNear } from '../support/near.ts';

const axis = [0, 1, 4];
const values = [10, 12, 0];

describe('interpolate', () => {
  it('meets every row and is linear between them', () => {
    expect(axis.map((x) => interpolate(axis, values, x))).toEqual(values);
    expect(interpolate(axis, values, 0.5)).toBe(11);
    expect(interpolate(axis, values, 2.5)).toBe(6);
  });

  it('names the outside instead of extending the last piece', () => {
    expect(interpolate(axis, values, -1e-9)).toBe('outside');
    expect(interpolate(axis, values, 4.000001)).toBe('outside');
    expect(interpolate(axis, values, Number.POSITIVE_INFINITY)).toBe('outside');
  });

  it('holds a single row at its own place only', () => {
    expect(interpolate([3], [7], 3)).toBe(7);
    expect(interpolate([3], [7], 3.1)).toBe('outside');
    expect(interpolateHeld([3], [7], 99)).toBe(7);
  });

  it('holds the ends in the held form', () => {
    expect(interpolateHeld(axis, values, -5)).toBe(10);
    expect(interpolateHeld(axis, values, 5)).toBe(0);
    expect(interpolateHeld(axis, values, 2.5)).toBe(6);
  });

  it('names the parameter of a misuse', () => {
    expect(() => interpolate([], [], 1)).toThrow(/axis and values/);
    expect(() => interpolate([1, 2], [1], 1)).toThrow(/axis and values/);
    expect(() => interpolateHeld(axis, values, Number.NaN)).toThrow(/x must/);
  });

  const tables = fc
    .uniqueArray(fc.integer({ min: -1000, max: 1000 }), { minLength: 2, maxLength: 30 })
    .chain((places) =>
      fc.record({
        axis: fc.constant(places.sort((a, b) => a - b)),
        values: fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true }), {
          minLength: places.length,
          maxLength: places.length,
        }),
        share: fc.double({ min: 0, max: 1, noNaN: true }),
        piece: fc.nat({ max: places.length - 2 }),
      }),
    );

  test.prop([tables])('stays between the two rows it lies between (2 to 30 rows, values to 1e6)', (table) => {
    const x0 = table.axis[table.piece] as number;
    const x1 = table.axis[table.piece + 1] as number;
    const y0 = table.values[table.piece] as number;
    const y1 = table.values[table.piece + 1] as number;
    const y = interpolate(table.axis, table.values, Math.min(x1, x0 + table.share * (x1 - x0))) as number;
    const slack = 1e-9 * Math.max(Math.abs(y0), Math.abs(y1), 1e-300);
    expect(y).toBeGreaterThanOrEqual(Math.min(y0, y1) - slack);
    expect(y).toBeLessThanOrEqual(Math.max(y0, y1) + slack);
  });

  test.prop([fc.double({ min: -100, max: 100, noNaN: true })])('gives a straight line back, -100 to 100', (x) => {
    expectNear(interpolate([-100, -3, 0.5, 100], [-197, -3, 4, 203], x), 2 * x + 3, 1e-10);
  });
});
