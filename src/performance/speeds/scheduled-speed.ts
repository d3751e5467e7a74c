import { easFromCas } from '../../physics/airspeed.ts';
import type { ScheduledSpeed } from '../aeroplane.ts';

/**
 * Equivalent airspeed of a speed of the procedure at this mass.
 *
 * A ratio multiplies the stall speed in EAS; a calibrated speed at a mass is scaled by sqrt(m/m_ref) and then made EAS.
 *
 * @param schedule - stall ratio, or CAS [m/s] at a mass [kg]
 * @param mass - [kg]
 * @param stallEas - 1-g stall speed at this mass, EAS [m/s]
 * @param pressure - static [Pa]
 * @returns EAS [m/s], or 'not-subsonic'
 * @see references.AndersonIntroduction, ch. 6 for the ratios; references.GraceyRp1046 for CAS to EAS
 */
export function scheduledSpeed(
  schedule: ScheduledSpeed,
  mass: number,
  stallEas: number,
  pressure: number,
): number | 'not-subsonic' {
  if (schedule.kind === 'stall-ratio') return schedule.ratio * stallEas;
  if (!(mass > 0 && schedule.mass > 0)) throw new RangeError(`mass must be above 0: ${mass}, ${schedule.mass}`);
  return easFromCas(schedule.cas * Math.sqrt(mass / schedule.mass), pressure);
}
