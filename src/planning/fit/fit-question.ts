import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { FitColumn } from '../../performance/fit/fit-finding.ts';
import type { Observation, StallMeasurement } from '../../performance/fit/fit-point.ts';
import type { ManualAxis, ManualOutput, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import type { UnitFamily } from '../../units/presentation.ts';
import type { Surface } from '../question.ts';

/** What a fit is asked, in SI. */
export interface FitQuestion {
  readonly aeroplane: Aeroplane;
  readonly aeroplaneAt: string;
  readonly configuration: string;
  readonly phase: 'takeoff' | 'landing';
  readonly tables: readonly FitTable[];
  readonly runs: readonly MeasuredRun[];
  readonly stalls: readonly StallMeasurement[];
  /** parameters to free; absent: all that the distances show */
  readonly free?: readonly string[];
  /** units in which columns and speeds are declared, where that is known */
  readonly declared: Readonly<Partial<Record<FitColumn, string>>>;
  readonly units: UnitFamily;
}

export interface FitTable {
  readonly table: ManualTable;
  /** pointer to a number of it, or to a whole row */
  readonly at: (row: number, column?: ManualAxis | ManualOutput) => string;
}

/** Distances that somebody measured. */
export interface MeasuredRun {
  /** pointer to it in the request */
  readonly at: string;
  readonly mass: number;
  readonly pressureAltitude: number;
  readonly temperature: number;
  readonly headwind: number;
  readonly slope: number;
  readonly surface: Surface;
  /** each with the pointer to it */
  readonly observations: readonly { readonly observation: Observation; readonly at: string }[];
}
