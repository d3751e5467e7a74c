import { brent } from '../numerics/brent.ts';
import type { Leg, TrajectoryPoint } from './trajectory.ts';

/** Distance over the ground [m] and time [s] between two places on a path, in the path's own variable. */
export type Between = (from: number, to: number) => { readonly distance: number; readonly time: number };

/**
 * A leg of a trajectory on which a place is found by how far it is: a bracketed root.
 *
 * @param between - the path, followed from its beginning
 * @param from - where it begins, in its own variable, which rises or falls
 * @param to - where it ends
 * @param pointAt - what is true at a place of it
 */
export function pathLeg(
  between: Between,
  from: number,
  to: number,
  pointAt: (place: number, distance: number, time: number) => TrajectoryPoint,
): Leg {
  const whole = from === to ? { distance: 0, time: 0 } : between(from, to);
  const tolerance = 1e-12 * Math.max(Math.abs(from), Math.abs(to));
  return {
    ...whole,
    at(distance) {
      if (distance <= 0 || from === to) return pointAt(from, distance, 0);
      if (distance >= whole.distance) return pointAt(to, distance, whole.time);
      const over = (place: number) => (place === from ? 0 : between(from, place).distance) - distance;
      const found = brent(over, from, to, tolerance);
      if (found.outcome === 'not-bracketed') return pointAt(to, distance, whole.time);
      return pointAt(found.root, distance, found.root === from ? 0 : between(from, found.root).time);
    },
  };
}
