import type { EngineFailureRun, StopTimeline } from '../../src/performance/engine-failure/engine-failure-run.ts';
import { constantBraking } from '../../src/physics/braking-friction.ts';
import { noDelay, withFailure } from './engine-failure-runs.ts';
import { plainRun, quadraticThrust } from './plain-run.ts';

/**
 * 1 kg that gains 4 m/s2 with both engines and 2 with one, without air on the ground, and lifts off at 30 m/s: every leg is
 * schoolroom arithmetic.
 *
 * @param brakes - [m/s2]
 */
export function block(brakes: number, timeline: Partial<StopTimeline> = {}): EngineFailureRun {
  const run = withFailure(plainRun({ thrust: quadraticThrust(4) }), { timeline: { ...noDelay, ...timeline } });
  return { ...run, stop: { ...run.stop, braking: constantBraking(brakes / 9.80665) } };
}

/** The same in a wind along the runway [m/s], on the nose positive, with brakes and engines that do not feel it. */
export function inWind(run: EngineFailureRun, headwind: number): EngineFailureRun {
  return { ...run, allEngines: { ...run.allEngines, headwind }, stop: { ...run.stop, headwind } };
}
