/** One condition under which distances were published or measured, in SI. */
export interface FitPoint {
  /** row of the table, or number of the run, from 0 */
  readonly row: number;
  readonly mass: number;
  readonly pressureAltitude: number;
  /** [K] */
  readonly temperature: number;
  /** on the nose positive [m/s] */
  readonly headwind: number;
  /** uphill positive */
  readonly slope: number;
  /** free-rolling friction; of no account in a landing */
  readonly rollingFriction: number;
  readonly observations: readonly Observation[];
}

interface Seen {
  /** from brake release, or from the screen [m] */
  readonly distance: number;
  /** standard deviation over the distance */
  readonly relativeSd: number;
  /** how a table prints it: [m] one printed unit, and the step to which the column is rounded */
  readonly printed?: { readonly unit: number; readonly step: number };
}

/** One distance at a condition. */
export type Observation =
  /** to lift-off, or from touchdown to the stop */
  | (Seen & { readonly kind: 'groundRoll' })
  /** to the screen, or from it to the stop */
  | (Seen & { readonly kind: 'wholeDistance' })
  /** at which a height below the screen was crossed [m]; takeoff only */
  | (Seen & { readonly kind: 'height'; readonly height: number })
  /** at which a speed was reached in the roll [m/s]; takeoff only */
  | (Seen & { readonly kind: 'marker'; readonly speed: number; readonly of: 'ground' | 'cas' });

export type ObservationKind = Observation['kind'];

/** A stall speed that was measured: CAS [m/s] at a mass [kg], and its standard deviation over it. */
export interface StallMeasurement {
  readonly cas: number;
  readonly mass: number;
  readonly relativeSd: number;
}

/** Scatter of published figures about any physics, beside their rounding. @see references.HouseFit */
export const tableScatter = 0.015;

/**
 * Standard deviation over a printed distance: sqrt(0.015^2 + (half a rounding step/s)^2/3).
 *
 * @param distance - s, above 0 [m]
 * @param step - of the rounding [m]
 * @see references.HouseFit
 */
export function printedSd(distance: number, step: number): number {
  return Math.sqrt(tableScatter ** 2 + (step / 2 / distance) ** 2 / 3);
}

/** Standard deviation of a distance at which a speed was read, over it: a roll goes with the square of the speed. */
export function markerSd(relativeSdOfSpeed: number, relativeSdOfDistance: number): number {
  return Math.hypot(2 * relativeSdOfSpeed, relativeSdOfDistance);
}
