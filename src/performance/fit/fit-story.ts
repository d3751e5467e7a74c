import { symmetricEigenvalues } from '../../numerics/symmetric-eigenvalues.ts';
import type { Work } from '../../numerics/work.ts';
import { altitudesLeftOut } from './altitudes-left-out.ts';
import { findingsBefore, liftFinding, parameterFindings, slipFinding } from './findings.ts';
import { type FitAsked, liftOf } from './fit-asked.ts';
import { type DistanceFit, fitDistances, isFit, type Placed, placed } from './fit-distances.ts';
import type { FitFinding } from './fit-finding.ts';
import type { FitModel } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';
import { acceptedGreatest, acceptedRms, type FitResidual, type FitResult } from './fit-result.ts';
import { outliers } from './outliers.ts';
import { byAxis, hullOf } from './residuals-by-axis.ts';
import { explainingSlip, screened } from './screened.ts';
import { heldBecause } from './shown-parameters.ts';
import { suggestedMeasurements } from './suggested-measurements.ts';

/**
 * A fit from points to verdict, in the order of the work: what is wrong at sight; whether the points go with the aeroplane, and
 * if not which slip explains it; figures that do not go with the rest; the fit; how far to trust it; where to measure next.
 *
 * @returns work that yields between its parts
 * @see references.HouseFit
 */
export function* fitStory<Name extends string>(asked: FitAsked): Work<FitResult<Name>> {
  const before = findingsBefore(asked);
  const model = asked.model(asked);
  if (model === undefined) return { outcome: 'not-fitted', findings: [...before, { code: 'not-computable', row: 0 }] };
  const places = placed(model);
  const held = model.parameters.map((parameter) => heldBecause(parameter, asked.points, asked.free));
  const free = held.map((because) => because === undefined);
  const freed = free.filter(Boolean).length;
  if (places.length < Math.max(2, freed)) {
    const few: FitFinding = { code: 'too-few-points', distances: places.length, parameters: freed };
    return { outcome: 'not-fitted', findings: [...before, few] };
  }

  const lift = liftFinding(liftOf(asked), asked.maximumLift);
  const reading = yield* screened(asked);
  yield;
  const slipped = reading?.sound === true ? undefined : yield* explainingSlip(asked);
  if (slipped !== undefined) {
    return { outcome: 'not-fitted', findings: [slipFinding(slipped, asked), ...before] };
  }

  if (lift.length > 0 && reading?.fits !== true) return { outcome: 'not-fitted', findings: [...lift, ...before] };

  const first = yield* fitDistances(model, {
    free,
    places,
    ...(reading?.sound === true ? { start: reading.values } : {}),
  });
  yield;
  const robust =
    isFit(first) && !farOff(first, places) ? first : yield* fitDistances(model, { free, robust: true, places });
  yield;
  if (!isFit(robust)) {
    const failed: FitFinding =
      typeof robust === 'object'
        ? { code: 'not-computable', row: (model.points[robust.point] as FitPoint).row }
        : { code: 'no-convergence' };
    return { outcome: 'not-fitted', findings: [...lift, ...before, failed] };
  }
  const odd = outliers(model, places, robust.logRatios);
  const leftOut = new Set(odd.map(({ place }) => place));
  const fit =
    odd.length === 0 && robust === first
      ? robust
      : yield* fitDistances(model, { free, counts: (place) => !leftOut.has(place), start: robust.values, places });
  if (!isFit(fit)) return { outcome: 'not-fitted', findings: [...lift, ...before, { code: 'no-convergence' }] };
  yield;

  const residuals = residualsOf(model, places, fit, leftOut);
  const counted = residuals.filter((residual) => !residual.leftOut);
  const rms = Math.sqrt(counted.reduce((sum, { logRatio }) => sum + logRatio ** 2, 0) / counted.length);
  const greatest = counted.reduce((most, one) => (Math.abs(one.logRatio) > Math.abs(most.logRatio) ? one : most));
  const findings: FitFinding[] = [
    ...lift,
    ...before,
    ...odd.map(({ place, exchanged }): FitFinding => {
      const { row, kind, given, computed } = residuals[places.indexOf(place)] as FitResidual;
      return { code: 'outlier', row, kind, given, computed, ...(exchanged === undefined ? {} : { exchanged }) };
    }),
    ...parameterFindings(model.parameters, free, fit),
  ];
  const certain = free.flatMap((isFree, j) => (isFree && fit.atBound[j] === undefined ? [j] : []));
  const leaveOneAltitudeOut = yield* altitudesLeftOut(asked, model, fit.values, leftOut, places);
  yield;
  const suggested = suggestedMeasurements(
    (points) => asked.model({ ...asked, points }),
    model.points,
    fit.values,
    fit.covariance,
    certain,
  );
  const correlation = correlationOf(fit.covariance, model.parameters.length);
  return {
    outcome: 'fitted',
    parameters: model.parameters.map(({ name, low, high, prior }, j) => ({
      name: name as Name,
      value: fit.values[j] as number,
      sd: Math.sqrt(fit.covariance[j * model.parameters.length + j] as number),
      held: held[j],
      atBound: fit.atBound[j],
      low,
      high,
      prior,
    })),
    correlation,
    conditionNumber: conditionNumber(correlation, certain),
    residuals,
    rms,
    greatest,
    byAxis: byAxis(model.points, places, fit.logRatios, leftOut),
    leaveOneAltitudeOut,
    accepted: findings.length === 0 && Math.abs(greatest.logRatio) < acceptedGreatest && rms < acceptedRms,
    findings,
    suggested,
    iterations: fit.iterations,
    hull: hullOf(model.points),
  };
}

/** Standard deviations beyond which one figure may have pulled the rest with it. */
const pulling = 3;

function farOff({ logRatios }: DistanceFit, places: readonly Placed[]): boolean {
  return places.some(({ observation }, i) => Math.abs(logRatios[i] as number) > pulling * observation.relativeSd);
}

function residualsOf(
  { points }: FitModel,
  places: readonly Placed[],
  { logRatios }: DistanceFit,
  leftOut: ReadonlySet<Placed>,
): FitResidual[] {
  return places.map((place, i) => {
    const { kind, distance } = place.observation;
    const logRatio = logRatios[i] as number;
    return {
      row: (points[place.point] as FitPoint).row,
      kind,
      given: distance,
      computed: distance * Math.exp(logRatio),
      logRatio,
      leftOut: leftOut.has(place),
    };
  });
}

function correlationOf(covariance: Float64Array, n: number): number[][] {
  const sd = Array.from({ length: n }, (_, j) => Math.sqrt(covariance[j * n + j] as number));
  return sd.map((row, j) =>
    sd.map((column, k) =>
      j === k ? 1 : row > 0 && column > 0 ? (covariance[j * n + k] as number) / (row * column) : 0,
    ),
  );
}

function conditionNumber(correlation: readonly (readonly number[])[], certain: readonly number[]): number {
  if (certain.length === 0) return 1;
  const matrix = Float64Array.from(certain.flatMap((j) => certain.map((k) => correlation[j]?.[k] ?? 0)));
  const eigenvalues = symmetricEigenvalues(matrix, certain.length);
  return Math.sqrt((eigenvalues.at(-1) as number) / (eigenvalues[0] as number));
}
