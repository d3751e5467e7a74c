import type { SpeedChange } from '../stretched-path.ts';
import { profiledRoll } from './profiled-roll.ts';
import { rollBetween } from './roll-between.ts';
import { rollForces } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** The roll from one airspeed to a higher one [m/s], beginning at a distance from brake release [m]. */
export type RollAlong = (from: number, to: number, begin: number) => SpeedChange;

/**
 * The roll of a run along its ground, in as many parts as are asked for: a takeoff in which something changes on the way.
 *
 * @param run - its rotation is left out
 * @returns parts that do not reach their speed say so; one that ends where it begins has no length, and needs an acceleration there too
 */
export function rollAlong(run: TakeoffRun): RollAlong {
  const forces = rollForces(run);
  const { headwind, profile } = run;
  return (from, to, begin) => {
    const { reaches, sum } =
      profile === undefined
        ? rollBetween(forces, headwind, from, to)
        : profiledRoll(forces, profile, headwind, from, to, begin);
    // nothing over an acceleration of nothing is no number
    return { reaches, sum: from === to ? { ...sum, distance: 0, time: 0 } : sum };
  };
}
