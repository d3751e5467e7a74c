import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { pressureAltitude } from '../../src/physics/altimetry.ts';
import { standardDensity, standardPressure } from '../../src/physics/atmosphere.ts';
import { airDensity } from '../../src/physics/density.ts';
import { densityAltitude } from '../../src/physics/density-altitude.ts';
import { fromSi, toSi } from '../../src/units/units.ts';
import { densityAltitudes as bankDensityAltitudes } from '../published/european-question-bank.ts';
import { densityAltitudeRises } from '../published/faa-knowledge-test.ts';
import { densityAltitudeExample, densityAltitudeProblem } from '../published/pilots-handbook.ts';
import { dryDensityAltitudes } from '../published/standard-atmosphere-inverted.ts';
import { expectNear } from '../support/near.ts';

function dryInFeet(pressureAltitudeFeet: number, kelvin: number): number {
  const pressure = standardPressure(toSi('length', pressureAltitudeFeet, 'ft'));
  return fromSi('length', densityAltitude(airDensity(pressure, kelvin)) as number, 'ft');
}

describe('density altitude', () => {
  it.each(dryDensityAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(dryInFeet(inputs.pressure_altitude_ft, toSi('temperature', inputs.oat_C, 'degC')), expected, tolerance);
  });
  it.each(densityAltitudeProblem)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(dryInFeet(inputs.pressure_altitude_ft, toSi('temperature', inputs.oat_F, 'degF')), expected, tolerance);
  });
  it.each(densityAltitudeExample)('$title', ({ inputs, expected, tolerance }) => {
    const altitude = pressureAltitude(
      toSi('length', inputs.elevation_ft, 'ft'),
      toSi('pressure', inputs.altimeter_inHg, 'inHg'),
    );
    const found = dryInFeet(fromSi('length', altitude, 'ft'), toSi('temperature', inputs.oat_F, 'degF'));
    expectNear(found, expected, tolerance);
  });
  it.each(bankDensityAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    const altitude = pressureAltitude(toSi('length', inputs.elevation_ft, 'ft'), inputs.qnh_hPa * 100);
    const found = dryInFeet(fromSi('length', altitude, 'ft'), toSi('temperature', inputs.oat_C, 'degC'));
    expectNear(found, expected, tolerance);
  });
  it.each(densityAltitudeRises)('$title', ({ inputs, expected, tolerance }) => {
    const at = (fahrenheit: number) => dryInFeet(inputs.pressure_altitude_ft, toSi('temperature', fahrenheit, 'degF'));
    expectNear(at(inputs.to_F) - at(inputs.from_F), expected, tolerance);
  });

  test.prop([fc.double({ min: -5000, max: 20_000, noNaN: true })])(
    'comes back through the density, -5000 to 20 000 m, to 1e-6 m',
    (altitude) => {
      expectNear(densityAltitude(standardDensity(altitude)), altitude, 1e-6);
    },
  );

  test.prop([fc.double({ min: 0.1, max: 1.9, noNaN: true }), fc.double({ min: 1e-6, max: 0.01, noNaN: true })])(
    'falls as density rises, 0.1 to 1.9 kg/m3',
    (density, more) => {
      expect(densityAltitude(density + more)).toBeLessThan(densityAltitude(density) as number);
    },
  );

  it('has a named outcome beyond the standard atmosphere and throws for no density', () => {
    expect(densityAltitude(0.05)).toBe('outside-standard-atmosphere');
    expect(densityAltitude(2.5)).toBe('outside-standard-atmosphere');
    expect(() => densityAltitude(0)).toThrow(/density/);
    expect(() => densityAltitude(Number.NaN)).toThrow(/density/);
  });
});
