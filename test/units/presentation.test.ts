import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import {
  type Direction,
  type Kind,
  roundTo,
  shown,
  stepFor,
  unitFamilies,
  unitFor,
} from '../../src/units/presentation.ts';
import { fromSi, type Quantity, scales, unitsOf } from '../../src/units/units.ts';

const kinds: Kind[] = [
  'distance',
  'altitude',
  'speed',
  'mass',
  'temperature',
  'temperatureDifference',
  'pressure',
  'density',
  'gradient',
  'angle',
  'time',
  'force',
  'area',
  'power',
  'rateOfClimb',
  'energy',
];
const directions: Direction[] = ['up', 'down', 'nearest'];
const steps = [...new Set(unitFamilies.flatMap((family) => kinds.map((kind) => stepFor(family, kind))))];

describe('rounding to a step', () => {
  it('an up that is a hair above a step stays on it: 600 x 1.3 x 1.15 and 897.0000000000001 are 897', () => {
    expect(roundTo(897.0000000000001, 1, 'up')).toBe(897);
    expect(roundTo(600 * 1.3 * 1.15, 1, 'up')).toBe(897);
    expect(roundTo(600 * 1.3 * 1.15, 1, 'down')).toBe(897);
    expect(roundTo(897.0001, 1, 'up')).toBe(898);
    expect(roundTo(896.9999, 1, 'down')).toBe(896);
  });

  it('goes in steps of 5 ft', () => {
    expect(roundTo(1001, 5, 'up')).toBe(1005);
    expect(roundTo(1004.9, 5, 'down')).toBe(1000);
    expect(roundTo(1002.4, 5, 'nearest')).toBe(1000);
    expect(roundTo(1002.6, 5, 'nearest')).toBe(1005);
    expect(roundTo(1005.0000000000001, 5, 'up')).toBe(1005);
  });

  it('a negative margin down is further from enough, a negative gradient up nearer to 0', () => {
    expect(roundTo(-46.1, 1, 'down')).toBe(-47);
    expect(roundTo(-46.1, 5, 'down')).toBe(-50);
    expect(roundTo(-46.000000000001, 1, 'down')).toBe(-46);
    expect(roundTo(-0.4, 1, 'down')).toBe(-1);
    expect(roundTo(-46.9, 1, 'up')).toBe(-46);
  });

  it('is never -0', () => {
    for (const step of steps) {
      for (const direction of directions) {
        for (const value of [-0, 0, -1e-13, -0.3 * step]) {
          expect(Object.is(roundTo(value, step, direction), -0), `${value} ${step} ${direction}`).toBe(false);
        }
      }
    }
    expect(Object.is(shown('si', 'distance', -0, 'nearest', 'none'), -0)).toBe(false);
    expect(Object.is(shown('m-kt-kg', 'speed', -0.001), -0)).toBe(false);
  });

  it('writes a short decimal: 0.1 steps give 30.3, not 30.300000000000004', () => {
    expect(String(roundTo(30.3000001, 0.1, 'nearest'))).toBe('30.3');
    expect(String(roundTo(0.94431, 0.0001, 'nearest'))).toBe('0.9443');
    expect(String(roundTo(29.9213, 0.001, 'nearest'))).toBe('29.921');
  });

  it('refuses what is no number', () => {
    expect(() => roundTo(Number.NaN, 1, 'up')).toThrow(/value/);
    expect(() => roundTo(Number.POSITIVE_INFINITY, 1, 'up')).toThrow(/value/);
  });

  test.prop([fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.constantFrom(...steps)])(
    'up is never below, down never above (1e-9 of a step or of the value apart), nearest within half a step, -1e6 to 1e6, every step in use',
    (value, step) => {
      const up = roundTo(value, step, 'up');
      const down = roundTo(value, step, 'down');
      const nearest = roundTo(value, step, 'nearest');
      const slack = 1.001e-9 * Math.max(step, Math.abs(value));
      expect(up).toBeGreaterThanOrEqual(value - slack);
      expect(up - value).toBeLessThan(step + slack);
      expect(down).toBeLessThanOrEqual(value + slack);
      expect(value - down).toBeLessThan(step + slack);
      expect(Math.abs(nearest - value)).toBeLessThanOrEqual(step / 2 + slack);
      for (const direction of directions) {
        const once = roundTo(value, step, direction);
        expect(roundTo(once, step, direction)).toBe(once);
        for (const again of directions) expect(roundTo(once, step, again)).toBe(once);
      }
    },
  );

  test.prop([
    fc.double({ min: 0, max: 1e6, noNaN: true }),
    fc.double({ min: 0, max: 1e6, noNaN: true }),
    fc.constantFrom(...steps),
  ])('a required above the available by more than a step still looks above it', (required, available, step) => {
    const shownRequired = roundTo(required, step, 'up');
    const shownAvailable = roundTo(available, step, 'down');
    if (required > available + 1e-3 * step) expect(shownRequired).toBeGreaterThan(shownAvailable - step / 2);
    if (required > available + step) expect(shownRequired).toBeGreaterThan(shownAvailable);
  });
});

describe('a number as a family shows it', () => {
  it('every kind of every family has a unit of the closed list and a positive step', () => {
    const known = [...Object.keys(scales), 'temperature'].flatMap((quantity) => unitsOf(quantity as Quantity));
    for (const family of unitFamilies) {
      for (const kind of kinds) {
        expect(known).toContain(unitFor(family, kind));
        expect(stepFor(family, kind)).toBeGreaterThan(0);
      }
    }
  });

  it('distance in 1 m or 5 ft, altitude in 1 ft or 0.1 m, speed in 0.1, mass in 1, pressure in 0.01 hPa or 0.001 inHg', () => {
    expect(shown('m-kt-kg', 'distance', 1254.2, 'up')).toBe(1255);
    expect(shown('ft-kt-lb', 'distance', 304.9, 'up')).toBe(1005);
    expect(shown('ft-kt-lb', 'distance', 304.8, 'up')).toBe(1000);
    expect(shown('m-kt-kg', 'altitude', 304.8)).toBe(1000);
    expect(shown('si', 'altitude', 304.84)).toBe(304.8);
    expect(shown('m-kt-kg', 'speed', 30)).toBe(58.3);
    expect(shown('ft-kt-lb', 'mass', 1000)).toBe(2205);
    expect(shown('m-kt-kg', 'pressure', 101_325.4)).toBe(1013.25);
    expect(shown('ft-kt-lb', 'pressure', 101_325)).toBe(29.921);
    expect(shown('m-kt-kg', 'temperature', 288.15)).toBe(15);
    expect(shown('m-kt-kg', 'gradient', 0.023456)).toBe(2.35);
    expect(shown('m-kt-kg', 'density', 0.9443140278667532)).toBe(0.9443);
  });

  test.prop([
    fc.constantFrom(...unitFamilies),
    fc.constantFrom<Kind>('distance', 'speed', 'mass', 'pressure', 'density', 'time', 'force'),
    fc.double({ min: 0, max: 1e5, noNaN: true }),
  ])('unrounded it is the conversion, and rounding moves it less than a step', (family, kind, si) => {
    const exact = shown(family, kind, si, 'nearest', 'none');
    const quantity = { distance: 'length', time: 'time' }[kind as string] ?? kind;
    expect(exact).toBe(fromSi(quantity as Quantity, si, unitFor(family, kind) as never));
    for (const direction of directions) {
      const step = stepFor(family, kind);
      expect(Math.abs(shown(family, kind, si, direction) - exact)).toBeLessThan(step * (1 + 1e-6) + 1e-8 * exact);
    }
  });
});
