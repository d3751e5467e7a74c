import { fc, test } from '@fast-check/vitest';
import psychrolib from 'psychrolib';
import { describe, expect, it } from 'vitest';
import { standardPressure, standardTemperature } from '../../src/physics/atmosphere.ts';
import { dewPoint, mixingRatio, relativeHumidity, saturationVapourPressure } from '../../src/physics/humidity.ts';
import { fromSi, toSi } from '../../src/units/units.ts';
import { mixingRatios, vapourPressures } from '../published/cfr-25-101.ts';
import { goffGratch, magnus, buck1981 as publishedBuck1981 } from '../published/vapour-pressure.ts';
import { buck1981 } from '../support/air-oracles.ts';
import { expectNear, expectRatio } from '../support/near.ts';

psychrolib.SetUnitSystem(psychrolib.SI);

const hectopascals = (celsius: number) => saturationVapourPressure(celsius + 273.15) / 100;

describe('saturation vapour pressure', () => {
  it.each(magnus)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(hectopascals(inputs.t_C), expected, tolerance);
  });
  it.each(goffGratch)('$title (0.3 % allows for the other curve)', ({ inputs, expected, tolerance }) => {
    expectNear(hectopascals(inputs.t_C), expected, tolerance);
  });
  it.each(publishedBuck1981)('$title, and ours within 0.25 %', ({ inputs, expected, tolerance }) => {
    expectNear(buck1981(inputs.t_C), expected, tolerance);
    expectRatio(hectopascals(inputs.t_C), expected, 0.0025);
  });
  it.each(vapourPressures)('$title', ({ inputs, expected, tolerance }) => {
    const temperature = standardTemperature(toSi('length', inputs.pressure_altitude_ft, 'ft')) + inputs.isa_dev_C;
    const pressure = (saturationVapourPressure(temperature) * inputs.rh_percent) / 100;
    expectNear(fromSi('pressure', pressure, 'inHg'), expected, tolerance);
  });

  test.prop([fc.double({ min: 0.1, max: 60, noNaN: true })])(
    'agrees with ASHRAE as psychrolib computes it, 0.1 to 60 °C, to 0.6 %, and to 0.3 % up to 45 °C',
    (celsius) => {
      const theirs = psychrolib.GetSatVapPres(celsius) / 100;
      expectRatio(hectopascals(celsius), theirs, celsius <= 45 ? 0.003 : 0.006);
    },
  );

  test.prop([fc.double({ min: 213.15, max: 333.15, noNaN: true })])(
    'comes back as the dew point, -60 to +60 °C, to 1e-9 K, and rises',
    (temperature) => {
      expectNear(dewPoint(saturationVapourPressure(temperature)), temperature, 1e-9);
      expect(saturationVapourPressure(temperature + 0.001)).toBeGreaterThan(saturationVapourPressure(temperature));
    },
  );

  it('throws naming the parameter', () => {
    expect(() => saturationVapourPressure(20)).toThrow(/temperature/);
    expect(() => saturationVapourPressure(Number.NaN)).toThrow(/temperature/);
    expect(() => dewPoint(0)).toThrow(/vapourPressure/);
  });
});

describe('relative humidity and mixing ratio', () => {
  it.each(mixingRatios)('$title', ({ inputs, expected, tolerance }) => {
    const altitude = toSi('length', inputs.pressure_altitude_ft, 'ft');
    const vapour = (saturationVapourPressure(standardTemperature(altitude)) * inputs.rh_percent) / 100;
    expectNear(mixingRatio(standardPressure(altitude), vapour), expected, tolerance);
  });

  test.prop([fc.double({ min: 1, max: 45, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true })])(
    'agree with psychrolib, 1 to 45 °C, dew point 0.1 °C to saturation, to 0.5 % and 1e-4',
    (celsius, share) => {
      const dew = 0.1 + share * (celsius - 0.1);
      const vapour = saturationVapourPressure(dew + 273.15);
      expectRatio(
        relativeHumidity(celsius + 273.15, dew + 273.15),
        psychrolib.GetRelHumFromTDewPoint(celsius, dew),
        0.005,
      );
      expectRatio(mixingRatio(90_000, vapour), psychrolib.GetHumRatioFromVapPres(vapour, 90_000), 1e-4);
    },
  );

  it('saturated air is at 1, and a vapour pressure from 0 up to the pressure is required', () => {
    expect(relativeHumidity(290, 290)).toBe(1);
    expect(mixingRatio(90_000, 0)).toBe(0);
    expect(() => mixingRatio(1000, 1000)).toThrow(/vapourPressure/);
    expect(() => mixingRatio(1000, -1)).toThrow(/vapourPressure/);
  });
});
