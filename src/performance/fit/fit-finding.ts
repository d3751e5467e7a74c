import type { ObservationKind } from './fit-point.ts';

/** What a finding is about: a column of the table, both columns of distances, or the speeds of the procedure. */
export type FitColumn =
  | 'groundRoll'
  | 'wholeDistance'
  | 'distances'
  | 'mass'
  | 'pressureAltitude'
  | 'temperature'
  | 'maximumLift'
  | 'speeds';

/** Something wrong or odd about what was to be fitted, or about what came of it. Every one of them speaks against the fit. */
export type FitFinding =
  /** a column is printed in one unit and declared in another; the misfit of both readings, rms of ln(computed/given) */
  | {
      readonly code: 'unit-error';
      readonly column: FitColumn;
      readonly printed: string;
      readonly declared: string;
      readonly rmsIfSo: number;
    }
  /** ground roll and whole distance stand in each other's place */
  | { readonly code: 'columns-swapped'; readonly rows: number }
  /** one figure does not go with the rest; with the figure that two exchanged digits would make of it, where that goes */
  | {
      readonly code: 'outlier';
      readonly kind: ObservationKind;
      readonly row: number;
      /** [m] */
      readonly given: number;
      readonly computed: number;
      readonly exchanged?: number;
    }
  /** more or less lift than such wings have: a stall speed that is indicated, or in another unit */
  | {
      readonly code: 'stall-speed-indicated' | 'stall-speed-unit' | 'maximum-lift-odd';
      readonly coefficient: number;
      readonly range: readonly [low: number, high: number];
      /** the units that explain it, where some do */
      readonly printed?: string;
      readonly declared?: string;
    }
  /** rows of a table beyond where tables are made */
  | {
      readonly code: 'node-outside';
      readonly column: 'mass' | 'temperature';
      readonly row: number;
      readonly rows: number;
      readonly given: number;
      readonly bound: number;
    }
  | {
      readonly code: 'parameter-at-bound' | 'parameter-implausible';
      readonly parameter: string;
      readonly value: number;
      readonly range: readonly [low: number, high: number];
    }
  /** no distance comes of a row with any thrust or braking within the bounds */
  | { readonly code: 'not-computable'; readonly row: number }
  | { readonly code: 'too-few-points'; readonly distances: number; readonly parameters: number }
  | { readonly code: 'no-convergence' };
