import type { Aeroplane } from '../performance/aeroplane.ts';
import { takeoff } from '../performance/takeoff/takeoff.ts';
import type { TakeoffResult, TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { TakeoffAnswer } from './answer.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';

/** A takeoff that reached the screen. */
export type Reached = Extract<TakeoffResult, { outcome: 'reaches-screen' }>;
/** The name of why there are no distances. */
export type NotReached = Exclude<TakeoffResult, Reached>;

/** The distances behind an answer; an absent one has no physics or is not asked for. */
export interface TakeoffRuns {
  /** wind, surface and slope as given */
  readonly stated?: TakeoffResult;
  /** wind as the rule set credits it, surface and slope as given */
  readonly credited?: TakeoffResult;
  /** credited wind; paved, dry, level */
  readonly reference?: TakeoffResult;
}

/** What differs between the three. */
export interface RunConditions {
  /** [m/s] */
  readonly statedHeadwind: number;
  readonly creditedHeadwind: number;
  readonly slope: number;
  /** of the actual surface; absent where physics does not speak of it */
  readonly actualFriction?: number;
  readonly referenceFriction: number;
  /** whether the rule set multiplies the reference distance */
  readonly needsReference: boolean;
}

/**
 * The run on the runway as it is, in the wind as given.
 *
 * @param rollingFriction - of the surface
 * @returns what the integrations need
 */
export function statedRun(
  { wing, drag, certification }: Aeroplane,
  mass: number,
  resolved: ResolvedTakeoff,
  speeds: TakeoffAnswer['speeds'],
  thrust: Thrust,
  density: number,
  headwind: number,
  slope: number,
  rollingFriction: number,
): TakeoffRun {
  return {
    mass,
    wingArea: wing.area,
    span: wing.span,
    wingHeight: wing.heightAboveGround,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    groundDragCoefficient: drag.zeroLiftCoefficient + resolved.groundDragIncrement,
    airDragCoefficient: drag.zeroLiftCoefficient + resolved.airDragIncrement,
    groundLiftCoefficient: resolved.groundLiftCoefficient,
    rollingFriction,
    thrust,
    density,
    headwind,
    slope,
    rotationSpeed: speeds.rotation.tas,
    liftOffSpeed: speeds.liftOff.tas,
    screenSpeed: speeds.screen.tas,
    rotationTime: resolved.rotationTime,
    pullUpLoadFactor: resolved.pullUpLoadFactor,
    screenHeight: certification.screenHeight,
  };
}

/** Runs that are the same question are computed once. */
export function takeoffRuns(run: TakeoffRun, conditions: RunConditions): TakeoffRuns {
  const { statedHeadwind, creditedHeadwind, slope, actualFriction, referenceFriction, needsReference } = conditions;
  const stated = actualFriction === undefined ? undefined : takeoff(run);
  const sameWind = creditedHeadwind === statedHeadwind;
  const credited = actualFriction === undefined || sameWind ? stated : takeoff({ ...run, headwind: creditedHeadwind });
  if (!needsReference) return runs(stated, credited, undefined);
  const sameRunway = slope === 0 && actualFriction === referenceFriction;
  const reference = sameRunway
    ? credited
    : takeoff({ ...run, headwind: creditedHeadwind, slope: 0, rollingFriction: referenceFriction });
  return runs(stated, credited, reference);
}

/** The first of the three that has no distance, in the order stated, credited, reference. */
export function notReached({ stated, credited, reference }: TakeoffRuns): NotReached | undefined {
  for (const result of [stated, credited, reference]) {
    if (result !== undefined && result.outcome !== 'reaches-screen') return result;
  }
  return undefined;
}

function runs(
  stated: TakeoffResult | undefined,
  credited: TakeoffResult | undefined,
  reference: TakeoffResult | undefined,
): TakeoffRuns {
  return {
    ...(stated === undefined ? {} : { stated }),
    ...(credited === undefined ? {} : { credited }),
    ...(reference === undefined ? {} : { reference }),
  };
}
