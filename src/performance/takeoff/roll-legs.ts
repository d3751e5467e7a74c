import { speedLegs, steadyLeg } from '../speed-legs.ts';
import { type ChangeOn, type PathPart, stretchedPath } from '../stretched-path.ts';
import type { Leg } from '../trajectory.ts';
import { rollBetween } from './roll-between.ts';
import { type RollForces, rollForces, sloped } from './roll-forces.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/**
 * The ground roll as legs of a trajectory, stretch by stretch of the ground line, with the rotation where V_R is reached.
 *
 * @returns undefined where the run does not reach its lift-off speed
 * @see references.McCormick1995, sec. 7.2
 */
export function rollLegs(run: TakeoffRun): Leg[] | undefined {
  const { headwind, liftOffSpeed, rotationTime } = run;
  if (headwind >= liftOffSpeed) return undefined;
  const forces = rollForces(run);
  const slopes = run.profile?.slopes ?? [run.slope];
  const here = slopes.map((slope) => sloped(forces, slope));
  const changeOn: ChangeOn = (stretch, from, to) => rollBetween(here[stretch] as RollForces, headwind, from, to);
  const { reaches, parts } = stretchedPath(
    run.profile?.ends ?? [Number.POSITIVE_INFINITY],
    0,
    headwind,
    liftOffSpeed,
    changeOn,
  );
  const rotationSpeed = Math.min(liftOffSpeed, Math.max(headwind, run.rotationSpeed));
  const slower = parts.filter(({ from }) => from < rotationSpeed).map((part) => upTo(part, rotationSpeed));
  const faster = parts.filter(({ to }) => to > rotationSpeed).map((part) => onFrom(part, rotationSpeed));
  const before = speedLegs({ reaches, parts: slower }, changeOn, headwind);
  const after = speedLegs({ reaches, parts: faster }, changeOn, headwind);
  return before && after && [...before, steadyLeg(rotationSpeed, headwind, rotationTime), ...after];
}

function upTo(part: PathPart, airspeed: number): PathPart {
  return { ...part, to: Math.min(part.to, airspeed) };
}

function onFrom(part: PathPart, airspeed: number): PathPart {
  return { ...part, from: Math.max(part.from, airspeed) };
}
