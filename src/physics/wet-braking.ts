import { interpolateHeld } from '../numerics/interpolate.ts';

/** Kinds of anti-skid system by what they make of the tyre's grip on a wet runway. */
export type AntiSkidKind = 'none' | 'on-off' | 'quasi-modulating' | 'fully-modulating';

const efficiencies: Readonly<Record<AntiSkidKind, number>> = {
  none: 0.3,
  'on-off': 0.3,
  'quasi-modulating': 0.5,
  'fully-modulating': 0.8,
};

/**
 * Share of the greatest braking coefficient that a system holds on a wet runway.
 *
 * Without a system the pilot is given as much as an on-off one: the low end of 0.30 to 0.45 (judgement).
 *
 * @see references.Cfr25s109, (c)(2)
 */
export function antiSkidEfficiency(kind: AntiSkidKind): number {
  return efficiencies[kind];
}

const psi = 6894.757293168361;
const knot = 1852 / 3600;
/** Tyre pressures [Pa] of the four curves, and their coefficients c3, c2, c1, c0 in v = ground speed/100 kt. */
const pressures = [50, 100, 200, 300].map((pressure) => pressure * psi);
const curves = [
  [-0.035, 0.306, -0.851, 0.883],
  [-0.0437, 0.32, -0.805, 0.804],
  [-0.0331, 0.252, -0.658, 0.692],
  [-0.0401, 0.263, -0.611, 0.614],
] as const;
/** Ground speed beyond which the curves are held [m/s], and the least coefficient given (judgement). */
export const greatestWetBrakingSpeed = 200 * knot;
const least = 0.05;

/**
 * The curve of the greatest tyre-to-ground braking coefficient on a smooth wet runway, at one tyre pressure.
 *
 * mu = c3 v^3 + c2 v^2 + c1 v + c0, v = ground speed/100 kt; the coefficients are linear in tyre pressure between 50, 100, 200 and
 * 300 psi and held beyond; speed held in 0 to 200 kt; not below 0.05.
 *
 * @param tyrePressure - [Pa]
 * @returns mu against ground speed [m/s], before anti-skid efficiency and load on the braked wheels
 * @remarks Smooth, wet, not flooded; worn tyres of transport aeroplanes.
 * @see references.Cfr25s109, (c)(1)
 */
export function wetBrakingCurve(tyrePressure: number): (groundSpeed: number) => number {
  if (!(tyrePressure > 0)) throw new RangeError(`tyrePressure must be above 0: ${tyrePressure}`);
  const [c3, c2, c1, c0] = [0, 1, 2, 3].map((power) =>
    interpolateHeld(
      pressures,
      curves.map((curve) => curve[power] as number),
      tyrePressure,
    ),
  ) as [number, number, number, number];
  return (groundSpeed) => {
    const v = Math.min(greatestWetBrakingSpeed, Math.max(0, groundSpeed)) / (100 * knot);
    return Math.max(least, ((c3 * v + c2) * v + c1) * v + c0);
  };
}
