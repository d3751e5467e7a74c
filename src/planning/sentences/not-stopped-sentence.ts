import type { UnitFamily } from '../../units/presentation.ts';
import type { LandingRuns, NotStopped } from '../landing-runs.ts';
import { measureText, percentText } from './measure-text.ts';
import { whichRun } from './which-run.ts';

/** Why a landing has no distances, in words and numbers. */
export function notStoppedSentence(result: NotStopped | undefined, runs: LandingRuns, units: UnitFamily): string {
  if (result === undefined) return 'There are no distances.';
  const speed = (si: number) => measureText(units, 'speed', si);
  if (result.outcome === 'ground-speed-not-positive') {
    return `The headwind of ${speed(result.headwind)} is not below the touchdown speed of ${speed(result.touchdownSpeed)} true airspeed: there is no ground roll to compute.`;
  }
  return `Never stops${whichRun(runs, result)}: at ${speed(result.atGroundSpeed)} over the ground nothing slows the aeroplane any more; the least deceleration is ${percentText(result.leastDecelerationRatio, 2)} of that of gravity.`;
}
