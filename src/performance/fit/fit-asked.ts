import type { Category, MaximumLift } from '../aeroplane.ts';
import { maximumLiftCoefficient } from '../speeds/maximum-lift-coefficient.ts';
import type { FitColumn } from './fit-finding.ts';
import type { FitModel } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';
import { maximumLiftRange } from './maximum-lift-range.ts';

/** What is to be fitted, takeoff or landing alike. */
export interface FitAsked {
  readonly phase: 'takeoff' | 'landing';
  readonly category: Category;
  readonly wingArea: number;
  /** of the phase [kg] */
  readonly maximumMass: number;
  readonly flap: number;
  readonly maximumLift: MaximumLift;
  /** calibrated speeds of the procedure over what they are declared to be; 1 but where a slip is tried */
  readonly speedFactor: number;
  readonly points: readonly FitPoint[];
  /** undefined: nothing can be computed there */
  readonly model: (asked: Pick<FitAsked, 'maximumLift' | 'speedFactor' | 'points'>) => FitModel | undefined;
  /** units in which columns and speeds are declared, where that is known: only slips from them are tried */
  readonly declared?: Readonly<Partial<Record<FitColumn, string>>> | undefined;
  /** parameters to free; absent: all that the points show */
  readonly free?: readonly string[] | undefined;
}

/** Where tables are made: temperature [K]. @see references.HouseFit */
export const coldestNode = 273.15 - 45;
export const hottestNode = 273.15 + 50;

/** Share of the maximum mass by which a row may exceed it: the one is often printed in lb and the other in kg, each rounded. */
export const massRounding = 0.005;

/** Whether no row lies beyond where tables are made. */
export function nodesInside({ points, maximumMass }: FitAsked): boolean {
  return points.every(
    ({ mass, temperature }) =>
      mass <= maximumMass * (1 + massRounding) &&
      temperature >= coldestNode - 1e-9 &&
      temperature <= hottestNode + 1e-9,
  );
}

/** Greatest lift coefficient as declared, and the range of such wings. */
export function liftOf({ category, phase, flap, maximumLift, wingArea }: FitAsked): {
  readonly coefficient: number;
  readonly range: readonly [number, number];
} {
  return { coefficient: maximumLiftCoefficient(maximumLift, wingArea), range: maximumLiftRange(category, phase, flap) };
}
