import type { Placed } from './fit-distances.ts';
import type { FitPoint } from './fit-point.ts';
import type { AxisResiduals, FittedResult } from './fit-result.ts';

const axes = ['mass', 'pressureAltitude', 'temperature'] as const;

/** ln(computed/given) by the value of each axis that has more than one; those left out do not count. */
export function byAxis(
  points: readonly FitPoint[],
  places: readonly Placed[],
  logRatios: Float64Array,
  leftOut: ReadonlySet<Placed>,
): AxisResiduals[] {
  return axes.flatMap((axis) => {
    const groups = new Map<number, number[]>();
    places.forEach((place, i) => {
      if (leftOut.has(place)) return;
      const value = (points[place.point] as FitPoint)[axis];
      groups.set(value, [...(groups.get(value) ?? []), logRatios[i] as number]);
    });
    if (groups.size < 2) return [];
    const values = [...groups]
      .sort(([a], [b]) => a - b)
      .map(([value, ratios]) => ({
        value,
        mean: ratios.reduce((sum, ratio) => sum + ratio, 0) / ratios.length,
        rms: Math.sqrt(ratios.reduce((sum, ratio) => sum + ratio * ratio, 0) / ratios.length),
      }));
    return [{ axis, values }];
  });
}

/** The range of each axis over the points. */
export function hullOf(points: readonly FitPoint[]): FittedResult['hull'] {
  const range = (axis: (typeof axes)[number]): readonly [number, number] => {
    const values = points.map((point) => point[axis]);
    return [Math.min(...values), Math.max(...values)];
  };
  return {
    mass: range('mass'),
    pressureAltitude: range('pressureAltitude'),
    temperature: range('temperature'),
  };
}
