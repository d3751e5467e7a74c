import type { EngineAir } from './engine-air.ts';
import type { Thrust } from './thrust.ts';

/** Thrust measured against airspeed. */
export interface MeasuredEngine {
  /** true airspeeds [m/s], strictly rising, at least two */
  readonly airspeeds: readonly number[];
  /** of one engine at each [N], 0 or more */
  readonly thrusts: readonly number[];
  /** at which it was measured [kg/m3] */
  readonly density: number;
  /** of the thrust on the density ratio */
  readonly densityExponent: number;
  readonly thrustFactor: number;
}

/** Beyond its rows by less than this share a speed is the end row itself: sums of speeds do not come back to the last digit. */
const rounding = 1e-12;

/**
 * Thrust by a measured curve, linear between its rows: T = N k (rho/rho_measured)^x T_row(V).
 *
 * @param engine - the rows of one engine
 * @param engines - N, those that run
 * @param air - density only
 * @returns the thrust against true airspeed inside `domain`; outside it `at` and `fill` throw a RangeError
 */
export function measuredThrust(engine: MeasuredEngine, engines: number, air: EngineAir): Thrust {
  const axis = Float64Array.from(engine.airspeeds);
  const scale = engines * engine.thrustFactor * (air.density / engine.density) ** engine.densityExponent;
  const values = Float64Array.from(engine.thrusts, (thrust) => scale * thrust);
  requireRows(axis, values);
  const lowest = axis[0] as number;
  const highest = axis[axis.length - 1] as number;

  const at = (airspeed: number): number => {
    const speed = within(Math.max(airspeed, 0), lowest, highest);
    let row = 1;
    while ((axis[row] as number) < speed) row++;
    return between(axis, values, row, speed);
  };
  const fill = (airspeeds: Float64Array, n: number, out: Float64Array): void => {
    let row = 1;
    for (let i = 0; i < n; i++) {
      const speed = within(Math.max(0, airspeeds[i] as number), lowest, highest);
      while ((axis[row] as number) < speed) row++;
      out[i] = between(axis, values, row, speed);
    }
  };
  return { at, fill, kinks: engine.airspeeds.slice(1, -1), domain: [lowest, highest] };
}

function between(axis: Float64Array, values: Float64Array, row: number, speed: number): number {
  const from = axis[row - 1] as number;
  const share = (speed - from) / ((axis[row] as number) - from);
  return (values[row - 1] as number) * (1 - share) + (values[row] as number) * share;
}

function requireRows(axis: Float64Array, values: Float64Array): void {
  const rising = axis.every((airspeed, i) => i === 0 || airspeed > (axis[i - 1] as number));
  if (axis.length < 2 || axis.length !== values.length || !rising) {
    throw new RangeError('airspeeds must rise strictly, at least two, with one of thrusts each');
  }
}

function within(speed: number, lowest: number, highest: number): number {
  if (speed >= lowest && speed <= highest) return speed;
  const end = speed < lowest ? lowest : highest;
  if (Math.abs(speed - end) <= rounding * highest) return end;
  throw new RangeError(`airspeed must lie between ${lowest} and ${highest} m/s: ${speed}`);
}
