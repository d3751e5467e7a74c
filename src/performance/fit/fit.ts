import type { LandingParameter } from './landing-model.ts';
import type { TakeoffParameter } from './takeoff-parameters.ts';

/** What an aeroplane was fitted to, by the id of the configuration. */
export interface Fit {
  readonly takeoff?: Readonly<Record<string, TakeoffFit>>;
  readonly landing?: Readonly<Record<string, LandingFit>>;
}

/** Figures of a fit, and how far they hold. */
export interface FitOf<Name extends string> {
  /** digest of the tables or runs it was fitted to */
  readonly fittedTo: string;
  readonly modelVersion: string;
  /** SI; a parameter that was held is there with what it was held at */
  readonly values: Readonly<Partial<Record<Name, number>>>;
  /** absent where held */
  readonly standardDeviations: Readonly<Partial<Record<Name, number>>>;
  /** of those with a standard deviation, in their order */
  readonly correlation: readonly (readonly number[])[];
  /** of ln(computed/given) */
  readonly rms: number;
  readonly greatest: number;
  /** range of the conditions it was fitted to, SI */
  readonly hull: Readonly<Record<'mass' | 'pressureAltitude' | 'temperature', readonly [low: number, high: number]>>;
}

export interface TakeoffFit extends FitOf<TakeoffParameter> {
  /** what it was fitted to states dry air: then moisture still takes its power */
  readonly dryAir?: boolean;
}

export type LandingFit = FitOf<LandingParameter>;
