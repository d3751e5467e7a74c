import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { pressureAltitude, pressureAltitudeOfPressure, qnh, stationPressure } from '../../src/physics/altimetry.ts';
import { standardPressure } from '../../src/physics/atmosphere.ts';
import { fromSi, toSi } from '../../src/units/units.ts';
import { pressureAltitudes as bankPressureAltitudes } from '../published/european-question-bank.ts';
import { pressureAltitudes as testPressureAltitudes } from '../published/faa-knowledge-test.ts';
import { altimeterCorrection, pressureAltitudeExample, pressureAltitudeProblem } from '../published/pilots-handbook.ts';
import { qnhCorrections } from '../published/standard-atmosphere-inverted.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const feet = (altitude: number) => fromSi('length', altitude, 'ft');
const settings = fc.double({ min: 87_000, max: 108_500, noNaN: true });
const elevations = fc.double({ min: -500, max: 6000, noNaN: true });

describe('pressure altitude', () => {
  it.each(qnhCorrections)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(feet(pressureAltitude(0, inputs.qnh_hPa * 100)), expected, tolerance);
  });
  it.each(altimeterCorrection)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(feet(pressureAltitude(0, toSi('pressure', inputs.altimeter_inHg, 'inHg'))), expected, tolerance);
  });
  it.each([...pressureAltitudeProblem, ...pressureAltitudeExample, ...testPressureAltitudes])(
    '$title',
    ({ inputs, expected, tolerance }) => {
      const elevation = toSi('length', inputs.elevation_ft, 'ft');
      const setting = toSi('pressure', inputs.altimeter_inHg, 'inHg');
      expectNear(feet(pressureAltitude(elevation, setting)), expected, tolerance);
    },
  );
  it.each(bankPressureAltitudes)('$title', ({ inputs, expected, tolerance }) => {
    const indicated = toSi('length', inputs.indicated_ft, 'ft');
    expectNear(feet(pressureAltitude(indicated, inputs.qnh_hPa * 100)), expected, tolerance);
  });

  test.prop([elevations, settings])(
    'is that of the station pressure, elevation -500 to 6000 m, QNH 870 to 1085 hPa, to 1e-6 m',
    (elevation, setting) => {
      expectNear(
        pressureAltitudeOfPressure(stationPressure(elevation, setting)),
        pressureAltitude(elevation, setting),
        1e-6,
      );
    },
  );

  test.prop([elevations, settings])(
    'rises metre for metre with elevation and falls as QNH rises',
    (elevation, setting) => {
      expectNear(pressureAltitude(elevation + 1, setting) - pressureAltitude(elevation, setting), 1, 1e-9);
      expect(pressureAltitude(elevation, setting + 1)).toBeLessThan(pressureAltitude(elevation, setting));
    },
  );

  test.prop([fc.double({ min: -5000, max: 20_000, noNaN: true })])(
    'comes back through the pressure, -5000 to 20 000 m, to 1e-6 m',
    (altitude) => {
      expectNear(pressureAltitudeOfPressure(standardPressure(altitude)), altitude, 1e-6);
    },
  );

  it('has a named outcome beyond the standard atmosphere', () => {
    expect(pressureAltitudeOfPressure(1)).toBe('outside-standard-atmosphere');
    expect(pressureAltitudeOfPressure(200_000)).toBe('outside-standard-atmosphere');
  });
});

describe('station pressure and QNH', () => {
  test.prop([elevations, settings])(
    'invert each other, elevation -500 to 6000 m, QNH 870 to 1085 hPa, to 1e-12',
    (elevation, setting) => {
      expectRatio(qnh(elevation, stationPressure(elevation, setting)), setting, 1e-12);
    },
  );

  it('QNH is the station pressure at sea level and the standard pressure is that of a standard setting', () => {
    expectRatio(stationPressure(0, 99_000), 99_000, 1e-14);
    expectRatio(stationPressure(2000, 101_325), standardPressure(2000), 1e-14);
  });

  it('throw naming the parameter', () => {
    expect(() => pressureAltitude(0, 0)).toThrow(/qnh/);
    expect(() => stationPressure(0, Number.NaN)).toThrow(/qnh/);
    expect(() => stationPressure(50_000, 101_325)).toThrow(/elevation/);
    expect(() => qnh(0, -1)).toThrow(/pressure/);
    expect(() => qnh(-60_000, 90_000)).toThrow(/elevation/);
    expect(() => pressureAltitudeOfPressure(0)).toThrow(/pressure/);
  });
});
