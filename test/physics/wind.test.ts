import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { windComponents } from '../../src/physics/wind.ts';
import { toSi } from '../../src/units/units.ts';
import {
  crosswinds as bankCrosswinds,
  headwinds as bankHeadwinds,
  greatestWinds,
} from '../published/european-question-bank.ts';
import { windCrosswind, windHeadwind } from '../published/pilots-handbook.ts';
import { crosswinds, headwinds } from '../published/wind.ts';
import { expectNear } from '../support/near.ts';

const degrees = (angle: number) => toSi('angle', angle, 'deg');

describe('wind components', () => {
  it.each(headwinds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(windComponents(degrees(inputs.angle_deg), inputs.speed_kt, 0).headwind, expected, tolerance);
  });
  it.each(crosswinds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(windComponents(degrees(inputs.angle_deg), inputs.speed_kt, 0).crosswind, expected, tolerance);
  });
  it.each([...bankHeadwinds, ...windHeadwind])('$title', ({ inputs, expected, tolerance }) => {
    const { headwind } = windComponents(degrees(inputs.from_deg), inputs.speed_kt, degrees(inputs.runway_deg));
    expectNear(headwind, expected, tolerance);
  });
  it.each([...bankCrosswinds, ...windCrosswind])('$title', ({ inputs, expected, tolerance }) => {
    const { crosswind } = windComponents(degrees(inputs.from_deg), inputs.speed_kt, degrees(inputs.runway_deg));
    expectNear(crosswind, expected, tolerance);
  });
  it.each(greatestWinds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(inputs.crosswind_kt / windComponents(degrees(inputs.angle_deg), 1, 0).crosswind, expected, tolerance);
  });

  it('names the side looking along the movement', () => {
    expect(windComponents(degrees(220), 30, degrees(180)).crosswindFrom).toBe('right');
    expect(windComponents(degrees(140), 25, degrees(170)).crosswindFrom).toBe('left');
    expect(windComponents(degrees(10), 10, degrees(350)).crosswindFrom).toBe('right');
    expect(windComponents(degrees(350), 10, degrees(10)).crosswindFrom).toBe('left');
  });

  it('a wind from ahead, from behind or none at all has no side and no trace of one', () => {
    expect(windComponents(degrees(180), 10, degrees(180))).toEqual({ headwind: 10, crosswind: 0 });
    expect(windComponents(degrees(360), 10, degrees(180))).toEqual({ headwind: -10, crosswind: 0 });
    expect(windComponents(degrees(90), 0, degrees(180))).toEqual({ headwind: 0, crosswind: 0 });
    expect(windComponents(degrees(270), 10, degrees(180))).toEqual({
      headwind: 0,
      crosswind: 10,
      crosswindFrom: 'right',
    });
  });

  const angles = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
  const speeds = fc.double({ min: 0, max: 60, noNaN: true });

  test.prop([angles, speeds, angles])(
    'keep the speed, and the other end of the runway turns both, 0 to 360°, 0 to 60 m/s',
    (from, speed, direction) => {
      const here = windComponents(from, speed, direction);
      const there = windComponents(from, speed, direction + Math.PI);
      expectNear(Math.hypot(here.headwind, here.crosswind), speed, 1e-10);
      expectNear(there.headwind, -here.headwind, 1e-10);
      expectNear(there.crosswind, here.crosswind, 1e-10);
      expect(here.crosswind).toBeGreaterThanOrEqual(0);
      if (here.crosswind > 1e-9) expect(there.crosswindFrom).not.toBe(here.crosswindFrom);
    },
  );

  it('throws naming the parameter', () => {
    expect(() => windComponents(0, -1, 0)).toThrow(/speed/);
    expect(() => windComponents(Number.NaN, 1, 0)).toThrow(/from/);
    expect(() => windComponents(0, 1, Number.POSITIVE_INFINITY)).toThrow(/direction/);
  });
});
