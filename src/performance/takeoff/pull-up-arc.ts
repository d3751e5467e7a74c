import { brent } from '../../numerics/brent.ts';
import { gaussLegendre } from '../../numerics/gauss-legendre.ts';
import { g0 } from '../../physics/constants.ts';
import { type ClimbForces, climbGradient, energySine } from './climb-forces.ts';

/** A last step of this share of the height leaves 1e-5 of it or less, which moves the distance only in second order. */
const lastStep = 1e-3;
const rule = gaussLegendre(5);

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
  // secants from the ground: the allowed height changes slowly, so two or three steps are enough
  let below = 0;
  let excessBelow = arcHeight(radius, energySine(forces, atLiftOff));
  let height = Math.min(excessBelow, screenHeight);
  for (let i = 0; i < 6; i++) {
    const excess = arcExcess(forces, radius, height);
    const next = height - (excess * (height - below)) / (excess - excessBelow);
    if (!(next > 0 && next < screenHeight)) break;
    if (Math.abs(next - height) <= lastStep * height) return next;
    below = height;
    excessBelow = excess;
    height = next;
  }
  const found = brent((at) => arcExcess(forces, radius, at), 0, screenHeight, 1e-6 * screenHeight);
  return found.outcome === 'not-bracketed' ? screenHeight : found.root;
}

/** How far above a height the arc may still be followed [m]. */
function arcExcess(forces: ClimbForces, radius: number, height: number): number {
  return arcHeight(radius, energySine(forces, climbGradient(forces, height))) - height;
}

/** R (1 - cos gamma) from sin gamma, without losing digits near the ground. */
function arcHeight(radius: number, sine: number): number {
  const square = sine * sine;
  return (radius * square) / (1 + Math.sqrt(1 - square));
}

/**
 * Time on the arc up to a height: R times the integral of d gamma/V, V^2 = V_LOF^2 + growth h.
 *
 * In x = sin(gamma/2) = sqrt(h/(2 R)) it is the integral of 2 R/sqrt((1 - x^2) (V_LOF^2 + 2 R growth x^2)) dx: no angle is needed.
 *
 * @param height - of the arc's end [m], up to the radius
 * @returns [s]
 * @see references.HouseEnergyPath
 */
export function pullUpArcTime(forces: ClimbForces, radius: number, height: number): number {
  const { square, growth } = forces;
  const half = Math.sqrt(height / (8 * radius));
  const rise = 2 * radius * growth;
  let sum = 0;
  for (let i = 0; i < rule.order; i++) {
    const x = half + half * (rule.nodes[i] as number);
    const xx = x * x;
    sum += (rule.weights[i] as number) / Math.sqrt((1 - xx) * (square + rise * xx));
  }
  return 2 * radius * half * sum;
}

/** Still-air distance along the arc up to a height: R sin gamma = sqrt(h (2 R - h)). */
export function pullUpArcDistance(radius: number, height: number): number {
  return Math.sqrt(height * (2 * radius - height));
}
