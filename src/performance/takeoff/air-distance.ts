import { splitPoints } from '../../numerics/split-points.ts';
import { heightRatioWithoutEffect } from '../../physics/ground-effect.ts';
import { addSettled, newPathIntegral, type PathIntegral } from '../path-integral.ts';
import { type ClimbForces, climbForces, climbGradient } from './climb-forces.ts';
import { addClimbPiece, climbJumps } from './climb-piece.ts';
import { pullUpArcDistance, pullUpArcTime, pullUpArcTop, pullUpRadius } from './pull-up-arc.ts';
import type { TakeoffRun } from './takeoff-run.ts';

/** The air path, or the name of why there is none. */
export type AirDistance =
  | {
      readonly outcome: 'reaches-screen';
      /** lift-off to the screen, over the ground [m], [s] */
      readonly distance: number;
      readonly time: number;
      readonly leastClimbGradient: number;
    }
  | {
      readonly outcome: 'never-reaches-screen-height';
      readonly leastClimbGradient: number;
      readonly neededClimbGradient: number;
    }
  | {
      readonly outcome: 'ground-speed-not-positive';
      readonly headwind: number;
      /** mean speed forward through the air on the path [m/s] */
      readonly climbSpeed: number;
    };

/** Least climb gradient at which a path with all engines is computed. @see references.HouseEnergyPath */
export const neededWithAllEngines = 0.015;
/** Below this share of the greatest gradient, 6 nodes a piece are not trusted unseen. */
const fineBelowShare = 0.5;

/**
 * Distance over the ground from lift-off to the screen height.
 *
 * The speed schedule is the procedure's: V^2 grows linearly with height from V_LOF^2 to V_scr^2, so that
 * sin(gamma_e) = ((T - D)/W - max(slope, 0))/kappa, kappa = 1 + (V_scr^2 - V_LOF^2)/(2 g h_s). Just after lift-off the path is no
 * steeper than a pull-up arc of radius R = V_LOF^2/(g (n - 1)): cos(gamma_a) = 1 - h/R. With gamma the lesser of the two,
 * s = integral of (V cos gamma - w)/(V sin gamma) dh. On the arc the still-air part is R sin gamma exactly and the time is
 * R times the integral of d gamma/V; above it both are integrals over height, in pieces that end where the ground effect does
 * and at the thrust's kinks.
 *
 * @param run - speeds true [m/s], screen height h_s [m], load factor n of the arc above 1
 * @param needed - climb gradient that must be exceeded on the whole path
 * @returns distance [m] and time [s], or 'never-reaches-screen-height' with the least (T - D)/W - max(slope, 0), or
 * 'ground-speed-not-positive' where a steep path through a wind just below the lift-off speed gets nowhere over the ground
 * @remarks A screen speed below the lift-off speed counts as the lift-off speed. Long by design just after lift-off, where the
 * arc throws energy away; a falling runway gets no credit. Path angles are held to 45 degrees.
 * @see references.HouseEnergyPath
 */
export function airDistance(run: TakeoffRun, needed = neededWithAllEngines): AirDistance {
  const { headwind, screenHeight } = run;
  const forces = climbForces(run);
  const atLiftOff = climbGradient(forces, 0);
  const atScreen = climbGradient(forces, screenHeight);
  const lesser = leastAtJumps(forces, Math.min(atLiftOff, atScreen), screenHeight);
  if (!(lesser > needed)) return neverReaches(lesser, needed);

  const radius = pullUpRadius(run.liftOffSpeed, run.pullUpLoadFactor);
  const arcTop = pullUpArcTop(forces, radius, screenHeight, atLiftOff, atScreen);
  const arcTime = pullUpArcTime(forces, radius, arcTop);

  let sum = newPathIntegral();
  if (arcTop < screenHeight) {
    const ends = splitPoints(arcTop, screenHeight, climbJumps(forces));
    for (let i = 1; i < ends.length; i++) addClimbPiece(forces, ends[i - 1] as number, ends[i] as number, sum);
    if (!(sum.least > needed)) return neverReaches(sum.least, needed);
    if (sum.least < fineBelowShare * sum.most) {
      const add = (from: number, to: number, into: PathIntegral) => addClimbPiece(forces, from, to, into);
      sum = newPathIntegral();
      let settled = true;
      for (let i = 1; i < ends.length && settled; i++) {
        settled = addSettled(add, ends[i - 1] as number, ends[i] as number, sum);
      }
      if (!settled || !(sum.least > needed)) return neverReaches(sum.least, needed);
    }
  }
  const time = arcTime + sum.time;
  const throughAir = pullUpArcDistance(radius, arcTop) + sum.distance;
  const distance = throughAir - headwind * time;
  if (!(distance > 0)) return { outcome: 'ground-speed-not-positive', headwind, climbSpeed: throughAir / time };
  return {
    outcome: 'reaches-screen',
    distance,
    time,
    leastClimbGradient: Math.min(lesser, sum.least),
  };
}

/** The least of a gradient already found and those where its slope jumps on the path. */
function leastAtJumps(forces: ClimbForces, found: number, screenHeight: number): number {
  const { square, growth, thrust, perSpan, wingHeight } = forces;
  const effectEnd = heightRatioWithoutEffect / perSpan - wingHeight;
  let least = effectEnd > 0 && effectEnd < screenHeight ? Math.min(found, climbGradient(forces, effectEnd)) : found;
  for (let i = 0; i < thrust.kinks.length; i++) {
    const kink = thrust.kinks[i] as number;
    const rise = kink * kink - square;
    if (rise > 0 && rise < growth * screenHeight) least = Math.min(least, climbGradient(forces, rise / growth));
  }
  return least;
}

function neverReaches(leastClimbGradient: number, neededClimbGradient: number): AirDistance {
  return { outcome: 'never-reaches-screen-height', leastClimbGradient, neededClimbGradient };
}
