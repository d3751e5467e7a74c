import { takeoff } from '../performance/takeoff/takeoff.ts';
import type { TakeoffResult, TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { TakeoffAnswer } from './answer.ts';
import type { Shares } from './manual/shares.ts';
import type { Question } from './question.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';
import { firstWithout, type Runs, runsOf } from './runs.ts';

/** A takeoff that reached the screen. */
export type Reached = Extract<TakeoffResult, { outcome: 'reaches-screen' }>;
/** The name of why there are no distances. */
export type NotReached = Exclude<TakeoffResult, Reached>;

/** The distances behind an answer to a takeoff. */
export type TakeoffRuns = Runs<TakeoffResult>;

/** What differs between them. */
export interface RunConditions {
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** of the actual surface; absent where physics does not speak of it */
  readonly actualFriction: number | undefined;
  readonly referenceFriction: number;
  /** added to each ground roll [m] */
  readonly rollingStartAllowance: number;
  /** whether the rule set multiplies the reference distance */
  readonly needsReference: boolean;
  /** whether a slope that helps earns nothing under the rule set */
  readonly slopeEarnsNothing: boolean;
}

/** What of the weather and the runway a run needs beside its question. */
export interface RunAir {
  readonly thrust: Thrust;
  /** [kg/m3] */
  readonly density: number;
  /** [m/s] */
  readonly headwind: number;
  readonly rollingFriction: number;
  /** of a loose contaminant [kg/m] */
  readonly contaminantDrag?: number | undefined;
}

/** The run on the runway as it is, in the wind as given: all that the integrations need. */
export function statedRun(
  { aeroplane: { wing, drag, certification }, mass, runway }: Pick<Question, 'aeroplane' | 'mass' | 'runway'>,
  resolved: ResolvedTakeoff,
  speeds: TakeoffAnswer['speeds'],
  { thrust, density, headwind, rollingFriction, contaminantDrag }: RunAir,
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
    contaminantDrag,
    thrust,
    density,
    headwind,
    slope: runway.slope,
    profile: runway.profile,
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
  return result !== undefined && isReached(result) ? result : undefined;
}

/**
 * What comes of a run whose start is not from standing at full power.
 *
 * @param rollingStartAllowance - added to the ground roll [m]
 */
export function takeoffOf(run: TakeoffRun, rollingStartAllowance: number): TakeoffResult {
  const result = takeoff(run);
  if (rollingStartAllowance === 0 || result.outcome !== 'reaches-screen') return result;
  return {
    ...result,
    groundRoll: result.groundRoll + rollingStartAllowance,
    takeoffDistance: result.takeoffDistance + rollingStartAllowance,
  };
}

/** The runs behind an answer. */
export function takeoffRuns(run: TakeoffRun, conditions: RunConditions): TakeoffRuns {
  const {
    creditedHeadwind,
    actualFriction,
    referenceFriction,
    rollingStartAllowance,
    needsReference,
    slopeEarnsNothing,
  } = conditions;
  const compute = (other: TakeoffRun) => takeoffOf(other, rollingStartAllowance);
  return runsOf(compute, run, {
    known: actualFriction !== undefined,
    creditedHeadwind,
    alsoLevel: slopeEarnsNothing && (run.profile !== undefined || run.slope < 0),
    reference: needsReference
      ? {
          ...run,
          headwind: creditedHeadwind,
          slope: 0,
          profile: undefined,
          rollingFriction: referenceFriction,
          contaminantDrag: undefined,
        }
      : undefined,
    sameRunway:
      run.slope === 0 &&
      run.profile === undefined &&
      run.contaminantDrag === undefined &&
      actualFriction === referenceFriction,
  });
}

/** The first of them that has no distance, in their order. */
export function notReached(runs: TakeoffRuns): NotReached | undefined {
  return firstWithout(runs, isReached);
}

/** A run whose ground roll and air distance are so many times as long, in as many times the time. */
export function scaledTakeoff(result: Reached, shares: Shares | undefined): Reached {
  if (shares === undefined) return result;
  const groundRoll = result.groundRoll * shares.groundRoll;
  const airDistance = result.airDistance * shares.airDistance;
  return {
    ...result,
    groundRoll,
    airDistance,
    takeoffDistance: groundRoll + airDistance,
    groundRollTime: result.groundRollTime * shares.groundRoll,
    airTime: result.airTime * shares.airDistance,
  };
}

function isReached(result: TakeoffResult): result is Reached {
  return result.outcome === 'reaches-screen';
}
