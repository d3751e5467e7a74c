import { takeoff } from '../performance/takeoff/takeoff.ts';
import type { TakeoffResult, TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { TakeoffAnswer } from './answer.ts';
import type { Question } from './question.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';

/** A takeoff that reached the screen. */
export type Reached = Extract<TakeoffResult, { outcome: 'reaches-screen' }>;
/** The name of why there are no distances. */
export type NotReached = Exclude<TakeoffResult, Reached>;

/** The distances behind an answer; an absent one has no physics or is not asked for. */
export interface TakeoffRuns {
  /** wind, surface and slope as given */
  readonly stated: TakeoffResult | undefined;
  /** wind as the rule set credits it, surface and slope as given */
  readonly credited: TakeoffResult | undefined;
  /** credited wind; paved, dry, level */
  readonly reference: TakeoffResult | undefined;
}

/** What differs between the three. */
export interface RunConditions {
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** of the actual surface; absent where physics does not speak of it */
  readonly actualFriction: number | undefined;
  readonly referenceFriction: number;
  /** whether the rule set multiplies the reference distance */
  readonly needsReference: boolean;
}

/** What of the weather and the runway a run needs beside its question. */
export interface RunAir {
  readonly thrust: Thrust;
  /** [kg/m3] */
  readonly density: number;
  /** [m/s] */
  readonly headwind: number;
  readonly rollingFriction: number;
}

/** The run on the runway as it is, in the wind as given: all that the integrations need. */
export function statedRun(
  { aeroplane: { wing, drag, certification }, mass, runway }: Pick<Question, 'aeroplane' | 'mass' | 'runway'>,
  resolved: ResolvedTakeoff,
  speeds: TakeoffAnswer['speeds'],
  { thrust, density, headwind, rollingFriction }: RunAir,
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
    slope: runway.slope,
    rotationSpeed: speeds.rotation.tas,
    liftOffSpeed: speeds.liftOff.tas,
    screenSpeed: speeds.screen.tas,
    rotationTime: resolved.rotationTime,
    pullUpLoadFactor: resolved.pullUpLoadFactor,
    screenHeight: certification.screenHeight,
  };
}

/** What a run came to, where it reached the screen. */
export function reached(result: TakeoffResult | undefined): Reached | undefined {
  return result?.outcome === 'reaches-screen' ? result : undefined;
}

/** Runs that are the same question are computed once. */
export function takeoffRuns(run: TakeoffRun, conditions: RunConditions): TakeoffRuns {
  const { creditedHeadwind, actualFriction, referenceFriction, needsReference } = conditions;
  const stated = actualFriction === undefined ? undefined : takeoff(run);
  const sameWind = creditedHeadwind === run.headwind;
  const credited = actualFriction === undefined || sameWind ? stated : takeoff({ ...run, headwind: creditedHeadwind });
  if (!needsReference) return { stated, credited, reference: undefined };
  const sameRunway = run.slope === 0 && actualFriction === referenceFriction;
  const reference = sameRunway
    ? credited
    : takeoff({ ...run, headwind: creditedHeadwind, slope: 0, rollingFriction: referenceFriction });
  return { stated, credited, reference };
}

/** The first of the three that has no distance, in the order stated, credited, reference. */
export function notReached({ stated, credited, reference }: TakeoffRuns): NotReached | undefined {
  for (const result of [stated, credited, reference]) {
    if (result !== undefined && result.outcome !== 'reaches-screen') return result;
  }
  return undefined;
}
