import type { FitPoint } from './fit-point.ts';

/** One parameter that may be fitted. */
export interface ModelParameter<Name extends string = string> {
  readonly name: Name;
  readonly low: number;
  readonly high: number;
  readonly prior: { readonly mean: number; readonly sd: number };
  /** where it is held, where the points do not show it */
  readonly held: number;
  /** beyond which a slip is likelier than such an aeroplane */
  readonly plausible: readonly [low: number, high: number];
}

/** Distances against parameters: everything else of the aeroplane and the procedure is settled. */
export interface FitModel<Name extends string = string> {
  readonly parameters: readonly ModelParameter<Name>[];
  readonly points: readonly FitPoint[];
  /** with these parameters: writes the distance of each observation of a point [m]; false where there is none */
  readonly at: (parameters: Float64Array) => (point: number, out: Float64Array) => boolean;
}
