import type { UnitFamily } from '../../units/presentation.ts';
import type { NotReached, TakeoffRuns } from '../takeoff-runs.ts';
import { measureText, percentText } from './measure-text.ts';
import { whichRun } from './which-run.ts';

/** Why there are no distances, in words and numbers. */
export function notReachedSentence(result: NotReached | undefined, runs: TakeoffRuns, units: UnitFamily): string {
  if (result === undefined) return 'There are no distances.';
  const speed = (si: number) => measureText(units, 'speed', si);
  const where = whichRun(runs, result);
  switch (result.outcome) {
    case 'never-reaches-lift-off-speed':
      return `Never reaches the lift-off speed${where}: at ${speed(result.atAirspeed)} true airspeed the aeroplane gains no more speed; the least acceleration is ${percentText(result.leastAccelerationRatio, 2, 'down')} of that of gravity.`;
    case 'never-reaches-screen-height':
      return `Never reaches the screen height${where}: the least climb gradient is ${percentText(result.leastClimbGradient, 2, 'down')}, and ${percentText(result.neededClimbGradient, 2)} is needed.`;
    case 'ground-speed-not-positive':
      return 'climbSpeed' in result
        ? `The headwind of ${speed(result.headwind)} is not below the speed of ${speed(result.climbSpeed)} at which the aeroplane moves forward in its steep climb: it makes no way over the ground${where}.`
        : `The headwind of ${speed(result.headwind)} is not below the lift-off speed of ${speed(result.liftOffSpeed)} true airspeed: there is no ground roll to compute.`;
    case 'outside-stated-data':
      return `Outside the stated thrust: ${speed(result.airspeed)} true airspeed is asked for, and the data end at ${speed(result.bound)}.`;
  }
}
