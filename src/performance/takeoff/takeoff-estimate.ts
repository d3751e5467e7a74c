import { g0 } from '../../physics/constants.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** Ground roll and air distance by mean acceleration and mean climb [m]; Infinity where a mean is not positive. */
export interface TakeoffEstimate {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/**
 * The cheap, smooth estimate of a takeoff from which bands and effects are taken.
 *
 * s_G = (V_LOF - w)^2/(2 a(V_m)) + (V_R - w) t_R, V_m = w + 0.707 (V_LOF - w); s_A = R tan(gamma/2) + h_s/tan(gamma) - w t (the
 * chord sqrt(h_s (2R - h_s)) where the arc reaches the screen), gamma from the energy at half the screen height.
 *
 * @param run - as for takeoff; thrust must be known between w and the screen speed
 * @returns [m] each; not an answer by itself: within 2 % of the roll where the least acceleration is above 0.06 g, short below
 * @see references.AndersonIntroduction, ch. 6 for 0.7 of the lift-off speed; references.Raymer, ch. 17 for the arc
 */
export function takeoffEstimate(run: TakeoffRun): TakeoffEstimate {
  const { headwind, liftOffSpeed, wingHeight, span, screenHeight, inducedDragFactor: k } = run;
  const weight = run.mass * g0;
  const halfRhoS = 0.5 * run.density * run.wingArea;
  const lift = run.groundLiftCoefficient;

  const mean = headwind + Math.SQRT1_2 * (liftOffSpeed - headwind);
  const q = halfRhoS * mean * Math.abs(mean);
  const drag = q * (run.groundDragCoefficient + groundEffect(wingHeight / span) * k * lift * lift);
  const held = run.rollingFriction * Math.max(0, weight - q * lift);
  const acceleration = (run.thrust.at(mean) - drag - held) / run.mass - g0 * run.slope;
  const gain = liftOffSpeed - headwind;
  const groundRoll =
    acceleration > 0
      ? (gain * gain) / (2 * acceleration) + Math.max(0, run.rotationSpeed - headwind) * run.rotationTime
      : Number.POSITIVE_INFINITY;

  const square = liftOffSpeed * liftOffSpeed;
  const growth = Math.max(0, run.screenSpeed * run.screenSpeed - square) / screenHeight;
  const middle = square + (growth * screenHeight) / 2;
  const speed = Math.sqrt(middle);
  const phi = groundEffect((wingHeight + screenHeight / 2) / span);
  const airDrag = halfRhoS * middle * run.airDragCoefficient + (phi * k * weight * weight) / (halfRhoS * middle);
  const gradient = (run.thrust.at(speed) - airDrag) / weight - Math.max(0, run.slope);
  const sine = Math.min(Math.SQRT1_2, gradient / (1 + growth / (2 * g0)));
  if (!(sine > 0)) return { groundRoll, airDistance: Number.POSITIVE_INFINITY };
  const cosine = Math.sqrt(1 - sine * sine);
  const radius = square / (g0 * (run.pullUpLoadFactor - 1));
  const still =
    radius * (1 - cosine) < screenHeight
      ? (radius * sine) / (1 + cosine) + (screenHeight * cosine) / sine
      : Math.sqrt(screenHeight * (2 * radius - screenHeight));
  return { groundRoll, airDistance: still * (1 - headwind / speed) };
}
