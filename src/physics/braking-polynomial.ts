import { interpolateHeld } from '../numerics/interpolate.ts';
import { scales } from '../units/units.ts';

/** Tyre pressures [Pa] at which the curves of wet braking are published: 50, 100, 200, 300 psi. @see references.Cfr25s109 */
const pressures = [50, 100, 200, 300].map((pressure) => pressure * scales.pressure.psi);
/** Ground speed beyond which the curves are held [m/s], and the least coefficient given (judgement). */
export const greatestWetBrakingSpeed = 200 * scales.speed.kt;
const least = 0.05;

/**
 * A published curve of the greatest tyre-to-ground braking coefficient at one tyre pressure.
 *
 * mu = c5 v^5 + ... + c1 v + c0, v = ground speed/100 kt; the coefficients are linear in tyre pressure between 50, 100, 200 and
 * 300 psi and held beyond; speed held in 0 to 200 kt; not below 0.05.
 *
 * @param curves - highest power first, one row of up to six coefficients for each of the four pressures
 * @param tyrePressure - [Pa]
 * @returns mu against ground speed [m/s]
 * @see references.Cfr25s109, (c)(1) and (d)(2)
 */
export function brakingPolynomial(
  curves: readonly (readonly number[])[],
  tyrePressure: number,
): (groundSpeed: number) => number {
  if (!(tyrePressure > 0)) throw new RangeError(`tyrePressure must be above 0: ${tyrePressure}`);
  const [c0, c1, c2, c3, c4, c5] = [0, 1, 2, 3, 4, 5].map((power) =>
    interpolateHeld(
      pressures,
      curves.map((curve) => curve[curve.length - 1 - power] ?? 0),
      tyrePressure,
    ),
  ) as [number, number, number, number, number, number];
  return (groundSpeed) => {
    const v = Math.min(greatestWetBrakingSpeed, Math.max(0, groundSpeed)) / (100 * scales.speed.kt);
    return Math.max(least, ((((c5 * v + c4) * v + c3) * v + c2) * v + c1) * v + c0);
  };
}
