import { fc, test } from '@fast-check/vitest';
import psychrolib from 'psychrolib';
import { describe, expect, it } from 'vitest';
import { standardPressure, standardTemperature } from '../../src/physics/atmosphere.ts';
import { rho0 } from '../../src/physics/constants.ts';
import { airDensity } from '../../src/physics/density.ts';
import { mixingRatio, saturationVapourPressure } from '../../src/physics/humidity.ts';
import { toSi } from '../../src/units/units.ts';
import { densityRatios } from '../published/cfr-25-101.ts';
import { moistDensities } from '../published/cipm-2007.ts';
import { cipm2007Density } from '../support/air-oracles.ts';
import { expectNear, expectRatio } from '../support/near.ts';

psychrolib.SetUnitSystem(psychrolib.SI);

const temperatures = fc.double({ min: 213.15, max: 333.15, noNaN: true });
const pressures = fc.double({ min: 35_000, max: 115_000, noNaN: true });

describe('density of the air', () => {
  it.each(densityRatios)('$title', ({ inputs, expected, tolerance }) => {
    const altitude = toSi('length', inputs.pressure_altitude_ft, 'ft');
    const temperature = standardTemperature(altitude);
    const vapour = (saturationVapourPressure(temperature) * inputs.rh_percent) / 100;
    expectNear(airDensity(standardPressure(altitude), temperature, vapour) / rho0, expected, tolerance);
  });

  it.each(moistDensities)('$title, and ours 0 to 5e-4 below it: an ideal gas', ({ inputs, expected, tolerance }) => {
    expectNear(cipm2007Density(inputs.t_C, inputs.p_Pa, inputs.rh), expected, tolerance);
    const kelvin = inputs.t_C + 273.15;
    const ours = airDensity(inputs.p_Pa, kelvin, inputs.rh * saturationVapourPressure(kelvin));
    expect(ours).toBeLessThan(expected);
    expectRatio(ours, expected, 5e-4);
  });

  test.prop([
    fc.double({ min: 0.1, max: 45, noNaN: true }),
    fc.double({ min: 60_000, max: 110_000, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true }),
  ])('agrees with psychrolib, 0.1 to 45 °C, 600 to 1100 hPa, to 1.5e-4', (celsius, pressure, humidity) => {
    const vapour = humidity * saturationVapourPressure(celsius + 273.15);
    const theirs = psychrolib.GetMoistAirDensity(celsius, mixingRatio(pressure, vapour), pressure);
    expectRatio(airDensity(pressure, celsius + 273.15, vapour), theirs, 1.5e-4);
  });

  test.prop([temperatures, pressures, fc.double({ min: 0.001, max: 0.5, noNaN: true })])(
    'falls with moisture and temperature and rises with pressure, -60 to +60 °C, 350 to 1150 hPa',
    (temperature, pressure, share) => {
      const dry = airDensity(pressure, temperature);
      expect(airDensity(pressure, temperature, share * pressure)).toBeLessThan(dry);
      expect(airDensity(pressure, temperature + 0.01)).toBeLessThan(dry);
      expect(airDensity(pressure + 1, temperature)).toBeGreaterThan(dry);
    },
  );

  it('takes vapour away by its molar mass: 0.378 of its pressure', () => {
    expectRatio(airDensity(100_000, 300, 1000), airDensity(100_000 - 378, 300), 1e-15);
  });

  it('throws naming the parameter', () => {
    expect(() => airDensity(100_000, 0)).toThrow(/temperature/);
    expect(() => airDensity(1000, 300, 1000)).toThrow(/vapourPressure/);
    expect(() => airDensity(1000, 300, -1)).toThrow(/vapourPressure/);
    expect(() => airDensity(0, 300)).toThrow(/pressure/);
  });
});
