import type { ModelParameter } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';

/** Why a parameter is not free. */
export type Held = 'not-asked' | 'one-altitude' | 'one-temperature' | 'no-whole-distance' | 'no-ground-roll';

/** Least range of pressure altitude that shows a lapse [m], and of temperature beside it [K]. @see references.Judgement */
const leastAltitudeRange = 300;
const leastTemperatureRange = 5;

/**
 * Why a parameter is held at what is taken for it; undefined where it may be free.
 *
 * One altitude does not show the lapse with altitude. Neither one temperature nor one for each altitude on a straight line shows
 * the lapse with temperature. Without distances to the screen nothing shows the path in the air, without rolls nothing the brakes.
 *
 * @param asked - the parameters to free; absent: all that the points show
 * @see references.HouseFit
 */
export function heldBecause(
  { name }: Pick<ModelParameter, 'name'>,
  points: readonly FitPoint[],
  asked: readonly string[] | undefined,
): Held | undefined {
  if (asked !== undefined && !asked.includes(name)) return 'not-asked';
  if (
    name === 'altitudeLapseCoefficient' &&
    range(points.map(({ pressureAltitude }) => pressureAltitude)) < leastAltitudeRange
  ) {
    return 'one-altitude';
  }
  if (name === 'temperatureExponent' && range(besideAltitude(points)) < leastTemperatureRange) return 'one-temperature';
  const kinds = new Set(points.flatMap(({ observations }) => observations.map(({ kind }) => kind)));
  if ((name === 'airDragShift' || name === 'approachAngle') && !kinds.has('wholeDistance') && !kinds.has('height')) {
    return 'no-whole-distance';
  }
  if (name === 'brakingFrictionCoefficient' && !kinds.has('groundRoll')) return 'no-ground-roll';
  return undefined;
}

function range(values: readonly number[]): number {
  return Math.max(...values) - Math.min(...values);
}

/** Temperatures less their straight line against pressure altitude [K]. */
function besideAltitude(points: readonly FitPoint[]): number[] {
  const n = points.length;
  const meanAltitude = points.reduce((sum, { pressureAltitude }) => sum + pressureAltitude, 0) / n;
  const meanTemperature = points.reduce((sum, { temperature }) => sum + temperature, 0) / n;
  let square = 0;
  let product = 0;
  for (const { pressureAltitude, temperature } of points) {
    square += (pressureAltitude - meanAltitude) ** 2;
    product += (pressureAltitude - meanAltitude) * (temperature - meanTemperature);
  }
  const slope = square > 0 ? product / square : 0;
  return points.map(({ pressureAltitude, temperature }) => temperature - slope * (pressureAltitude - meanAltitude));
}
