import { type LeastSquares, leastSquares, type Residuals, type Search } from '../../numerics/least-squares.ts';
import type { Work } from '../../numerics/work.ts';
import type { FitModel, ModelParameter } from './fit-model.ts';
import type { Observation } from './fit-point.ts';

/** One observation of a model's points, in the order of the points and of their observations. */
export interface Placed {
  readonly point: number;
  readonly index: number;
  readonly observation: Observation;
}

export function placed({ points }: Pick<FitModel, 'points'>): Placed[] {
  return points.flatMap(({ observations }, point) =>
    observations.map((observation, index) => ({ point, index, observation })),
  );
}

export interface DistanceFit {
  readonly outcome: 'fit';
  /** of all parameters, the held ones included */
  readonly values: Float64Array;
  /** of all parameters, row after row; zero where held or at a bound */
  readonly covariance: Float64Array;
  readonly atBound: readonly ('low' | 'high' | undefined)[];
  /** ln(computed/given) of every observation, those left out included; NaN is never written: Infinity where none is computed */
  readonly logRatios: Float64Array;
  readonly sumOfSquares: number;
  readonly iterations: number;
}

export type Fitted =
  | DistanceFit
  | Exclude<Exclude<LeastSquares, { outcome: 'solution' }>['outcome'], 'no-residuals'>
  | NotComputable;

/** No distance at this point with any thrust or braking inside the bounds. */
export interface NotComputable {
  readonly outcome: 'not-computable';
  readonly point: number;
}

export interface FitOptions {
  /** which parameters are free */
  readonly free: readonly boolean[];
  /** which observations count; absent: all */
  readonly counts?: ((place: Placed) => boolean) | undefined;
  /** Cauchy's measure in place of the square: a few figures that are far off do not pull the rest */
  readonly robust?: boolean;
  /** where to begin; absent: the priors' means, held ones where they are held */
  readonly start?: Float64Array;
  /** how far to search; absent: to the minimum */
  readonly search?: Search;
  /** of the model's points, where they are known already: `counts` may go by their identity */
  readonly places?: readonly Placed[];
}

/** Residual in standard deviations at which Cauchy's measure turns from square to logarithm; 95 % efficient for normal errors. */
const cauchyScale = 2.385;

/**
 * Least squares of ln(computed/given) over its standard deviation, with the priors of the free parameters.
 *
 * @returns work, and then the fit or the name of why there is none
 * @see references.HouseFit; references.HollandWelsch1977 for the robust measure
 */
export function* fitDistances(
  model: FitModel,
  { free, counts, robust = false, start, search, places = placed(model) }: FitOptions,
): Work<Fitted> {
  const used = places.filter((place) => counts?.(place) ?? true);
  const chosen = model.parameters.flatMap((_, j) => (free[j] === true ? [j] : []));
  const values = start === undefined ? startOf(model.parameters, free) : Float64Array.from(start);
  const logarithms = new Float64Array(
    model.points.reduce((most, { observations }) => Math.max(most, observations.length), 0),
  );
  const atPoints = new Set(used.map(({ point }) => point));

  const residuals: Residuals = (parameters, out) => {
    chosen.forEach((j, i) => {
      values[j] = parameters[i] as number;
    });
    const compute = model.at(values);
    let done = -1;
    for (let i = 0; i < used.length; i++) {
      const { point, index, observation } = used[i] as Placed;
      if (point !== done && !compute(point, logarithms)) return false;
      done = point;
      const residual = Math.log((logarithms[index] as number) / observation.distance) / observation.relativeSd;
      out[i] = robust ? cauchy(residual) : residual;
    }
    return true;
  };

  const first = startable(model, values, chosen, [...atPoints]);
  if (typeof first === 'object') return first;
  const found = yield* leastSquares(
    residuals,
    used.length,
    chosen.map((j) => {
      const { low, high, prior } = model.parameters[j] as ModelParameter;
      return { low, high, prior, start: values[j] as number, scale: prior.sd };
    }),
    search,
  );
  if (found.outcome === 'no-residuals')
    return { outcome: 'not-computable', point: firstWithout(model, values, [...atPoints]) };
  if (found.outcome !== 'solution') return found.outcome;
  chosen.forEach((j, i) => {
    values[j] = found.parameters[i] as number;
  });
  return {
    outcome: 'fit',
    values,
    covariance: spread(found.covariance, chosen, model.parameters.length),
    atBound: model.parameters.map((_, j) => found.atBound[chosen.indexOf(j)]),
    logRatios: logRatios(model, values),
    sumOfSquares: found.sumOfSquares,
    iterations: found.iterations,
  };
}

export function isFit(fitted: Fitted): fitted is DistanceFit {
  return typeof fitted === 'object' && fitted.outcome === 'fit';
}

/** ln(computed/given) of every observation; Infinity where none is computed. */
export function logRatios(model: FitModel, values: Float64Array): Float64Array {
  const compute = model.at(values);
  return Float64Array.from(
    model.points.flatMap(({ observations }, point) => {
      const out = new Float64Array(observations.length);
      const computed = compute(point, out);
      return observations.map(({ distance }, i) =>
        computed ? Math.log((out[i] as number) / distance) : Number.POSITIVE_INFINITY,
      );
    }),
  );
}

function cauchy(residual: number): number {
  return Math.sign(residual) * cauchyScale * Math.sqrt(Math.log1p((residual / cauchyScale) ** 2));
}

function startOf(parameters: readonly ModelParameter[], free: readonly boolean[]): Float64Array {
  return Float64Array.from(parameters, ({ prior, held }, j) => (free[j] === true ? prior.mean : held));
}

/** Moves the first free parameter up its range until every point has distances: more thrust, more braking. */
function startable(
  model: FitModel,
  values: Float64Array,
  chosen: readonly number[],
  points: readonly number[],
): true | NotComputable {
  const raised = chosen[0];
  let missing = firstWithout(model, values, points);
  if (missing < 0) return true;
  if (raised !== undefined) {
    const from = values[raised] as number;
    const { high } = model.parameters[raised] as ModelParameter;
    for (const share of [0.25, 0.5, 0.75, 0.95]) {
      values[raised] = from + share * (high - from);
      missing = firstWithout(model, values, points);
      if (missing < 0) return true;
    }
  }
  return { outcome: 'not-computable', point: missing };
}

function firstWithout(model: FitModel, values: Float64Array, points: readonly number[]): number {
  const compute = model.at(values);
  const out = new Float64Array(
    points.reduce((most, i) => Math.max(most, model.points[i]?.observations.length ?? 0), 0),
  );
  return points.find((point) => !compute(point, out)) ?? -1;
}

function spread(covariance: Float64Array, chosen: readonly number[], n: number): Float64Array {
  const whole = new Float64Array(n * n);
  chosen.forEach((j, row) => {
    chosen.forEach((k, column) => {
      whole[j * n + k] = covariance[row * chosen.length + column] as number;
    });
  });
  return whole;
}
