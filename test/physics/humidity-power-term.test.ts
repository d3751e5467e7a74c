import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { standardPressure } from '../../src/physics/atmosphere.ts';
import { saturationVapourPressure } from '../../src/physics/humidity.ts';
import { certificationVapourPressure, humidityPowerTerm } from '../../src/physics/humidity-power-term.ts';
import { toSi } from '../../src/units/units.ts';
import { vapourPressures } from '../published/cfr-25-101.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const altitudes = fc.double({ min: -1500, max: 7500, noNaN: true });
const factors = fc.double({ min: 0, max: 2, noNaN: true });

describe('vapour pressure of the certification day', () => {
  it.each(vapourPressures)('meets the row: $title', ({ inputs, expected }) => {
    const found = certificationVapourPressure(toSi('length', inputs.pressure_altitude_ft, 'ft'));
    expectRatio(found, toSi('pressure', expected, 'inHg'), 1e-12);
  });

  it('is linear between rows: the middle of .311 and .272 at 2500 ft = .2915 inHg', () => {
    expectRatio(certificationVapourPressure(toSi('length', 2500, 'ft')), toSi('pressure', 0.2915, 'inHg'), 1e-12);
  });

  it('is held beyond the first and last row', () => {
    expect(certificationVapourPressure(-1000)).toBe(certificationVapourPressure(0));
    expect(certificationVapourPressure(15_000)).toBe(certificationVapourPressure(toSi('length', 25_000, 'ft')));
  });
});

describe('what moisture leaves of the power', () => {
  it('is 1 on the certification day and in drier air', () => {
    expect(humidityPowerTerm(101_325, certificationVapourPressure(0), 0, 1.5)).toBe(1);
    expect(humidityPowerTerm(101_325, 0, 0, 1.5)).toBe(1);
  });

  it('35 °C saturated at sea level: e = 56.13 hPa of 1013.25 loses 4.26 % times the factor [14 CFR 25.101(b)(2); by hand]', () => {
    // (1013.25 - 56.128)/(1013.25 - 13.647) = 0.957502
    const vapour = saturationVapourPressure(308.15);
    expectNear(humidityPowerTerm(101_325, vapour, 0, 1), 0.957502, 2e-6);
    expectNear(humidityPowerTerm(101_325, vapour, 0, 1.5), 1 - 1.5 * 0.042498, 3e-6);
  });

  test.prop([altitudes, factors, fc.double({ min: 0, max: 0.3, noNaN: true })])(
    'lies in 0 to 1, falls with moisture, and is 1 with factor 0, -1500 to 7500 m',
    (altitude, factor, share) => {
      const pressure = standardPressure(altitude);
      const term = humidityPowerTerm(pressure, share * pressure, altitude, factor);
      expect(term).toBeGreaterThanOrEqual(0);
      expect(term).toBeLessThanOrEqual(1);
      expect(humidityPowerTerm(pressure, (share + 0.01) * pressure, altitude, factor)).toBeLessThanOrEqual(term);
      expect(humidityPowerTerm(pressure, share * pressure, altitude, 0)).toBe(1);
    },
  );

  it('throws naming the parameter', () => {
    expect(() => humidityPowerTerm(1000, 1000, 0, 1)).toThrow(/vapourPressure/);
    expect(() => humidityPowerTerm(101_325, 0, 0, -1)).toThrow(/humidityFactor/);
  });
});
