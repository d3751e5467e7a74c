import { rollAcceleration, rollForces } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/**
 * The ground roll by the acceleration at one mean speed: the textbook check on the quadrature.
 *
 * s = (V_LOF - w)^2/(2 a(V_m)) + (V_R - w) t_R, V_m = w + (V_LOF - w)/sqrt(2)
 *
 * @param run - as for groundRoll, w below V_LOF
 * @returns [m], Infinity where a(V_m) is not positive; within 2 % where the least acceleration is above 0.06 g and falls by no more
 * than a half, short of the roll below that
 * @see references.AndersonIntroduction, ch. 6, lift-off distance at 0.7 of the lift-off speed
 */
export function meanAccelerationRoll(run: TakeoffRun): number {
  const gain = run.liftOffSpeed - run.headwind;
  const acceleration = rollAcceleration(rollForces(run), run.headwind + Math.SQRT1_2 * gain);
  if (!(acceleration > 0)) return Number.POSITIVE_INFINITY;
  return (gain * gain) / (2 * acceleration) + Math.max(0, run.rotationSpeed - run.headwind) * run.rotationTime;
}
