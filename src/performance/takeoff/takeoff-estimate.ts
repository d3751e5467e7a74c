import type { TakeoffRun } from './takeoff-run.ts';

/** Ground roll and air distance by mean acceleration and mean climb [m]; Infinity where the mean is not positive. */
export interface TakeoffEstimate {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/** The cheap, smooth estimate of a takeoff from which bands and effects are taken: within 2 % of the roll, 15 % of the air path. */
export function takeoffEstimate(run: TakeoffRun): TakeoffEstimate {
  throw new Error(`not built: ${run.mass}`);
}
