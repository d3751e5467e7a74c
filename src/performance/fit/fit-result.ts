import type { FitFinding } from './fit-finding.ts';
import type { ObservationKind } from './fit-point.ts';
import type { Held } from './shown-parameters.ts';
import type { Suggested } from './suggested-measurements.ts';

/** What came of a fit: parameters with all that tells how far to trust them, or findings alone. */
export type FitResult<Name extends string = string> = FittedResult<Name> | UnfittedResult;

export interface UnfittedResult {
  readonly outcome: 'not-fitted';
  readonly findings: readonly FitFinding[];
}

export interface FittedResult<Name extends string = string> {
  readonly outcome: 'fitted';
  readonly parameters: readonly FittedParameter<Name>[];
  /** between the parameters, in their order; 0 beside a held one, 1 with itself */
  readonly correlation: readonly (readonly number[])[];
  /** of the free parameters, each in units of its standard deviation: greatest over least axis of the ellipsoid */
  readonly conditionNumber: number;
  readonly residuals: readonly FitResidual[];
  /** of ln(computed/given), those left out not counted */
  readonly rms: number;
  readonly greatest: FitResidual;
  readonly byAxis: readonly AxisResiduals[];
  /** each altitude predicted from a fit to the others; empty with fewer than three */
  readonly leaveOneAltitudeOut: readonly AltitudeLeftOut[];
  readonly accepted: boolean;
  readonly findings: readonly FitFinding[];
  readonly suggested: Suggested | undefined;
  /** rounds of the search */
  readonly iterations: number;
  /** the range of the conditions, SI: low and high */
  readonly hull: Readonly<Record<'mass' | 'pressureAltitude' | 'temperature', readonly [number, number]>>;
}

export interface FittedParameter<Name extends string = string> {
  readonly name: Name;
  readonly value: number;
  /** 0 where held or at a bound */
  readonly sd: number;
  readonly held: Held | undefined;
  readonly atBound: 'low' | 'high' | undefined;
  readonly low: number;
  readonly high: number;
  readonly prior: { readonly mean: number; readonly sd: number };
}

export interface FitResidual {
  readonly row: number;
  readonly kind: ObservationKind;
  /** [m] */
  readonly given: number;
  readonly computed: number;
  readonly logRatio: number;
  /** it did not count in the fit */
  readonly leftOut: boolean;
}

export interface AxisResiduals {
  readonly axis: 'mass' | 'pressureAltitude' | 'temperature';
  readonly values: readonly { readonly value: number; readonly mean: number; readonly rms: number }[];
}

export interface AltitudeLeftOut {
  readonly pressureAltitude: number;
  readonly rms: number;
  readonly greatest: number;
}

/** Within which a fit is accepted: every |ln(computed/given)|, and their rms. @see references.HouseFit */
export const acceptedGreatest = 0.05;
export const acceptedRms = 0.03;
