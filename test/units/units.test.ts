import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { fromSi, type Quantity, scales, temperatureScales, toSi, unitsOf } from '../../src/units/units.ts';
import { exactFactors, printedFactors } from '../published/unit-factors.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const quantities = [...Object.keys(scales), 'temperature'] as Quantity[];
const all = quantities.flatMap((quantity) => unitsOf(quantity).map((unit) => ({ quantity, unit })));

function factorOf(id: string): number {
  const [quantity, unit] = id.split(' ') as [Quantity, string];
  return toSi(quantity, 1, unit as never);
}

describe('factors to SI', () => {
  it.each(exactFactors)('$title, exactly', ({ id, expected }) => {
    expect(factorOf(id)).toBe(expected);
  });
  it.each(printedFactors)('$title', ({ id, expected, tolerance }) => {
    expectNear(factorOf(id), expected, tolerance);
  });

  it('follow from each other: ft2 = ft x ft, lbf = lb x g0, psi = lbf/in2, hp = 550 ft lbf/s, kt = NM/h', () => {
    expectRatio(scales.area.ft2, 0.3048 ** 2, 1e-15);
    expectRatio(scales.force.lbf, 0.45359237 * 9.80665, 1e-15);
    expectRatio(scales.pressure.psi, (0.45359237 * 9.80665) / 0.0254 ** 2, 1e-15);
    expectRatio(scales.power.hp, 550 * 0.3048 * 0.45359237 * 9.80665, 1e-15);
    expectRatio(scales.speed.kt, 1852 / 3600, 1e-15);
    expectRatio(scales.speed.mph, 1609.344 / 3600, 1e-15);
    expectRatio(scales.speed['ft/min'], 0.3048 / 60, 1e-15);
  });

  it('every SI unit counts 1', () => {
    const units = { length: 'm', area: 'm2', speed: 'm/s', mass: 'kg', pressure: 'Pa', time: 's', force: 'N' } as const;
    for (const [quantity, unit] of Object.entries(units)) expect(factorOf(`${quantity} ${unit}`)).toBe(1);
    for (const id of ['power W', 'energy J', 'density kg/m3', 'temperatureDifference deltaC', 'temperature K']) {
      expect(factorOf(id)).toBe(1);
    }
  });

  it('a unit name means one thing in all quantities', () => {
    expect(new Set(all.map(({ unit }) => unit)).size).toBe(all.length);
  });
});

describe('temperature', () => {
  it('0 °C = 32 °F = 273.15 K, 100 °C = 212 °F, -40 °C = -40 °F [ITS-90 definition of °C; memory; to 1e-12]', () => {
    expect(toSi('temperature', 0, 'degC')).toBe(273.15);
    expectNear(toSi('temperature', 32, 'degF'), 273.15, 1e-12);
    expectNear(toSi('temperature', 212, 'degF'), 373.15, 1e-12);
    expectNear(fromSi('temperature', toSi('temperature', -40, 'degC'), 'degF'), -40, 1e-12);
    expect(Object.keys(temperatureScales)).toEqual(unitsOf('temperature'));
  });

  it('a difference has no offset: 9 deltaF = 5 deltaC', () => {
    expect(toSi('temperatureDifference', 9, 'deltaF')).toBe(5);
    expect(toSi('temperatureDifference', 0, 'deltaF')).toBe(0);
  });
});

describe('there and back', () => {
  const values = fc.double({ min: -1e6, max: 1e6, noNaN: true });

  test.prop([fc.constantFrom(...all), values])(
    'every unit of every quantity, -1e6 to 1e6, to 1e-12 of the value (of 1000 at least for a temperature)',
    ({ quantity, unit }, value) => {
      const back = fromSi(quantity, toSi(quantity, value, unit as never), unit as never);
      const scale = quantity === 'temperature' ? Math.max(1000, Math.abs(value)) : Math.abs(value);
      // a subnormal product keeps fewer bits
      expectNear(back, value, 1e-12 * scale + 1e-300);
    },
  );
});
