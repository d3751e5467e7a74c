import { interpolate } from '../numerics/interpolate.ts';
import type { AirspeedCalibration } from './aeroplane.ts';

/**
 * Calibrated airspeed of an indicated one by the aeroplane's own table of position error.
 *
 * @param calibration - pairs [m/s], both columns rising
 * @param ias - [m/s]
 * @returns [m/s], or 'outside' where the table does not reach
 * @see references.Cfr1s1, calibrated airspeed
 */
export function calibratedFromIndicated(calibration: AirspeedCalibration, ias: number): number | 'outside' {
  return interpolate(calibration.indicated, calibration.calibrated, ias);
}

/** The inverse of calibratedFromIndicated. @see references.Cfr1s1, calibrated airspeed */
export function indicatedFromCalibrated(calibration: AirspeedCalibration, cas: number): number | 'outside' {
  return interpolate(calibration.calibrated, calibration.indicated, cas);
}
