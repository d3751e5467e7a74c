import { rollAlong } from '../takeoff/roll-along.ts';
import type { EngineFailureRun } from './engine-failure-run.ts';
import { oneOutRun } from './one-out-run.ts';
import { speedAtTime } from './speed-at-time.ts';

/**
 * The V1 of a failure at standstill: no failure comes before a lower one.
 *
 * The root of t_rec = integral of dV/a from the headwind to V1, a with one engine out.
 *
 * @param run - recognition time t_rec of its timeline
 * @returns true airspeed [m/s], at most the rotation speed; the headwind where one engine out does not move the aeroplane
 * @see references.Cfr25s107, (a)(2)
 */
export function standstillDecisionSpeed(run: EngineFailureRun): number {
  const { headwind } = run.allEngines;
  if (headwind >= run.rotationSpeed) return headwind;
  const oneOut = rollAlong(oneOutRun(run));
  const { recognitionTime } = run.timeline;
  return speedAtTime((to) => oneOut(headwind, to, 0), headwind, run.rotationSpeed, recognitionTime).airspeed;
}
