import type { Placed } from './fit-distances.ts';
import type { FitModel } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';
import { isMultiple } from './rounding-step.ts';
import { placing, squaredDistance } from './spread-points.ts';

/** A figure that does not go with the rest. */
export interface Outlier {
  readonly place: Placed;
  /** the printed figure with two neighbouring digits exchanged, where that goes with the rest [m] */
  readonly exchanged?: number;
}

/** Standard deviations from the fit that no figure of a table of a hundred has by chance. */
const farFromFit = 4.5;
/** The same from its neighbours, for a figure that an exchange of digits would put right. */
const farFromNeighbours = 6;
/** Standard deviations from the fit within which an exchanged figure goes with the rest. */
const goesWithFit = 2.5;
const neighbours = 4;
/** Least scatter among neighbours, over the distance: a smooth table is still rounded. */
const leastScatter = 0.002;

/**
 * The figures of a table that do not go with the rest: far from a robust fit; or far from what their neighbours are from it,
 * where an exchange of two digits would put them right.
 *
 * A figure that is no multiple of its column's rounding step, and would be with two digits exchanged, counts as far.
 *
 * @param logRatios - ln(computed/given) of a robust fit
 * @see references.HouseFit
 */
export function outliers(
  { points }: Pick<FitModel, 'points'>,
  places: readonly Placed[],
  logRatios: Float64Array,
): Outlier[] {
  const scale = Math.max(
    1,
    1.4826 * median(places.map(({ observation }, i) => Math.abs((logRatios[i] as number) / observation.relativeSd))),
  );
  const beside = besideNeighbours(points, places, logRatios);
  return places.flatMap((place, i): Outlier[] => {
    const { distance, relativeSd, printed } = place.observation;
    const ratio = logRatios[i] as number;
    const { difference, scatter } = beside[i] as Beside;
    const exchanged = exchangedThatGoes(place, ratio, difference, Math.max(scatter, relativeSd / 2));
    const offStep = printed !== undefined && printed.step >= 5 * printed.unit && !isMultiple(distance, printed.step);
    const far =
      Math.abs(ratio) > farFromFit * scale * relativeSd ||
      (exchanged !== undefined && (Math.abs(difference) > farFromNeighbours * scatter || offStep));
    if (!far) return [];
    return [exchanged === undefined ? { place } : { place, exchanged }];
  });
}

interface Beside {
  /** of ln(computed/given) from the median of the neighbours' */
  readonly difference: number;
  /** usual size of such differences in the column */
  readonly scatter: number;
}

function besideNeighbours(points: readonly FitPoint[], places: readonly Placed[], logRatios: Float64Array): Beside[] {
  const at = points.map(placing(points));
  const differences = places.map((place, i) => {
    const here = at[place.point] as (typeof at)[number];
    const near = places
      .map((other, k) => ({ other, k, squared: squaredDistance(here, at[other.point] as typeof here) }))
      .filter(({ other, k }) => k !== i && other.observation.kind === place.observation.kind)
      .sort((a, b) => a.squared - b.squared)
      .slice(0, neighbours)
      .map(({ k }) => logRatios[k] as number);
    return near.length < neighbours ? 0 : (logRatios[i] as number) - median(near);
  });
  return places.map(({ observation }, i) => {
    const column = differences.filter((_, k) => places[k]?.observation.kind === observation.kind);
    const scatter = Math.max(leastScatter, 1.4826 * median(column.map(Math.abs)));
    return { difference: differences[i] as number, scatter };
  });
}

/** The exchange of two neighbouring digits that brings a figure to its neighbours or to the fit, where one does. */
function exchangedThatGoes(
  { observation }: Placed,
  ratio: number,
  difference: number,
  scatter: number,
): number | undefined {
  const { distance, printed } = observation;
  if (printed === undefined) return undefined;
  const { unit, step } = printed;
  return exchanges(Math.round(distance / unit))
    .map((figure) => figure * unit)
    .filter((other) => step < 5 * unit || isMultiple(other, step))
    .find((other) => {
      const change = Math.log(distance / other);
      const goes =
        Math.abs(difference + change) < 3 * scatter || Math.abs(ratio + change) < goesWithFit * observation.relativeSd;
      return goes && Math.abs(ratio + change) < Math.abs(ratio) / 3;
    });
}

/** A whole number with two neighbouring digits exchanged, each way that makes another. */
function exchanges(figure: number): number[] {
  const digits = String(figure);
  return Array.from({ length: Math.max(0, digits.length - 1) }, (_, i) =>
    Number(digits.slice(0, i) + digits[i + 1] + digits[i] + digits.slice(i + 2)),
  ).filter((other) => other !== figure && other > 0);
}

function median(values: readonly number[]): number {
  if (values.length === 0) return 0;
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1
    ? (sorted[middle] as number)
    : ((sorted[middle - 1] as number) + (sorted[middle] as number)) / 2;
}
