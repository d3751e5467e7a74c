import { rho0 } from '../constants.ts';
import type { Thrust } from './thrust.ts';

/** A propeller that takes a governed power at every airspeed. */
export interface ActuatorDisc {
  /** [m] */
  readonly propellerDiameter: number;
  /** eta0, what the blades' profile drag leaves, about 0.88 */
  readonly profileFactor: number;
  /** kappa, excess of the induced power over the ideal, about 1.15 */
  readonly inducedFactor: number;
  /** on the disc's thrust */
  readonly thrustFactor: number;
  /** a known static thrust of one engine at rated power, sea level, standard day [N] */
  readonly staticThrust?: number;
}

/**
 * Thrust of propellers at a given power each, by momentum theory with losses.
 *
 * T (V + kappa v) = eta0 P and T = 2 rho A v (V + v) per propeller, so that
 * kappa v^3 + (1 + kappa) V v^2 + V^2 v = eta0 P/(2 rho A): convex and rising in v, so Newton from the static value or from the
 * root at a lower airspeed comes down to it monotonically. A known static thrust caps the result; away from sea level the cap
 * falls as the disc's own static thrust does, with (P^2 rho)^(1/3), and never rises (judgement: the stalled blades that limit
 * it do so everywhere).
 *
 * @param disc - figures of one propeller
 * @param engines - those that run
 * @param power - of one engine in this air [W], 0 or more
 * @param ratedPower - of one engine at sea level, standard day [W]: for the cap
 * @param density - [kg/m3]
 * @returns the thrust against true airspeed
 * @remarks Unstalled blades, tip Mach number below 0.9; above 100 kW/m2 the static value is +-10 %.
 * @see references.McCormick1995, ch. 6, momentum theory
 */
export function actuatorDiscThrust(
  disc: ActuatorDisc,
  engines: number,
  power: number,
  ratedPower: number,
  density: number,
): Thrust {
  const { propellerDiameter, profileFactor, inducedFactor: kappa, thrustFactor, staticThrust } = disc;
  const mass = 2 * density * (Math.PI / 4) * propellerDiameter ** 2;
  const supply = (profileFactor * power) / mass;
  const atRest = Math.cbrt(supply / kappa);
  const scale = engines * thrustFactor * mass;
  const cap =
    staticThrust === undefined
      ? Number.POSITIVE_INFINITY
      : engines * staticThrust * staticThrustFall(power, ratedPower, density);

  const at = (airspeed: number): number => {
    if (!(supply > 0)) return 0;
    const speed = Math.max(airspeed, 0);
    const v = inducedVelocity(kappa, supply, speed, atRest);
    return Math.min(cap, scale * v * (speed + v));
  };
  const fill = (airspeeds: Float64Array, n: number, out: Float64Array): void => {
    if (!(supply > 0)) {
      out.fill(0, 0, n);
      return;
    }
    let v = atRest;
    let before = 0;
    for (let i = 0; i < n; i++) {
      const speed = Math.max(0, airspeeds[i] as number);
      const fall = ((1 + kappa) * v + 2 * before) * v;
      const rise = (3 * kappa * v + 2 * (1 + kappa) * before) * v + before * before;
      const predicted = v - (fall / rise) * (speed - before);
      v = inducedVelocity(kappa, supply, speed, predicted > 0 ? predicted : v);
      before = speed;
      const thrust = scale * v * (speed + v);
      out[i] = Math.min(thrust, cap);
    }
  };
  const corner = supply > 0 && cap < scale * atRest * atRest ? airspeedAtThrust(kappa, supply, cap / scale) : undefined;
  return { at, fill, kinks: corner === undefined ? [] : [corner] };
}

/**
 * Known static thrust in this air over that at sea level, standard day: min(1, ((P/P_rated)^2 sigma)^(1/3)).
 *
 * @param power - of one engine in this air [W]
 * @param ratedPower - at sea level, standard day [W], above 0
 * @param density - [kg/m3]
 * @see references.McCormick1995, ch. 6; that it never rises is a judgement
 */
export function staticThrustFall(power: number, ratedPower: number, density: number): number {
  return Math.min(1, Math.cbrt((power / ratedPower) ** 2 * (density / rho0)));
}

/**
 * Induced velocity of a disc: v of kappa v^3 + (1 + kappa) V v^2 + V^2 v = supply, by Newton from any positive start.
 *
 * @param kappa - excess of the induced power, 1 or more
 * @param supply - eta0 P/(2 rho A) [m3/s3], above 0
 * @param airspeed - V [m/s], 0 or more
 * @param start - [m/s], above 0
 * @returns [m/s]
 * @see references.McCormick1995, ch. 6, momentum theory
 */
export function inducedVelocity(kappa: number, supply: number, airspeed: number, start: number): number {
  const linear = (1 + kappa) * airspeed;
  const square = airspeed * airspeed;
  let v = start;
  for (let i = 0; i < 60; i++) {
    const excess = ((kappa * v + linear) * v + square) * v - supply;
    const change = excess / ((3 * kappa * v + 2 * linear) * v + square);
    v -= change;
    if (Math.abs(change) <= 1e-8 * v) break;
  }
  return v;
}

/** The airspeed at which v (V + v) has a given value: v = 2 Q/(U + sqrt(U^2 - 4 (kappa - 1) Q)), U = supply/Q, V = U - kappa v. */
function airspeedAtThrust(kappa: number, supply: number, thrustOverMass: number): number {
  const total = supply / thrustOverMass;
  const v = (2 * thrustOverMass) / (total + Math.sqrt(total * total - 4 * (kappa - 1) * thrustOverMass));
  return total - kappa * v;
}
