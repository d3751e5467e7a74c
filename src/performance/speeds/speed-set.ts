import { casFromEas, tasFromEas } from '../../physics/airspeed.ts';
import type { AirspeedCalibration } from '../aeroplane.ts';
import type { Air } from '../air.ts';
import { indicatedFromCalibrated } from '../airspeed-calibration.ts';

/** One speed in its kinds [m/s]. */
export interface SpeedSet {
  readonly cas: number;
  readonly eas: number;
  readonly tas: number;
  /** absent without a calibration table, or where the table does not reach */
  readonly ias?: number;
  /** over the 1-g stall speed */
  readonly stallRatio: number;
}

/**
 * One equivalent airspeed in all its kinds, in this air.
 *
 * @param eas - [m/s]
 * @param stallEas - 1-g stall speed at this mass [m/s], above 0
 * @param air - pressure [Pa] and density [kg/m3]
 * @param calibration - of the aeroplane, where it has one
 * @returns the speeds, or 'not-subsonic'
 * @see references.GraceyRp1046; references.Cfr1s1
 */
export function speedSet(
  eas: number,
  stallEas: number,
  air: Pick<Air, 'pressure' | 'density'>,
  calibration?: AirspeedCalibration,
): SpeedSet | 'not-subsonic' {
  if (!(stallEas > 0)) throw new RangeError(`stallEas must be above 0: ${stallEas}`);
  const cas = casFromEas(eas, air.pressure);
  if (cas === 'not-subsonic') return cas;
  const tas = tasFromEas(eas, air.density);
  const stallRatio = eas / stallEas;
  const ias = calibration === undefined ? 'outside' : indicatedFromCalibrated(calibration, cas);
  return ias === 'outside' ? { cas, eas, tas, stallRatio } : { cas, eas, tas, ias, stallRatio };
}
