import type { TakeoffResult, TakeoffRun } from './takeoff-run.ts';

/** The takeoff from brake release to the screen: ground roll and air path, or the name of why there are none. */
export function takeoff(run: TakeoffRun): TakeoffResult {
  throw new Error(`not built: ${run.mass}`);
}
