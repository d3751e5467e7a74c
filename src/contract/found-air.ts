import { type Air, airOf } from '../performance/air.ts';
import type { Fault } from '../planning/fault.ts';
import { type Q, si } from './quantity.ts';
import { checkAir } from './question-checks/check-air.ts';
import { toAirReport } from './to-weather.ts';
import type { StillWeatherOnWire } from './weather.ts';

/**
 * The air of a question without a runway, or every fault in what is said of it.
 *
 * @param elevation - at the top of the question; needed with a QNH
 */
export function foundAir(weather: StillWeatherOnWire, elevation: Q<'m' | 'km' | 'ft'> | undefined): Air | Fault[] {
  const faults = checkAir(weather, elevation);
  if ('qnh' in weather.pressure && elevation === undefined) {
    faults.push({
      pointer: '/elevation',
      code: 'missing',
      message: 'A QNH tells the pressure only at an elevation.',
      hint: 'Give elevation, or the pressure as pressureAltitude or stationPressure.',
    });
  }
  if (faults.length > 0) return faults;
  const found = airOf(toAirReport(weather), elevation && si('length', elevation));
  if (found.outcome === 'air') return found.air;
  return [
    {
      pointer: '/weather',
      code: 'out-of-range',
      message: 'This air lies outside the standard atmosphere.',
      ...('lowest' in found ? { allowed: `a ${found.of} of ${found.lowest} to ${found.highest} m` } : {}),
    },
  ];
}
