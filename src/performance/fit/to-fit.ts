import type { FitOf } from './fit.ts';
import type { FittedResult } from './fit-result.ts';

/**
 * A result as it is kept with the aeroplane.
 *
 * @param fittedTo - digest of the tables or runs
 */
export function toFit<Name extends string>(
  { parameters, correlation, rms, greatest, hull }: FittedResult<Name>,
  fittedTo: string,
  modelVersion: string,
): FitOf<Name> {
  const certain = parameters.flatMap(({ sd }, j) => (sd > 0 ? [j] : []));
  const record = (chosen: readonly (readonly [Name, number])[]) =>
    Object.fromEntries(chosen) as Partial<Record<Name, number>>;
  return {
    fittedTo,
    modelVersion,
    values: record(parameters.map(({ name, value }) => [name, value])),
    standardDeviations: record(parameters.filter(({ sd }) => sd > 0).map(({ name, sd }) => [name, sd])),
    correlation: certain.map((j) => certain.map((k) => correlation[j]?.[k] ?? 0)),
    rms,
    greatest: Math.abs(greatest.logRatio),
    hull,
  };
}
