import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { calibratedFromIndicated, indicatedFromCalibrated } from '../../src/performance/airspeed-calibration.ts';
import { expectNear } from '../support/near.ts';

/** Invented: reads low at high incidence, as static sources do. */
const calibration = { indicated: [20, 25, 32, 50, 70], calibrated: [25, 28, 33, 49.5, 69] };

describe('airspeed calibration', () => {
  it('meets the rows and is linear between them', () => {
    expect(calibratedFromIndicated(calibration, 20)).toBe(25);
    expect(calibratedFromIndicated(calibration, 70)).toBe(69);
    expect(calibratedFromIndicated(calibration, 22.5)).toBe(26.5);
    expect(indicatedFromCalibrated(calibration, 26.5)).toBe(22.5);
  });

  it('refuses what the table does not reach', () => {
    expect(calibratedFromIndicated(calibration, 19.9)).toBe('outside');
    expect(calibratedFromIndicated(calibration, 70.1)).toBe('outside');
    expect(indicatedFromCalibrated(calibration, 24.9)).toBe('outside');
    expect(indicatedFromCalibrated(calibration, 69.1)).toBe('outside');
  });

  test.prop([fc.double({ min: 20, max: 70, noNaN: true })])('comes back, over the whole table, to 1e-12 m/s', (ias) => {
    expectNear(indicatedFromCalibrated(calibration, calibratedFromIndicated(calibration, ias) as number), ias, 1e-12);
  });
});
