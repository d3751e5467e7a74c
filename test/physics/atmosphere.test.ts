import { fc, test } from '@fast-check/vitest';
import psychrolib from 'psychrolib';
import { describe, expect, it } from 'vitest';
import {
  highestAltitude,
  lowestAltitude,
  speedOfSound,
  standardDensity,
  standardPressure,
  standardTemperature,
  withinStandardAtmosphere,
} from '../../src/physics/atmosphere.ts';
import { p0, rho0 } from '../../src/physics/constants.ts';
import {
  densities,
  densityRatios,
  pressureRatios,
  pressures,
  speedsOfSound,
  temperatures,
} from '../published/iso2533.ts';
import { expectNear, expectRatio } from '../support/near.ts';

psychrolib.SetUnitSystem(psychrolib.SI);

describe('the standard atmosphere', () => {
  it.each(temperatures)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(standardTemperature(inputs.geopotential_altitude_m), expected, tolerance);
  });
  it.each(pressures)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(standardPressure(inputs.geopotential_altitude_m) / 100, expected, tolerance);
  });
  it.each(densities)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(standardDensity(inputs.geopotential_altitude_m), expected, tolerance);
  });
  it.each(pressureRatios)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(standardPressure(inputs.geopotential_altitude_m) / p0, expected, tolerance);
  });
  it.each(densityRatios)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(standardDensity(inputs.geopotential_altitude_m) / rho0, expected, tolerance);
  });
  it.each(speedsOfSound)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(speedOfSound(standardTemperature(inputs.geopotential_altitude_m)), expected, tolerance);
  });

  test.prop([fc.double({ min: -5000, max: 11_000, noNaN: true })])(
    'agrees with the ASHRAE handbook as psychrolib computes it, -5000 to 11 000 m, pressure to 2e-4, temperature to 0.01 K',
    (altitude) => {
      expectRatio(standardPressure(altitude), psychrolib.GetStandardAtmPressure(altitude), 2e-4);
      expectNear(standardTemperature(altitude) - 273.15, psychrolib.GetStandardAtmTemperature(altitude), 0.01);
    },
  );

  test.prop([fc.double({ min: -5000, max: 19_999, noNaN: true }), fc.double({ min: 1e-3, max: 1, noNaN: true })])(
    'obeys the hydrostatic equation dp = -rho g dH and falls, -5000 to 20 000 m',
    (altitude, step) => {
      const above = standardPressure(altitude + step);
      const below = standardPressure(altitude);
      const middle = standardDensity(altitude + step / 2);
      expect(above).toBeLessThan(below);
      expect(standardDensity(altitude + step)).toBeLessThan(standardDensity(altitude));
      expectNear((below - above) / step, middle * 9.80665, 1e-6 + 1e-10 * (below / step));
    },
  );

  it('is continuous at the tropopause', () => {
    expectRatio(standardPressure(11_000.0001), standardPressure(11_000), 1e-7);
    expectNear(standardTemperature(11_001), standardTemperature(11_000), 1e-12);
    expectRatio(standardDensity(11_000.0001), standardDensity(11_000), 1e-7);
  });

  it('throws outside -5000 to 20 000 m, naming the altitude, and has a named outcome for asking first', () => {
    expect(() => standardPressure(highestAltitude + 1)).toThrow(/altitude/);
    expect(() => standardTemperature(lowestAltitude - 1)).toThrow(/altitude/);
    expect(() => standardTemperature(Number.NaN)).toThrow(/altitude/);
    expect(() => speedOfSound(0)).toThrow(/temperature/);
    expect(withinStandardAtmosphere(20_001)).toBe('outside-standard-atmosphere');
    expect(withinStandardAtmosphere(-5_001)).toBe('outside-standard-atmosphere');
    expect(withinStandardAtmosphere(1234)).toBe(1234);
  });
});
