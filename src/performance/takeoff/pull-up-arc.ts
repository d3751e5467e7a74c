import { brent } from '../../numerics/brent.ts';
import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { g0 } from '../../physics/constants.ts';
import { type ClimbForces, climbGradient, energySine } from './climb-forces.ts';

/** The arc's end moves the distance only in second order: this share of the screen height leaves 1e-8 of it. */
const arcTopTolerance = 1e-5;
const rule = gaussLegendre(6);

/**
 * Radius of the pull-up after lift-off: R = V_LOF^2/(g (n - 1)).
 *
 * @param liftOffSpeed - true airspeed [m/s]
 * @param loadFactor - n, above 1, about 1.03 to 1.3
 * @returns [m]
 * @see references.Raymer, ch. 17, transition
 */
export function pullUpRadius(liftOffSpeed: number, loadFactor: number): number {
  if (!(loadFactor > 1)) throw new RangeError(`loadFactor must be above 1: ${loadFactor}`);
  return (liftOffSpeed * liftOffSpeed) / (g0 * (loadFactor - 1));
}

/**
 * Height at which the arc is as steep as the energy allows, or the screen height where it never is.
 *
 * The root of R (1 - cos gamma_e(h)) = h.
 *
 * @param forces - of the climb
 * @param radius - R [m]
 * @param screenHeight - [m]
 * @param atLiftOff - climb gradient at height 0, above 0
 * @param atScreen - climb gradient at the screen height, above 0
 * @returns [m]
 * @see references.HouseEnergyPath
 */
export function pullUpArcTop(
  forces: ClimbForces,
  radius: number,
  screenHeight: number,
  atLiftOff: number,
  atScreen: number,
): number {
  if (arcHeight(radius, energySine(forces, atScreen)) >= screenHeight) return screenHeight;
  const excess = (height: number) => arcHeight(radius, energySine(forces, climbGradient(forces, height))) - height;
  const first = arcHeight(radius, energySine(forces, atLiftOff));
  const second = Math.min(screenHeight, 1.2 * first);
  const low = excess(0.8 * first) > 0 ? 0.8 * first : 0;
  const high = excess(second) < 0 ? second : screenHeight;
  const found = brent(excess, low, high, arcTopTolerance * screenHeight);
  return found.outcome === 'not-bracketed' ? screenHeight : found.root;
}

/** R (1 - cos gamma) from sin gamma, without losing digits near the ground. */
function arcHeight(radius: number, sine: number): number {
  const square = sine * sine;
  return (radius * square) / (1 + Math.sqrt(1 - square));
}

/**
 * Time on the arc up to a path angle: R times the integral of d gamma/V, V^2 = V_LOF^2 + growth x R (1 - cos gamma).
 *
 * @param angle - [rad], 0 to pi/4 or a little more
 * @returns [s]
 * @see references.HouseEnergyPath
 */
export function pullUpArcTime(forces: ClimbForces, radius: number, angle: number): number {
  const { square, growth } = forces;
  const half = angle / 2;
  let sum = 0;
  for (let i = 0; i < rule.order; i++) {
    const sine = Math.sin((half + half * (rule.nodes[i] as number)) / 2);
    sum += (rule.weights[i] as number) / Math.sqrt(square + growth * 2 * radius * sine * sine);
  }
  return radius * half * sum;
}
