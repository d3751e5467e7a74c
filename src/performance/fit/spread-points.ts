import type { FitPoint } from './fit-point.ts';

/** Where a point lies among others: mass, pressure altitude and temperature, each over its range; 0 where there is no range. */
export type Placing = (point: FitPoint) => readonly [number, number, number];

export function placing(points: readonly FitPoint[]): Placing {
  const scale = (value: (point: FitPoint) => number): ((point: FitPoint) => number) => {
    const values = points.map(value);
    const low = Math.min(...values);
    const range = Math.max(...values) - low;
    return (point) => (range > 0 ? (value(point) - low) / range : 0);
  };
  const mass = scale((point) => point.mass);
  const altitude = scale((point) => point.pressureAltitude);
  const temperature = scale((point) => point.temperature);
  return (point) => [mass(point), altitude(point), temperature(point)];
}

export function squaredDistance(a: readonly [number, number, number], b: readonly [number, number, number]): number {
  return (a[0] - b[0]) ** 2 + (a[1] - b[1]) ** 2 + (a[2] - b[2]) ** 2;
}

/**
 * A few of many points, spread over their conditions: each next one is the farthest from those already chosen.
 *
 * @param count - at most
 */
export function spreadPoints(points: readonly FitPoint[], count: number): FitPoint[] {
  if (points.length <= count) return [...points];
  const place = placing(points);
  const places = points.map(place);
  const nearest = places.map((at) => squaredDistance(at, places[0] as (typeof places)[number]));
  const chosen = [0];
  while (chosen.length < count) {
    const next = nearest.indexOf(Math.max(...nearest));
    chosen.push(next);
    places.forEach((at, i) => {
      nearest[i] = Math.min(nearest[i] as number, squaredDistance(at, places[next] as (typeof places)[number]));
    });
  }
  return chosen.sort((a, b) => a - b).map((i) => points[i] as FitPoint);
}
