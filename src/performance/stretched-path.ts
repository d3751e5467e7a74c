import { brent } from '../numerics/brent.ts';
import { gather, newPathIntegral, type PathIntegral } from './path-integral.ts';

/** A change of speed under steady forces. */
export interface SpeedChange {
  /** false where the speed is not reached: no distance then */
  readonly reaches: boolean;
  readonly sum: PathIntegral;
}

/** The change from one airspeed to another [m/s] under the forces of a stretch. */
export type ChangeOn = (stretch: number, from: number, to: number) => SpeedChange;

/** What lies on one stretch of such a change. */
export interface PathPart {
  readonly stretch: number;
  /** airspeeds [m/s] */
  readonly from: number;
  readonly to: number;
}

/** A change of speed over stretches of runway. */
export interface StretchedPath extends SpeedChange {
  /** in the order of movement; complete where the speed is reached */
  readonly parts: readonly PathPart[];
  /** the stretch on which it ends, and the airspeed at which that was entered [m/s] */
  readonly stretch: number;
  readonly entered: number;
}

/** On the airspeed at which a stretch is left [m/s]: a micrometre of runway, and some more where the speed hardly changes. */
const speedTolerance = 1e-9;
/** How much of a stretch may be missing where it is left [m]; where forces jump the root may only be the jump. */
const lengthTolerance = 0.01;

/**
 * A change of speed over stretches of runway that each have their own steady forces, speeding up or slowing down.
 *
 * A stretch is left at the airspeed at which its length is used up, found as a bracketed root. The last stretch goes on beyond
 * its end.
 *
 * @param ends - where the stretches end [m], rising
 * @param begin - where the change begins on the same scale [m]
 * @param from - airspeed there [m/s]
 * @param to - airspeed to reach [m/s]
 * @param changeOn - the change on one stretch
 * @returns the whole path; not reaching its speed where the forces on any stretch would not let it before that stretch is left: an
 * aeroplane that slows down on a hump is taken as not getting off, one that gains speed on ice as not stopping
 */
export function stretchedPath(
  ends: readonly number[],
  begin: number,
  from: number,
  to: number,
  changeOn: ChangeOn,
): StretchedPath {
  const whole = newPathIntegral();
  const parts: PathPart[] = [];
  const last = ends.length - 1;
  let at = begin;
  let entered = from;
  let stretch = 0;
  while (stretch < last && (ends[stretch] as number) <= begin) stretch++;
  for (; ; stretch++) {
    const length = (ends[stretch] as number) - at;
    const rest = changeOn(stretch, entered, to);
    if (stretch === last || (rest.reaches && rest.sum.distance <= length)) {
      gather(whole, rest.sum);
      parts.push({ stretch, from: entered, to });
      return { reaches: rest.reaches, sum: whole, parts, stretch, entered };
    }
    const left = leavingSpeed(changeOn, stretch, entered, to, length);
    if (left === undefined) {
      gather(whole, rest.sum);
      return { reaches: false, sum: whole, parts, stretch, entered };
    }
    gather(whole, changeOn(stretch, entered, left).sum);
    parts.push({ stretch, from: entered, to: left });
    entered = left;
    at = ends[stretch] as number;
  }
}

/** Airspeed at which a stretch of this length is used up; undefined where the speed stops changing before. */
function leavingSpeed(
  changeOn: ChangeOn,
  stretch: number,
  from: number,
  to: number,
  length: number,
): number | undefined {
  const over = (airspeed: number) => {
    if (airspeed === from) return -length;
    const change = changeOn(stretch, from, airspeed);
    // where the speed stops changing the length would never be used up: beyond the root
    return change.reaches ? change.sum.distance - length : length;
  };
  const found = brent(over, from, to, speedTolerance);
  if (found.outcome !== 'root' || found.root === from) return undefined;
  const change = changeOn(stretch, from, found.root);
  return change.reaches && length - change.sum.distance <= lengthTolerance ? found.root : undefined;
}
