import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { isFault } from '../../src/planning/chosen.ts';
import { type WindAlong, windAlong, windAnswer } from '../../src/planning/wind-along.ts';
import { expectNear } from '../support/near.ts';

const rad = (degrees: number) => (degrees * Math.PI) / 180;
const runway = { direction: rad(70), directionReference: 'true' } as const;
const from = (degrees: number, speed: number, more: object = {}) =>
  ({ kind: 'from', from: rad(degrees), fromReference: 'true', speed, ...more }) as const;
const found = (...args: Parameters<typeof windAlong>): WindAlong => {
  const wind = windAlong(...args);
  if (isFault(wind)) throw new Error(wind.message);
  return wind;
};

describe('the wind along the runway', () => {
  it('takes components and calm as they are', () => {
    expect(found(runway, { kind: 'calm' })).toEqual({ headwind: 0, crosswind: 0 });
    expect(found(runway, { kind: 'components', headwind: -3 })).toEqual({ headwind: -3 });
    expect(found(runway, { kind: 'components', headwind: 3, crosswind: 2 })).toEqual({ headwind: 3, crosswind: 2 });
  });
  it('counts a wind from any direction as a tailwind and a crosswind of the full speed, whatever the norths', () => {
    const magnetic = { direction: rad(70), directionReference: 'magnetic' } as const;
    expect(found(magnetic, { kind: 'variable', speed: 3 })).toEqual({ headwind: -3, crosswind: 3, variable: true });
    expect(found(magnetic, { kind: 'variable', speed: 8, gust: 14 }).gust).toEqual({
      speed: 14,
      mean: 8,
      headwind: -14,
      crosswind: 14,
    });
  });
  it('turns a true wind to a magnetic runway by the variation, east positive', () => {
    const magnetic = { direction: rad(70), directionReference: 'magnetic', magneticVariation: rad(10) } as const;
    expectNear(found(magnetic, from(80, 10)).headwind, 10, 1e-12);
    expectNear(
      found({ ...runway, magneticVariation: rad(-10) }, from(80, 10, { fromReference: 'magnetic' })).headwind,
      10,
      1e-12,
    );
  });
  it('refuses to compare two norths without a variation', () => {
    const wind = windAlong({ direction: 0, directionReference: 'magnetic' }, from(0, 5));
    expect(isFault(wind) && [wind.pointer, wind.code]).toEqual(['/runway/magneticVariation', 'missing']);
  });
  it('keeps a gust apart', () => {
    const wind = found(runway, from(160, 10, { gust: 18 }));
    expectNear(wind.headwind, 0, 1e-9);
    expectNear(wind.crosswind, 10, 1e-12);
    expect(wind.crosswindFrom).toBe('right');
    expectNear(wind.gust?.crosswind, 18, 1e-12);
    expect(windAnswer(wind, 0)).toEqual({
      headwind: wind.headwind,
      crosswind: wind.crosswind,
      crosswindFrom: 'right',
      creditedHeadwind: 0,
    });
  });
  it('finds the tailwind inside a sector that holds it, across north too', () => {
    const wind = found(
      { ...runway, direction: rad(180) },
      from(330, 10, { variable: { from: rad(300), to: rad(30) } }),
    );
    expectNear(wind.headwind, -10, 1e-12);
    expectNear(wind.crosswind, 10 * Math.sin(rad(60)), 1e-12);
    expect(wind.variable).toBe(true);
  });
  const degrees = fc.double({ min: 0, max: 360, noNaN: true });
  test.prop([
    degrees,
    degrees,
    fc.double({ min: 0, max: 359, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true }),
  ])('no direction of the sector is worse than what is taken', (direction, start, width, share) => {
    const at = { direction: rad(direction), directionReference: 'true' } as const;
    const sector = { from: rad(start), to: rad((start + width) % 360) };
    const worst = found(at, from(start, 10, { variable: sector }));
    const inside = found(at, from(start + share * width, 10));
    expect(inside.headwind).toBeGreaterThanOrEqual(worst.headwind - 1e-9);
    expect(inside.crosswind ?? 0).toBeLessThanOrEqual((worst.crosswind ?? 0) + 1e-9);
  });
});
