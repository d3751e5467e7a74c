import { g0 } from '../../physics/constants.ts';
import { rollForces } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** A thrust T = atRest + perSquare V^2 [N], [N s2/m2]; atRest from behind. */
export interface QuadraticThrust {
  readonly atRest: number;
  readonly perSquare: number;
}

/**
 * The ground roll without rotation in closed form, for a thrust T0 + T2 V^2: the check on the quadrature.
 *
 * a = g (A - B V^2), A = T0/W - mu - slope, B = (rho S/(2 W)) (C_Dg - mu C_Lg) - T2/W. Still air:
 * s = -ln(1 - B V^2/A)/(2 g B); with a headwind w, s = P(V) - P(w) - w (Q(V) - Q(w)), P the integral of V/a and Q of 1/a, which is
 * atanh(V sqrt(B/A))/(g sqrt(A B)), or atan where B < 0. With a tailwind the piece from w to 0 has T2 = 0 and air that pushes.
 *
 * A loose contaminant's k adds k/m to g B in still air.
 *
 * @param run - its own thrust is not used; lift must stay below the weight; no contaminant with a wind
 * @param thrust - of all engines
 * @returns distance [m] and time [s], or the name of why there is none
 * @see references.Raymer, ch. 17, ground roll; references.McCormick1995, sec. 7.2
 */
export function closedFormRoll(
  run: TakeoffRun,
  thrust: QuadraticThrust,
): { readonly distance: number; readonly time: number } | 'never-reaches-lift-off-speed' | 'ground-speed-not-positive' {
  const { headwind: w, liftOffSpeed: v, mass } = run;
  if (w >= v) return 'ground-speed-not-positive';
  const forces = rollForces(run);
  const displaced = (run.contaminantDrag ?? 0) / mass;
  if (displaced > 0 && w !== 0) throw new RangeError('contaminantDrag has no closed form with a headwind');
  const a = thrust.atRest / (mass * g0) - run.rollingFriction - run.slope;
  const air = (forces.drag - run.rollingFriction * forces.lift + displaced) / g0;
  const b = air - thrust.perSquare / (mass * g0);
  const from = Math.max(0, w);
  const behind = Math.min(0, w);
  if (!(a > 0 && a - b * v * v > 0 && a + air * behind * behind > 0)) return 'never-reaches-lift-off-speed';
  const ahead = speedIntegral(a, b, v) - speedIntegral(a, b, from);
  const aheadTime = timeIntegral(a, b, v) - timeIntegral(a, b, from);
  const behindTime = timeIntegral(a, -air, -behind);
  return {
    distance: ahead - w * aheadTime - behind * behindTime - speedIntegral(a, -air, -behind),
    time: aheadTime + behindTime,
  };
}

/** Below this |B V^2/A| two terms of the series are exact to rounding. */
const small = 1e-6;

/** Integral of V/(g (A - B V^2)) from 0 to V. */
function speedIntegral(a: number, b: number, v: number): number {
  const x = (b * v * v) / a;
  return Math.abs(x) < small ? ((v * v) / (2 * g0 * a)) * (1 + x / 2) : -Math.log1p(-x) / (2 * g0 * b);
}

/** Integral of 1/(g (A - B V^2)) from 0 to V. */
function timeIntegral(a: number, b: number, v: number): number {
  const x = (b * v * v) / a;
  if (Math.abs(x) < small) return (v / (g0 * a)) * (1 + x / 3);
  const angle = v * Math.sqrt(Math.abs(b) / a);
  return (b > 0 ? Math.atanh(angle) : Math.atan(angle)) / (g0 * Math.sqrt(a * Math.abs(b)));
}
