import { splitPoints } from '../../numerics/split-points.ts';
import { type AddPiece, addSettled, newPathIntegral } from '../path-integral.ts';
import { pathLeg } from '../path-leg.ts';
import { evenSteps, type Leg, type TrajectoryPoint } from '../trajectory.ts';
import { climbForces, climbGradient, energySine } from './climb-forces.ts';
import { addClimbPiece, climbJumps } from './climb-piece.ts';
import { pullUpArcDistance, pullUpArcTime, pullUpArcTop, pullUpRadius } from './pull-up-arc.ts';
import { rollLegs } from './roll-legs.ts';
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

  const add: AddPiece = (from, to, sum) => addClimbPiece(forces, from, to, sum);
  const arcTime = (height: number) => pullUpArcTime(forces, radius, height);
  const arcDistance = (height: number) => pullUpArcDistance(radius, height) - headwind * arcTime(height);
  const arc = pathLeg(
    (_, height) => ({ distance: arcDistance(height), time: arcTime(height) }),
    0,
    top,
    (height, distance, time) => pointAt(height, distance, time, 1 - height / radius),
  );
  if (top >= screenHeight) return [arc];
  const climb = pathLeg(
    (from, to) => {
      const sum = newPathIntegral();
      const ends = splitPoints(from, to, climbJumps(forces));
      for (let i = 1; i < ends.length; i++) addSettled(add, ends[i - 1] as number, ends[i] as number, sum);
      return { distance: sum.distance - headwind * sum.time, time: sum.time };
    },
    top,
    screenHeight,
    (height, distance, time) => {
      const sine = energySine(forces, climbGradient(forces, height));
      return pointAt(height, distance, time, Math.sqrt(1 - sine * sine));
    },
  );
  return [arc, climb];
}
