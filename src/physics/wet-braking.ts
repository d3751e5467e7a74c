import { brakingPolynomial } from './braking-polynomial.ts';

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

/** Coefficients c3, c2, c1, c0 at 50, 100, 200 and 300 psi. @see references.Cfr25s109, (c)(1) */
const smooth = [
  [-0.035, 0.306, -0.851, 0.883],
  [-0.0437, 0.32, -0.805, 0.804],
  [-0.0331, 0.252, -0.658, 0.692],
  [-0.0401, 0.263, -0.611, 0.614],
];
/** Coefficients c5 to c0 at the same pressures. @see references.Cfr25s109, (d)(2) */
const grooved = [
  [0.147, -1.05, 2.673, -2.683, 0.403, 0.859],
  [0.1106, -0.813, 2.13, -2.2, 0.317, 0.807],
  [0.0498, -0.398, 1.14, -1.285, 0.14, 0.701],
  [0.0314, -0.247, 0.703, -0.779, -0.00954, 0.614],
];

/**
 * The curve of the greatest tyre-to-ground braking coefficient on a smooth wet runway, at one tyre pressure.
 *
 * mu = c3 v^3 + c2 v^2 + c1 v + c0, v = ground speed/100 kt, by brakingPolynomial.
 *
 * @param tyrePressure - [Pa]
 * @returns mu against ground speed [m/s], before anti-skid efficiency and load on the braked wheels
 * @remarks Smooth, wet, not flooded; worn tyres of transport aeroplanes.
 * @see references.Cfr25s109, (c)(1)
 */
export function wetBrakingCurve(tyrePressure: number): (groundSpeed: number) => number {
  return brakingPolynomial(smooth, tyrePressure);
}

/**
 * The same on a grooved or porous wet runway, before the 70 % of dry braking that the rule allows instead.
 *
 * mu = c5 v^5 + ... + c0, and not below the smooth curve, under which it starts at 50 psi below 2 kt.
 *
 * @param tyrePressure - [Pa]
 * @returns mu against ground speed [m/s], before anti-skid efficiency and load on the braked wheels
 * @remarks Rises up to 9 kt at 50 psi. Grooved or treated and maintained as the rule asks.
 * @see references.Cfr25s109, (d)(2)
 */
export function groovedBrakingCurve(tyrePressure: number): (groundSpeed: number) => number {
  const onGrooves = brakingPolynomial(grooved, tyrePressure);
  const onSmooth = wetBrakingCurve(tyrePressure);
  return (groundSpeed) => Math.max(onGrooves(groundSpeed), onSmooth(groundSpeed));
}
