import { g0 } from '../../physics/constants.ts';
import type { PathIntegral } from '../path-integral.ts';
import { groundRoll } from '../takeoff/ground-roll.ts';
import { type OutsideStatedData, outsideStatedData } from '../takeoff/outside-stated-data.ts';
import { type RollAlong, rollAlong } from '../takeoff/roll-along.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import type { AccelerateStop, EngineFailureRun } from './engine-failure-run.ts';
import { oneOutRun } from './one-out-run.ts';
import { speedAtTime } from './speed-at-time.ts';

/** A takeoff with an engine failure and its two rolls, their forces worked out once. */
export interface FailureRolls {
  readonly run: EngineFailureRun;
  readonly oneOutRun: TakeoffRun;
  readonly allEngines: RollAlong;
  readonly oneOut: RollAlong;
}

/** Where an engine fails, or the name of why it cannot before V1. */
export type Failure =
  | {
      readonly outcome: 'fails';
      /** V_EF, true airspeed [m/s] */
      readonly speed: number;
      /** from brake release with all engines [m], [s] */
      readonly distance: number;
      readonly time: number;
    }
  | NeverReaches
  | OutsideStatedData;

type NeverReaches = Extract<AccelerateStop, { outcome: 'never-reaches-decision-speed' }>;

/** The rolls of a run. */
export function failureRolls(run: EngineFailureRun): FailureRolls {
  const oneOut = oneOutRun(run);
  return { run, oneOutRun: oneOut, allEngines: rollAlong(run.allEngines), oneOut: rollAlong(oneOut) };
}

/**
 * Speed at which an engine fails so that the pilot acts at V1, and where.
 *
 * V_EF is the root of t_rec = integral of dV/a between V_EF and V1, a with one engine out, and never below the headwind: ground
 * speed 0. An aeroplane that would not gain speed on the engines that remain is taken to hold it: V_EF = V1.
 *
 * @param run - recognition time t_rec in its timeline
 * @param decisionSpeed - V1, true airspeed [m/s], at or above the headwind
 * @returns V_EF [m/s]; 'never-reaches-decision-speed' where not even all engines reach V1
 * @see references.Cfr25s107, (a)(2); references.Cfr25s109a
 */
export function failureSpeed(run: EngineFailureRun, decisionSpeed: number): Failure {
  return failureOf(failureRolls(run), decisionSpeed);
}

/** The same with the rolls already made. */
export function failureOf({ run, allEngines, oneOut }: FailureRolls, decisionSpeed: number): Failure {
  const { headwind, profile, thrust } = run.allEngines;
  if (!(decisionSpeed >= headwind)) {
    throw new RangeError(`decisionSpeed must not be below the headwind ${headwind}: ${decisionSpeed}`);
  }
  const outside =
    outsideStatedData(thrust, headwind, decisionSpeed) ??
    outsideStatedData(run.remainingThrust, headwind, decisionSpeed);
  if (outside !== undefined) return outside;
  // where the ground is the same throughout it does not matter where the failure happens
  const place = (speed: number) => (profile === undefined ? 0 : allEngines(headwind, speed, 0).sum.distance);
  const { airspeed: speed } = speedAtTime(
    (from) => oneOut(from, decisionSpeed, place(from)),
    decisionSpeed,
    headwind,
    run.timeline.recognitionTime,
  );
  const { reaches, sum } = allEngines(headwind, speed, 0);
  return reaches
    ? { outcome: 'fails', speed, distance: sum.distance, time: sum.time }
    : neverReaches(run.allEngines, decisionSpeed, sum);
}

/** The named outcome, with the airspeed at which the acceleration of all engines is gone. */
export function neverReaches(run: TakeoffRun, decisionSpeed: number, { least, leastAt }: PathIntegral): NeverReaches {
  const outcome = 'never-reaches-decision-speed';
  const roll = groundRoll({ ...run, liftOffSpeed: decisionSpeed });
  // of a roll without length there is only the one acceleration
  if (roll.outcome !== 'never-reaches-lift-off-speed') {
    return { outcome, atAirspeed: leastAt, leastAccelerationRatio: least / g0 };
  }
  const { atAirspeed, leastAccelerationRatio } = roll;
  return { outcome, atAirspeed, leastAccelerationRatio };
}
