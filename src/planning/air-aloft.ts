import type { Air } from '../performance/air.ts';
import { airOf } from '../performance/air.ts';
import { lapseRate } from '../physics/constants.ts';

/**
 * The air above the runway: standard lapse of temperature, pressure by altitude, moisture kept below saturation.
 *
 * @param air - at the runway
 * @param height - above it [m]
 */
export function airAloft({ temperature, dewPoint, pressureAltitude }: Air, height: number): Air {
  const aloft = temperature - lapseRate * height;
  const found = airOf({
    temperature: aloft,
    ...(dewPoint === undefined ? {} : { dewPoint: Math.min(dewPoint, aloft) }),
    pressure: { kind: 'pressureAltitude', value: pressureAltitude + height },
  });
  if (found.outcome !== 'air') throw new RangeError(`there is no air ${height} m above the runway`);
  return found.air;
}
