import { brent } from '../../numerics/brent.ts';
import { splitPoints } from '../../numerics/split-points.ts';
import { pathTable, pointOnPath } from '../path-table.ts';
import { evenSteps, type Leg, type TrajectoryPoint } from '../trajectory.ts';
import { climbForces, climbGradient, energySine } from './climb-forces.ts';
import { addClimbPiece, climbJumps } from './climb-piece.ts';
import { pullUpArcDistance, pullUpArcTime, pullUpArcTop, pullUpRadius } from './pull-up-arc.ts';
import { type RollForces, rollForces, sloped } from './roll-forces.ts';
import { addRollPiece, rollJumps } from './roll-piece.ts';
import { underPath } from './takeoff.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/**
 * The takeoff as a path: where the aeroplane is, at even steps of distance from brake release to the screen.
 *
 * The path is that of groundRoll and airDistance: the roll to V_R, the rotation at V_R for its time, the roll on to V_LOF, the
 * arc, the climb on the energy path.
 *
 * @param run - one that reaches the screen
 * @param rollingStartAllowance - [m] at the beginning, on which neither speed nor time is known: both are 0 there
 * @param steps - of distance
 * @returns steps + 1 points, or undefined where the run does not reach the screen
 * @remarks With a tailwind the airspeed begins below 0: the air comes from behind.
 * @see references.McCormick1995, sec. 7.2; references.HouseEnergyPath
 */
export function takeoffTrajectory(
  run: TakeoffRun,
  rollingStartAllowance: number,
  steps: number,
): TrajectoryPoint[] | undefined {
  const roll = rollLegs(run);
  if (roll === undefined) return undefined;
  const air = airLegs(
    underPath(
      run,
      roll.reduce((sum, { distance }) => sum + distance, 0),
    ),
  );
  if (air === undefined) return undefined;
  const atRest = { time: 0, groundSpeed: 0, trueAirspeed: run.headwind, height: 0 };
  const start = { distance: rollingStartAllowance, time: 0, at: (distance: number) => ({ ...atRest, distance }) };
  return evenSteps([start, ...roll, ...air], steps);
}

/** The roll, stretch by stretch of the ground line, with the rotation where V_R is reached. */
function rollLegs(run: TakeoffRun): Leg[] | undefined {
  const { headwind, liftOffSpeed } = run;
  if (headwind >= liftOffSpeed) return undefined;
  const rotationSpeed = Math.min(liftOffSpeed, Math.max(headwind, run.rotationSpeed));
  const legs: Leg[] = [];
  const forces = rollForces(run);
  const { ends, slopes } = run.profile ?? { ends: [], slopes: [run.slope] };
  let speed = headwind;
  let rotated = false;
  let begin = 0;
  for (let i = 0; i < slopes.length && (speed < liftOffSpeed || !rotated); i++) {
    const here = sloped(forces, slopes[i] as number);
    // the last slope holds beyond the profile
    let left = i === slopes.length - 1 ? Number.POSITIVE_INFINITY : (ends[i] as number) - begin;
    begin = ends[i] ?? begin;
    while (left > 0 && (speed < liftOffSpeed || !rotated)) {
      if (!rotated && speed >= rotationSpeed) {
        legs.push(rotationLeg(run, rotationSpeed));
        rotated = true;
        continue;
      }
      const stretch = rollLeg(here, headwind, speed, rotated ? liftOffSpeed : rotationSpeed, left);
      if (stretch === undefined) return undefined;
      legs.push(stretch.leg);
      speed = stretch.endSpeed;
      left = stretch.endSpeed < (rotated ? liftOffSpeed : rotationSpeed) ? 0 : left - stretch.leg.distance;
    }
  }
  return legs;
}

/** The roll under steady forces to an airspeed, or until a length is used up. */
function rollLeg(
  forces: RollForces,
  headwind: number,
  from: number,
  to: number,
  length: number,
): { readonly leg: Leg; readonly endSpeed: number } | undefined {
  const table = pathTable(
    splitPoints(from, to, rollJumps(forces)),
    (low, high, sum) => addRollPiece(forces, headwind, low, high, sum),
    length,
  );
  if (table === undefined) return undefined;
  const whole = table.distances.at(-1) as number;
  const usedUp = whole > length;
  const end = usedUp ? pointOnPath(table, length) : { at: to, time: table.times.at(-1) as number };
  const at = (distance: number): TrajectoryPoint => {
    const { at: trueAirspeed, time } = pointOnPath(table, distance);
    return { distance, time, groundSpeed: trueAirspeed - headwind, trueAirspeed, height: 0 };
  };
  return { leg: { distance: usedUp ? length : whole, time: end.time, at }, endSpeed: end.at };
}

function rotationLeg({ headwind, rotationTime }: TakeoffRun, trueAirspeed: number): Leg {
  const groundSpeed = trueAirspeed - headwind;
  return {
    distance: groundSpeed * rotationTime,
    time: rotationTime,
    at(distance) {
      const time = groundSpeed > 0 ? distance / groundSpeed : 0;
      return { distance, time, groundSpeed, trueAirspeed, height: 0 };
    },
  };
}

/** The arc after lift-off, then the climb that energy allows. */
function airLegs(run: TakeoffRun): Leg[] | undefined {
  const { headwind, screenHeight } = run;
  const forces = climbForces(run);
  const atLiftOff = climbGradient(forces, 0);
  const atScreen = climbGradient(forces, screenHeight);
  if (!(Math.min(atLiftOff, atScreen) > 0)) return undefined;
  const radius = pullUpRadius(run.liftOffSpeed, run.pullUpLoadFactor);
  const top = pullUpArcTop(forces, radius, screenHeight, atLiftOff, atScreen);
  const pointAt = (height: number, distance: number, time: number, cosine: number): TrajectoryPoint => {
    const trueAirspeed = Math.sqrt(forces.square + forces.growth * height);
    return { distance, time, groundSpeed: trueAirspeed * cosine - headwind, trueAirspeed, height };
  };

  const arcTime = (height: number) => pullUpArcTime(forces, radius, height);
  const arcDistance = (height: number) => pullUpArcDistance(radius, height) - headwind * arcTime(height);
  const arc: Leg = {
    distance: arcDistance(top),
    time: arcTime(top),
    at(distance) {
      const found = brent((height) => arcDistance(height) - distance, 0, top, 1e-12 * top);
      const height = found.outcome === 'not-bracketed' ? (distance > 0 ? top : 0) : found.root;
      return pointAt(height, distance, arcTime(height), 1 - height / radius);
    },
  };
  if (top >= screenHeight) return [arc];
  const table = pathTable(
    splitPoints(top, screenHeight, climbJumps(forces)),
    (from, to, sum) => addClimbPiece(forces, from, to, sum),
    undefined,
    headwind,
  );
  if (table === undefined) return undefined;
  const climb: Leg = {
    distance: table.distances.at(-1) as number,
    time: table.times.at(-1) as number,
    at(distance) {
      const { at: height, time } = pointOnPath(table, distance);
      const sine = energySine(forces, climbGradient(forces, height));
      return pointAt(height, distance, time, Math.sqrt(1 - sine * sine));
    },
  };
  return [arc, climb];
}
