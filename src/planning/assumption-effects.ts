import type { Propulsion } from '../performance/aeroplane.ts';
import type { TakeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
import { takeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { Assumed, OtherEnd } from './assumed.ts';
import { heldThrust } from './held-thrust.ts';

/**
 * What each assumption is worth: the change of the takeoff distance, by the mean-acceleration estimate, when the other end of
 * its plausible range is taken.
 *
 * @param assumed - in the order in which they were made
 * @param run - as stated; undefined where the screen is not reached
 * @param thrustOf - thrust of another definition in the same air
 * @returns the same assumptions, with effectRatio where the estimate exists on both sides
 */
export function assumptionEffects(
  assumed: readonly Assumed[],
  run: TakeoffRun | undefined,
  thrustOf: (propulsion: Propulsion, thrustFactor: number) => Thrust,
): readonly Assumed[] {
  if (run === undefined) return assumed;
  const held = { ...run, thrust: heldThrust(run.thrust) };
  const base = whole(takeoffEstimate(held));
  return assumed.map((one) => {
    if (one.otherEnd === undefined) return one;
    const effectRatio = whole(takeoffEstimate(withOtherEnd(held, one.otherEnd, thrustOf))) / base - 1;
    return Number.isFinite(effectRatio) ? { ...one, assumption: { ...one.assumption, effectRatio } } : one;
  });
}

function whole({ groundRoll, airDistance }: TakeoffEstimate): number {
  return groundRoll + airDistance;
}

function withOtherEnd(
  run: TakeoffRun,
  other: OtherEnd,
  thrustOf: (propulsion: Propulsion, thrustFactor: number) => Thrust,
): TakeoffRun {
  switch (other.kind) {
    case 'run':
      return { ...run, [other.member]: other.value };
    case 'run-increment':
      return { ...run, [other.member]: run[other.member] + other.value };
    case 'speed':
      return { ...run, [other.member]: run[other.member] * other.factor };
    case 'propulsion':
      return { ...run, thrust: heldThrust(thrustOf(other.propulsion, other.thrustFactor)) };
  }
}
