/**
 * Thrust of all running engines together against true airspeed, in one state of the air.
 *
 * Each propulsion kind makes one of these; the integrations know no more of an engine than this.
 */
export interface Thrust {
  /** thrust [N] at a true airspeed [m/s]; airspeeds below 0 count as 0; never negative */
  readonly at: (airspeed: number) => number;
  /** the same at n airspeeds in rising order, written to `out`: a solver warms from each to the next */
  readonly fill: (airspeeds: Float64Array, n: number, out: Float64Array) => void;
  /** airspeeds [m/s] at which the slope jumps: a quadrature is split there */
  readonly kinks: readonly number[];
  /** true airspeeds [m/s] inside which there are data; absent: no bound but the method's */
  readonly domain?: readonly [lowest: number, highest: number];
  /** true where the thrust falls with the square root of the airspeed from rest: a quadrature then substitutes V = u^2 */
  readonly squareRootAtRest?: boolean;
}
