import { pathLeg } from '../path-leg.ts';
import { speedLegs, steadyLeg } from '../speed-legs.ts';
import { type ChangeOn, stretchedPath } from '../stretched-path.ts';
import { evenSteps, type Leg, type TrajectoryPoint } from '../trajectory.ts';
import { brakedStretches } from './braked-stretches.ts';
import { landingAirDistance, ordinaryTouchdownRatio } from './landing-air-distance.ts';
import { type LandingArc, landingArc } from './landing-arc.ts';
import type { LandingRun } from './landing-run.ts';
import { stopBetween } from './stop-between.ts';
import { type StopForces, stopForces } from './stop-forces.ts';

/**
 * The landing as a path: where the aeroplane is, at even steps of distance from the screen to a standstill.
 *
 * The air distance of a landing is the longer of two readings, of which one is a time at a mean speed and no path: it is followed
 * at the heights of the arc, stretched to its length. In the air the airspeed falls evenly in time, on the straight approach not
 * at all; the float is at height 0.
 *
 * @param run - one that stops
 * @param steps - of distance
 * @returns steps + 1 points, or undefined where the run does not stop
 * @see references.Raymer, ch. 17; references.Ac25s32, time in the air
 */
export function landingTrajectory(run: LandingRun, steps: number): TrajectoryPoint[] | undefined {
  const { headwind, touchdownSpeed, freeRollTime } = run;
  if (headwind >= touchdownSpeed) return undefined;
  const air = airLegs(run);
  const begun = air.reduce((sum, { distance }) => sum + distance, 0);
  const free = steadyLeg(touchdownSpeed, headwind, freeRollTime);
  const stop = stopLegs(run, begun + free.distance);
  return stop && evenSteps([...air, free, ...stop], steps);
}

/** Screen to touchdown: approach and flare, then the float where there is one. */
function airLegs(run: LandingRun): Leg[] {
  const { headwind, referenceSpeed, touchdownSpeed } = run;
  const arc = landingArc(run);
  const air = landingAirDistance(run);
  const floatFrom = ordinaryTouchdownRatio * referenceSpeed;
  const mean = (floatFrom + touchdownSpeed) / 2;
  const floats = air.floatDistance > 0;
  const seconds = floats ? air.floatDistance / (mean - headwind) : 0;
  const flared = { distance: air.distance - air.floatDistance, time: air.time - seconds };
  const legs =
    air.from === 'arc'
      ? arcLegs(run, arc, floats ? floatFrom : touchdownSpeed)
      : [slowingLeg(run, arc, flared, floatFrom)];
  return floats ? [...legs, evenlySlowing(floatFrom, touchdownSpeed, seconds, headwind, () => 0)] : legs;
}

/** The straight approach at the reference speed, and the flare on which it falls to another. */
function arcLegs(run: LandingRun, arc: LandingArc, endSpeed: number): Leg[] {
  const { headwind, referenceSpeed, approachAngle, screenHeight } = run;
  const height = Math.min(arc.flareHeight, screenHeight);
  const straightTime = (screenHeight - height) / (referenceSpeed * Math.sin(approachAngle));
  const straight: Leg = {
    distance: arc.straight - headwind * straightTime,
    time: straightTime,
    at(distance) {
      const groundSpeed = referenceSpeed * Math.cos(approachAngle) - headwind;
      const time = distance / groundSpeed;
      const fallen = time * referenceSpeed * Math.sin(approachAngle);
      return { distance, time, groundSpeed, trueAirspeed: referenceSpeed, height: screenHeight - fallen };
    },
  };
  // on the flare the angle falls evenly in time
  const seconds = arc.time - straightTime;
  const angle = 2 * Math.asin(Math.sqrt(height / (2 * arc.radius)));
  const flare = pathLeg(
    (_, time) => {
      const there = arc.radius * (Math.sin(angle) - Math.sin(angle * (1 - time / seconds)));
      return { distance: there - headwind * time, time };
    },
    0,
    seconds,
    (time, distance) => {
      const left = angle * (1 - time / seconds);
      const trueAirspeed = referenceSpeed + (endSpeed - referenceSpeed) * (time / seconds);
      const groundSpeed = trueAirspeed * Math.cos(left) - headwind;
      return { distance, time, groundSpeed, trueAirspeed, height: 2 * arc.radius * Math.sin(left / 2) ** 2 };
    },
  );
  return [straight, flare];
}

/** The air distance by its time: airspeed falling evenly, heights those of the arc at the same share of its length. */
function slowingLeg(
  run: LandingRun,
  arc: LandingArc,
  { distance, time }: { readonly distance: number; readonly time: number },
  endSpeed: number,
): Leg {
  const { screenHeight, approachAngle, referenceSpeed, headwind } = run;
  const length = arc.straight + arc.flare;
  const heightAt = (share: number): number => {
    const left = (1 - share) * length;
    if (left >= arc.flare)
      return Math.min(screenHeight, arc.flareHeight + (left - arc.flare) * Math.tan(approachAngle));
    return arc.radius - Math.sqrt(arc.radius * arc.radius - left * left);
  };
  const slowing = evenlySlowing(referenceSpeed, endSpeed, time, headwind, (there) => heightAt(there / distance));
  return { ...slowing, at: (there) => notBelow(slowing.at(there), run) };
}

/** The mean speed of an ordinary landing may ask for less than the touchdown speed: in the air no less than that is shown. */
function notBelow(point: TrajectoryPoint, { touchdownSpeed, headwind }: LandingRun): TrajectoryPoint {
  if (point.trueAirspeed >= touchdownSpeed) return point;
  return { ...point, trueAirspeed: touchdownSpeed, groundSpeed: touchdownSpeed - headwind };
}

/** A leg on which the airspeed falls evenly in time. */
function evenlySlowing(
  from: number,
  to: number,
  seconds: number,
  headwind: number,
  heightAt: (distance: number) => number,
): Leg {
  const fall = (from - to) / seconds;
  return pathLeg(
    (_, time) => ({ distance: (from - headwind - (fall * time) / 2) * time, time }),
    0,
    seconds,
    (time, distance) => {
      const trueAirspeed = from - fall * time;
      return { distance, time, groundSpeed: trueAirspeed - headwind, trueAirspeed, height: heightAt(distance) };
    },
  );
}

/** Full braking to a standstill, stretch by stretch of the runway. */
function stopLegs(run: LandingRun, begin: number): Leg[] | undefined {
  const { headwind, touchdownSpeed } = run;
  const stretches = brakedStretches(run) ?? [{ ...run, end: Number.POSITIVE_INFINITY }];
  const forces = stretches.map((stretch) => stopForces(run, stretch));
  const changeOn: ChangeOn = (stretch, from, to) => stopBetween(forces[stretch] as StopForces, from, to);
  const ends = stretches.map(({ end }) => end);
  return speedLegs(stretchedPath(ends, begin, touchdownSpeed, headwind, changeOn), changeOn, headwind);
}
