import type { Propulsion } from '../performance/aeroplane.ts';
import { takeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { Assumed, OtherEnd } from './assumed.ts';
import { assumptionEffects, withNumber } from './assumption-effects.ts';
import { heldThrust } from './held-thrust.ts';

/**
 * What each assumption of a takeoff is worth, by the mean-acceleration estimate.
 *
 * @param assumed - in the order in which they were made
 * @param run - as stated; undefined where the screen is not reached
 * @param thrustOf - thrust of another definition in the same air
 */
export function takeoffEffects(
  assumed: readonly Assumed[],
  run: TakeoffRun | undefined,
  thrustOf: (propulsion: Propulsion, thrustFactor: number) => Thrust,
): readonly Assumed[] {
  if (run === undefined) return assumed;
  const held = { ...run, thrust: heldThrust(run.thrust) };
  const withOther = (other: OtherEnd): TakeoffRun =>
    other.kind === 'propulsion'
      ? { ...held, thrust: heldThrust(thrustOf(other.propulsion, other.thrustFactor)) }
      : withNumber<TakeoffRun>(held, other);
  return assumptionEffects(assumed, (other) => {
    const { groundRoll, airDistance } = takeoffEstimate(other === undefined ? held : withOther(other));
    return groundRoll + airDistance;
  });
}
