import { type SpeedChange, stretchedPath } from '../stretched-path.ts';
import { brakedStretches } from './braked-stretches.ts';
import type { BrakedRun } from './landing-run.ts';
import { stopBetween } from './stop-between.ts';
import { type StopForces, stopForces } from './stop-forces.ts';

/** Slowing down from one airspeed to a lower one, at or above the headwind [m/s], from a place on the runway on [m]. */
export type StopAlong = (from: number, to: number, begin: number) => SlowedDown;

/** With the forces on the stretch on which it ends, and the airspeed at which that was entered [m/s]. */
export interface SlowedDown extends SpeedChange {
  readonly forces: StopForces;
  readonly entered: number;
}

/**
 * The slowing down of a run along its runway, in as many parts as are asked for.
 *
 * @param run - the same throughout, or over its stretches and its profile
 */
export function stopAlong(run: BrakedRun): StopAlong {
  const stretches = brakedStretches(run);
  if (stretches === undefined) {
    const forces = stopForces(run, run);
    return (from, to) => ({ ...stopBetween(forces, from, to), forces, entered: from });
  }
  const forces = stretches.map((stretch) => stopForces(run, stretch));
  const ends = stretches.map(({ end }) => end);
  return (from, to, begin) => {
    const path = stretchedPath(ends, begin, from, to, (stretch, entered, left) =>
      stopBetween(forces[stretch] as StopForces, entered, left),
    );
    return { ...path, forces: forces[path.stretch] as StopForces };
  };
}
