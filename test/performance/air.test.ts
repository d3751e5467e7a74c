import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { type Air, type AirOutcome, type AirReport, airOf } from '../../src/performance/air.ts';
import { qnh, stationPressure } from '../../src/physics/altimetry.ts';
import { standardPressure } from '../../src/physics/atmosphere.ts';
import { densities, densityAltitudes, pressureAltitudes } from '../published/independent-model-air.ts';
import { expectNear, expectRatio } from '../support/near.ts';

function told(result: AirOutcome): Air {
  if (result.outcome !== 'air') throw new Error(result.outcome);
  return result.air;
}

function reported(inputs: (typeof densities)[number]['inputs']): Air {
  const report: AirReport = {
    temperature: inputs.temperature_C + 273.15,
    pressure: { kind: 'qnh', value: inputs.qnh_hPa * 100 },
    ...(inputs.dew_point_C === undefined ? {} : { dewPoint: inputs.dew_point_C + 273.15 }),
  };
  return told(airOf(report, inputs.elevation_m));
}

const weather = fc.record({
  temperature: fc.double({ min: 213.15, max: 333.15, noNaN: true }),
  qnh: fc.double({ min: 87_000, max: 108_500, noNaN: true }),
  elevation: fc.double({ min: -500, max: 6000, noNaN: true }),
  spread: fc.double({ min: 0, max: 40, noNaN: true }),
});

describe('the air at the runway', () => {
  it.each(densities)('$title, relative', ({ inputs, expected, tolerance }) => {
    expectRatio(reported(inputs).density, expected, tolerance);
  });
  it.each(pressureAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(reported(inputs).pressureAltitude, expected, tolerance);
  });
  it.each(densityAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(reported(inputs).densityAltitude, expected, tolerance);
  });

  test.prop([weather])(
    'is the same from QNH, station pressure and pressure altitude: -60 to +60 °C, QNH 870 to 1085 hPa, -500 to 6000 m',
    ({ temperature, qnh: setting, elevation }) => {
      const one = told(airOf({ temperature, pressure: { kind: 'qnh', value: setting } }, elevation));
      const station = stationPressure(elevation, setting);
      const two = told(airOf({ temperature, pressure: { kind: 'stationPressure', value: station } }));
      const three = told(airOf({ temperature, pressure: { kind: 'pressureAltitude', value: one.pressureAltitude } }));
      for (const other of [two, three]) {
        expectRatio(other.pressure, one.pressure, 1e-12);
        expectRatio(other.density, one.density, 1e-12);
        expectNear(other.pressureAltitude, one.pressureAltitude, 1e-6);
        expectNear(other.densityAltitude, one.densityAltitude, 1e-6);
        expectNear(other.temperatureDeviation, one.temperatureDeviation, 1e-7);
      }
      expectRatio(qnh(elevation, one.pressure), setting, 1e-12);
    },
  );

  test.prop([weather])('is lighter and stands higher with moisture, dew point 0 to 40 K below', (given) => {
    const { temperature, elevation, spread } = given;
    const pressure = { kind: 'qnh', value: given.qnh } as const;
    const dry = told(airOf({ temperature, pressure }, elevation));
    const moist = told(airOf({ temperature, pressure, dewPoint: temperature - spread }, elevation));
    expect(moist.density).toBeLessThan(dry.density);
    expect(moist.densityAltitude).toBeGreaterThan(dry.densityAltitude);
    expect(moist.relativeHumidity).toBeLessThanOrEqual(1);
    expect(dry).not.toHaveProperty('relativeHumidity');
    expect(dry).not.toHaveProperty('dewPoint');
    expect(dry).not.toHaveProperty('vapourPressure');
    expectNear(moist.densityRatio * 1.225, moist.density, 1e-15);
  });

  it('needs an elevation with a QNH only', () => {
    const temperature = 288.15;
    expect(airOf({ temperature, pressure: { kind: 'qnh', value: 101_325 } })).toEqual({ outcome: 'elevation-needed' });
    expect(told(airOf({ temperature, pressure: { kind: 'pressureAltitude', value: 1000 } })).pressure).toBe(
      standardPressure(1000),
    );
    expect(told(airOf({ temperature, pressure: { kind: 'stationPressure', value: 90_000 } })).pressure).toBe(90_000);
  });

  it('names a dew point above the temperature and air beyond the standard atmosphere', () => {
    const pressure = { kind: 'pressureAltitude', value: 0 } as const;
    expect(airOf({ temperature: 280, dewPoint: 280.1, pressure })).toEqual({
      outcome: 'dew-point-above-temperature',
      dewPoint: 280.1,
      temperature: 280,
    });
    expect(airOf({ temperature: 280, dewPoint: 280, pressure }).outcome).toBe('air');
    expect(airOf({ temperature: 280, pressure: { kind: 'stationPressure', value: 100 } })).toMatchObject({
      outcome: 'outside-standard-atmosphere',
      of: 'pressureAltitude',
    });
    expect(airOf({ temperature: 150, pressure })).toMatchObject({
      outcome: 'outside-standard-atmosphere',
      of: 'densityAltitude',
      lowest: -5000,
      highest: 20_000,
    });
  });
});
