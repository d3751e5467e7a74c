import type { Thrust } from '../../physics/thrust/thrust.ts';
import { climbForces, climbGradient, energySine } from './climb-forces.ts';
import { pullUpArcDistance, pullUpRadius } from './pull-up-arc.ts';
import { rollAcceleration, rollForces } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** Ground roll and air distance by mean acceleration and mean climb [m]; Infinity where a mean is not positive. */
export interface TakeoffEstimate {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/** Nodes of two-point Gauss-Legendre on 0 to 1, as shares of the speed gained: square roots of (1 -+ 1/sqrt 3)/2. */
const slower = Math.sqrt((1 - Math.sqrt(1 / 3)) / 2);
const faster = Math.sqrt((1 + Math.sqrt(1 / 3)) / 2);

/** The two true airspeeds at which the estimate takes the acceleration [m/s]: a share of the speed gained, on top of the wind. */
export function estimateSpeeds({
  headwind,
  liftOffSpeed,
}: Pick<TakeoffRun, 'headwind' | 'liftOffSpeed'>): readonly [number, number] {
  const gain = liftOffSpeed - headwind;
  return [headwind + slower * gain, headwind + faster * gain];
}

/**
 * The cheap, smooth estimate of a takeoff from which bands and effects are taken.
 *
 * s_G = (V_LOF - w)^2/2 times the mean of 1/a over the square of the speed gained, at two points instead of the one at 0.707,
 * plus (V_R - w) t_R; s_A = R tan(gamma/2) + h_s/tan(gamma) - w t (the chord sqrt(h_s (2R - h_s)) where the arc reaches the screen),
 * gamma from the energy at half the screen height.
 *
 * @param run - as for takeoff; a thrust with a domain is held at its ends, where a small change of the run leads just past them
 * @returns [m] each; not an answer by itself: within 2 % of the roll and 12 % of the air distance where the least acceleration
 * is above 0.06 g and the least climb gradient above 0.05
 * @see references.AndersonIntroduction, ch. 6 for the mean at 0.7 of the lift-off speed; references.Raymer, ch. 17 for the arc
 */
export function takeoffEstimate(run: TakeoffRun): TakeoffEstimate {
  const { domain } = run.thrust;
  if (domain !== undefined) run = { ...run, thrust: heldInside(run.thrust, domain) };
  const { headwind, liftOffSpeed, screenHeight } = run;
  const gain = liftOffSpeed - headwind;
  const forces = rollForces(run);
  const [slow, fast] = estimateSpeeds(run);
  const first = rollAcceleration(forces, slow);
  const second = rollAcceleration(forces, fast);
  const groundRoll =
    first > 0 && second > 0
      ? (gain * gain * (1 / first + 1 / second)) / 4 + Math.max(0, run.rotationSpeed - headwind) * run.rotationTime
      : Number.POSITIVE_INFINITY;

  const climb = climbForces(run);
  const sine = energySine(climb, climbGradient(climb, screenHeight / 2));
  if (!(sine > 0)) return { groundRoll, airDistance: Number.POSITIVE_INFINITY };
  const cosine = Math.sqrt(1 - sine * sine);
  const radius = pullUpRadius(liftOffSpeed, run.pullUpLoadFactor);
  const still =
    radius * (1 - cosine) < screenHeight
      ? (radius * sine) / (1 + cosine) + (screenHeight * cosine) / sine
      : pullUpArcDistance(radius, screenHeight);
  const speed = Math.sqrt(climb.square + (climb.growth * screenHeight) / 2);
  return { groundRoll, airDistance: still * (1 - headwind / speed) };
}

function heldInside(thrust: Thrust, [lowest, highest]: readonly [number, number]): Thrust {
  return { ...thrust, at: (airspeed) => thrust.at(Math.min(highest, Math.max(lowest, airspeed))) };
}
