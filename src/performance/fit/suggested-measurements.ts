import { cholesky, choleskyInverse, choleskySolution } from '../../numerics/cholesky.ts';
import { differenceJacobian } from '../../numerics/difference-jacobian.ts';
import type { FitModel } from './fit-model.ts';
import { type FitPoint, tableScatter } from './fit-point.ts';
import { spreadPoints } from './spread-points.ts';

/** A condition that would tell most, and what the fit would be like with it and those before it. */
export interface SuggestedMeasurement {
  readonly mass: number;
  readonly pressureAltitude: number;
  readonly temperature: number;
  /** standard deviation of the whole distance by the parameters alone, its greatest over the conditions of the table */
  readonly greatestSdAfter: number;
}

export interface Suggested {
  readonly greatestSd: number;
  readonly measurements: readonly SuggestedMeasurement[];
}

const corners = 6;
const nodes = 12;

/**
 * The conditions, inside those of the points, at which further distances would shrink the parameters' uncertainty most: one after
 * the other that which makes the determinant of the information greatest, none of them twice.
 *
 * @param model - of a condition's distances
 * @param values - of all parameters
 * @param covariance - of all parameters, row after row
 * @param free - the parameters that are free and at no bound
 * @param count - how many
 * @see references.Atkinson1992 for D-optimal designs
 */
export function suggestedMeasurements(
  build: (points: readonly FitPoint[]) => FitModel | undefined,
  points: readonly FitPoint[],
  values: Float64Array,
  covariance: Float64Array,
  free: readonly number[],
  count = 5,
): Suggested | undefined {
  const candidates = conditionsInside(points);
  const model = build(candidates);
  if (model === undefined || free.length === 0) return undefined;
  const n = free.length;
  const size = model.parameters.length;
  const own = Float64Array.from(free.flatMap((j) => free.map((k) => covariance[j * size + k] as number)));
  const lower = cholesky(own, n);
  if (lower === undefined) return undefined;
  const information = choleskyInverse(lower, n);
  const rows = sensitivities(model, values, free);
  if (rows === undefined) return undefined;

  const greatestSd = greatest(rows, information, n);
  const measurements: SuggestedMeasurement[] = [];
  const chosen = new Set<number>();
  for (let i = 0; i < Math.min(count, candidates.length); i++) {
    const factor = cholesky(information, n);
    if (factor === undefined) return undefined;
    const gains = rows.map((observed, k) => (chosen.has(k) ? 0 : gain(observed, factor, n)));
    const best = gains.indexOf(Math.max(...gains));
    chosen.add(best);
    for (const row of rows[best] as readonly Float64Array[]) add(information, row, n);
    const { mass, pressureAltitude, temperature } = candidates[best] as FitPoint;
    measurements.push({ mass, pressureAltitude, temperature, greatestSdAfter: greatest(rows, information, n) });
  }
  return { greatestSd, measurements };
}

/** Nodes, and points half way between those farthest from each other: inside the hull of the conditions, whatever its shape. */
function conditionsInside(points: readonly FitPoint[]): FitPoint[] {
  const ends = spreadPoints(points, corners);
  const between = ends.flatMap((a, i) =>
    ends.slice(i + 1).map((b) => ({
      ...a,
      mass: (a.mass + b.mass) / 2,
      pressureAltitude: (a.pressureAltitude + b.pressureAltitude) / 2,
      temperature: (a.temperature + b.temperature) / 2,
    })),
  );
  const kinds = ['groundRoll', 'wholeDistance'] as const;
  const observations = kinds.map((kind) => ({ kind, distance: 1, relativeSd: tableScatter }));
  return [...spreadPoints(points, nodes), ...between].map((point) => ({
    ...point,
    headwind: 0,
    slope: 0,
    observations,
  }));
}

/** Derivatives of ln(distance)/scatter by candidate and distance, against the free parameters. */
function sensitivities(model: FitModel, values: Float64Array, free: readonly number[]): Float64Array[][] | undefined {
  const all = Float64Array.from(values);
  const out = new Float64Array(2);
  const residuals = (chosen: Float64Array, into: Float64Array): boolean => {
    free.forEach((j, i) => {
      all[j] = chosen[i] as number;
    });
    const compute = model.at(all);
    return model.points.every((_, point) => {
      if (!compute(point, out)) return false;
      into[2 * point] = Math.log(out[0] as number) / tableScatter;
      into[2 * point + 1] = Math.log(out[1] as number) / tableScatter;
      return true;
    });
  };
  const count = 2 * model.points.length;
  const here = Float64Array.from(free, (j) => values[j] as number);
  const at = new Float64Array(count);
  const jacobian = new Float64Array(free.length * count);
  const parameters = free.map((j) => {
    const { low, high, prior } = model.parameters[j] as FitModel['parameters'][number];
    return { low, high, scale: prior.sd };
  });
  if (!residuals(here, at) || !differenceJacobian(residuals, parameters, here, at, jacobian)) return undefined;
  return model.points.map((_, point) =>
    [0, 1].map((k) => Float64Array.from(free, (__, i) => jacobian[i * count + 2 * point + k] as number)),
  );
}

/** How much a condition's distances add to the determinant: the sum of their variances, in units of the scatter's. */
function gain(observed: readonly Float64Array[], factor: Float64Array, n: number): number {
  return observed.reduce((sum, row) => sum * (1 + variance(row, factor, n)), 1);
}

function variance(row: Float64Array, factor: Float64Array, n: number): number {
  const solved = choleskySolution(factor, n, row);
  return row.reduce((sum, value, j) => sum + value * (solved[j] as number), 0);
}

/** Greatest standard deviation of ln(whole distance) over the candidates. */
function greatest(rows: readonly (readonly Float64Array[])[], information: Float64Array, n: number): number {
  const factor = cholesky(information, n);
  if (factor === undefined) return Number.POSITIVE_INFINITY;
  return tableScatter * Math.sqrt(Math.max(...rows.map(([, whole]) => variance(whole as Float64Array, factor, n))));
}

function add(information: Float64Array, row: Float64Array, n: number): void {
  for (let j = 0; j < n; j++) {
    for (let k = 0; k < n; k++) {
      information[j * n + k] = (information[j * n + k] as number) + (row[j] as number) * (row[k] as number);
    }
  }
}
