import { landing } from '../performance/landing/landing.ts';
import type { BrakedStretch, LandingResult, LandingRun } from '../performance/landing/landing-run.ts';
import type { BrakingFriction } from '../physics/braking-friction.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import type { StoppingDrag } from '../physics/stopping-drag.ts';
import type { LandingAnswer } from './answer.ts';
import type { Shares } from './manual/shares.ts';
import type { LandingQuestion } from './question.ts';
import type { ResolvedLanding } from './resolve-landing.ts';
import { landingScreenHeight } from './rules/landing-defaults.ts';
import { firstWithout, type Runs, runsOf } from './runs.ts';

/** A landing that stops. */
export type Stopped = Extract<LandingResult, { outcome: 'stops' }>;
/** The name of why there are no distances. */
export type NotStopped = Exclude<LandingResult, Stopped>;
/** The distances behind an answer to a landing. */
export type LandingRuns = Runs<LandingResult>;

/** What differs between them. */
export interface LandingConditions {
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** on the actual surface; absent where physics does not speak of it */
  readonly actualBraking: BrakingFriction | undefined;
  readonly referenceBraking: BrakingFriction;
  /** whether the rule set multiplies the reference distance */
  readonly needsReference: boolean;
  /** whether a slope that helps earns nothing under the rule set */
  readonly slopeEarnsNothing: boolean;
}

/** What of the weather and the runway a run needs beside its question. */
export interface LandingAir {
  /** [kg/m3] */
  readonly density: number;
  /** [m/s] */
  readonly headwind: number;
  readonly braking: BrakingFriction;
  /** where the runway is not the same throughout */
  readonly stretches?: readonly BrakedStretch[] | undefined;
  /** what a loose contaminant helps */
  readonly contaminantDrag?: StoppingDrag | undefined;
}

/** The run on the runway as it is, in the wind as given: all that the integrations need. */
export function statedLanding(
  question: Pick<LandingQuestion, 'aeroplane' | 'mass' | 'runway' | 'procedure'>,
  resolved: ResolvedLanding,
  speeds: LandingAnswer['speeds'],
  { density, headwind, braking, stretches, contaminantDrag }: LandingAir,
): LandingRun {
  const { wing, drag, reverseThrust } = question.aeroplane;
  return {
    mass: question.mass,
    wingArea: wing.area,
    span: wing.span,
    wingHeight: wing.heightAboveGround,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    groundDragCoefficient: drag.zeroLiftCoefficient + resolved.groundDragIncrement,
    groundLiftCoefficient: resolved.groundLiftCoefficient,
    braking,
    stretches,
    contaminantDrag,
    idleThrust: resolved.idleThrust,
    density,
    headwind,
    slope: question.runway.slope,
    profile: question.runway.profile,
    referenceSpeed: speeds.landingReference.tas,
    touchdownSpeed: speeds.touchdown.tas,
    approachAngle: resolved.approachAngle,
    flareLoadFactor: resolved.flareLoadFactor,
    screenHeight: landingScreenHeight,
    freeRollTime: resolved.freeRollTime,
    floatDecelerationRatio: resolved.floatDecelerationRatio,
    reverseThrust: question.procedure?.reverse ? reverseThrust : undefined,
  };
}

/**
 * The runs behind an answer.
 *
 * No reverse thrust shortens the distance that factors multiply: it stands for the flight manual's, which counts none.
 */
export function landingRuns(run: LandingRun, conditions: LandingConditions): LandingRuns {
  const { creditedHeadwind, actualBraking, referenceBraking, needsReference, slopeEarnsNothing } = conditions;
  return runsOf(landing, run, {
    known: actualBraking !== undefined,
    creditedHeadwind,
    alsoLevel: slopeEarnsNothing && (run.profile !== undefined || run.slope > 0),
    reference: needsReference
      ? {
          ...run,
          headwind: creditedHeadwind,
          slope: 0,
          profile: undefined,
          braking: referenceBraking,
          stretches: undefined,
          contaminantDrag: undefined,
          reverseThrust: undefined,
        }
      : undefined,
    sameRunway:
      run.slope === 0 &&
      run.profile === undefined &&
      run.stretches === undefined &&
      run.contaminantDrag === undefined &&
      actualBraking === referenceBraking &&
      run.reverseThrust === undefined,
  });
}

/** What a run came to, where it stops. */
export function stopped(result: LandingResult | undefined): Stopped | undefined {
  return result !== undefined && isStopped(result) ? result : undefined;
}

/** The first of them that does not stop, in their order. */
export function notStopped(runs: LandingRuns): NotStopped | undefined {
  return firstWithout(runs, isStopped);
}

/** A run whose ground roll and air distance are so many times as long, in as many times the time. */
export function scaledLanding(result: Stopped, shares: Shares | undefined): Stopped {
  if (shares === undefined) return result;
  const groundRoll = result.groundRoll * shares.groundRoll;
  const airDistance = result.airDistance * shares.airDistance;
  return {
    ...result,
    airDistance,
    airTime: result.airTime * shares.airDistance,
    floatDistance: result.floatDistance * shares.airDistance,
    freeRoll: result.freeRoll * shares.groundRoll,
    freeRollTime: result.freeRollTime * shares.groundRoll,
    brakedRoll: result.brakedRoll * shares.groundRoll,
    brakedRollTime: result.brakedRollTime * shares.groundRoll,
    groundRoll,
    landingDistance: groundRoll + airDistance,
  };
}

function isStopped(result: LandingResult): result is Stopped {
  return result.outcome === 'stops';
}
