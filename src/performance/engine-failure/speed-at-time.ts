import { brent } from '../../numerics/brent.ts';
import { newPathIntegral } from '../path-integral.ts';
import type { SpeedChange } from '../stretched-path.ts';

/** On the airspeed [m/s]: micrometres of runway. */
const tolerance = 1e-9;

/** How far a speed has changed, and the change. */
export interface SpeedAtTime {
  /** true airspeed [m/s] */
  readonly airspeed: number;
  /** its time falls short of the seconds asked for where the furthest speed is reached before, or none further can be */
  readonly change: SpeedChange;
}

/**
 * The airspeed so far from another that the change between them takes some seconds: a bracketed root of the time.
 *
 * @param changeTo - the change between the first airspeed and another; where the forces do not let it the time counts as without end
 * @param from - the first airspeed [m/s]; no time passes there
 * @param furthest - where the search ends [m/s], above or below
 * @param seconds - 0 or more
 * @returns the furthest speed where less time than that lies between; the last one that the forces allow where they stop the change
 */
export function speedAtTime(
  changeTo: (airspeed: number) => SpeedChange,
  from: number,
  furthest: number,
  seconds: number,
): SpeedAtTime {
  if (!(seconds >= 0)) throw new RangeError(`seconds must be 0 or more: ${seconds}`);
  if (seconds === 0 || from === furthest) return { airspeed: from, change: unchanged() };
  const over = (airspeed: number) => {
    if (airspeed === from) return -seconds;
    const { reaches, sum } = changeTo(airspeed);
    return reaches ? sum.time - seconds : seconds;
  };
  const found = brent(over, from, furthest, tolerance);
  if (found.outcome === 'not-bracketed') return { airspeed: furthest, change: changeTo(furthest) };
  const change = changeTo(found.root);
  if (change.reaches) return { airspeed: found.root, change };
  // the root is where the change stops, and lies on its far side
  const near = found.root + Math.sign(from - found.root) * Math.min(Math.abs(from - found.root), 2 * tolerance);
  const nearer = changeTo(near);
  return nearer.reaches ? { airspeed: near, change: nearer } : { airspeed: from, change: unchanged() };
}

function unchanged(): SpeedChange {
  return { reaches: true, sum: newPathIntegral() };
}
