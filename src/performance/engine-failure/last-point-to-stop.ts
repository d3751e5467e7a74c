import { brent } from '../../numerics/brent.ts';
import type { BrakedRun } from '../landing/landing-run.ts';
import { outsideStatedData } from '../takeoff/outside-stated-data.ts';
import { type RollAlong, rollAlong } from '../takeoff/roll-along.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import { coastFor } from './coast-for.ts';
import { type FirstAction, type StopFrom, stopFrom } from './stop-from.ts';

/** A rejected takeoff of any aeroplane, in SI. */
export interface RejectedTakeoff {
  /** up to the cue */
  readonly allEngines: TakeoffRun;
  /** with the idle thrust of all engines; its ground measured from brake release */
  readonly stop: BrakedRun;
  /** cue to the pilot's first action [s] */
  readonly reactionTime: number;
  /** at the speed then reached, until brakes, idle and spoilers are all effective [s] */
  readonly transitionTime: number;
}

/** The last point from which a takeoff still stops within a length, or the name of why there is none. */
export type LastPoint =
  | {
      /** 'rotation-speed': it stops from there too, with length to spare */
      readonly outcome: 'last-point' | 'rotation-speed';
      /** true airspeed and ground speed at the cue [m/s] */
      readonly airspeed: number;
      readonly groundSpeed: number;
      /** brake release to the cue, and to the stop [m] */
      readonly distance: number;
      readonly stopDistance: number;
    }
  | { readonly outcome: 'does-not-stop-within'; readonly shortest: number }
  | { readonly outcome: 'ground-speed-not-positive'; readonly headwind: number; readonly speed: number }
  | Exclude<StopFrom, { outcome: 'stops' }>;

/** By what the pilot is told: the engines are idle from the cue on, or go on at full thrust until the first action. */
export interface LastPointToStop {
  readonly lossOfPower: LastPoint;
  readonly powerHolds: LastPoint;
}

interface Rejected {
  readonly cue: FirstAction;
  readonly stop: StopFrom;
}
/** The takeoff rejected at a cue at an airspeed; undefined where all engines do not reach it. */
type RejectAt = (airspeed: number) => Rejected | undefined;

/** On the airspeed [m/s]. */
const tolerance = 1e-6;
/** By how much a stop within the length may miss it at the root [m]. */
const settled = 0.01;
/** No runway is longer, and no stop that ends [m]. */
const longest = 1e9;
/** Stands for a stop without end [m]. */
const endless = 1e12;

/**
 * The greatest speed at which the cue to reject a takeoff may come so that the aeroplane stops within a length: advisory, for any
 * aeroplane, with the cue at the latest at V_R.
 *
 * All engines to the cue; the reaction time, rolling with idle thrust where the cue is a loss of power and on full thrust where it
 * is not; the transition at the speed then reached; the braked roll. The length of that grows with the speed of the cue: a bracketed
 * root.
 *
 * @param rejected - the takeoff and its stop
 * @param available - from brake release [m]
 * @see references.KrenkelSalzman1968; references.Cfr25s109a
 */
export function lastPointToStop(rejected: RejectedTakeoff, available: number): LastPointToStop {
  const roll = rollAlong(rejected.allEngines);
  return {
    lossOfPower: lastPoint(rejected.allEngines, available, (airspeed) => withoutPower(rejected, roll, airspeed)),
    powerHolds: lastPoint(rejected.allEngines, available, (airspeed) => onPower(rejected, roll, airspeed)),
  };
}

function onPower(
  { allEngines, stop, reactionTime, transitionTime }: RejectedTakeoff,
  roll: RollAlong,
  airspeed: number,
): Rejected | undefined {
  const cue = cueAt(roll, allEngines.headwind, airspeed);
  const timeline = { timeAtDecisionSpeed: 0, continuedAccelerationTime: reactionTime, transitionTime };
  return cue && { cue, stop: stopFrom(allEngines, roll, cue, timeline, stop) };
}

function withoutPower(
  { allEngines, stop, reactionTime, transitionTime }: RejectedTakeoff,
  roll: RollAlong,
  airspeed: number,
): Rejected | undefined {
  const cue = cueAt(roll, allEngines.headwind, airspeed);
  const action = cue && coastFor(reactionTime, cue, allEngines, stop);
  const timeline = { timeAtDecisionSpeed: 0, continuedAccelerationTime: 0, transitionTime };
  return action && { cue, stop: stopFrom(allEngines, roll, action, timeline, stop) };
}

function cueAt(roll: RollAlong, headwind: number, airspeed: number): FirstAction | undefined {
  if (airspeed === headwind) return { speed: airspeed, distance: 0, time: 0 };
  const { reaches, sum } = roll(headwind, airspeed, 0);
  return reaches ? { speed: airspeed, distance: sum.distance, time: sum.time } : undefined;
}

function lastPoint(run: TakeoffRun, available: number, rejectAt: RejectAt): LastPoint {
  const { headwind, rotationSpeed } = run;
  if (headwind >= rotationSpeed) return { outcome: 'ground-speed-not-positive', headwind, speed: rotationSpeed };
  const outside = outsideStatedData(run.thrust, headwind, rotationSpeed);
  if (outside !== undefined) return outside;
  const latest = rejectAt(rotationSpeed);
  if (latest !== undefined && latest.stop.outcome === 'stops' && latest.stop.distance <= available) {
    return pointOf('rotation-speed', latest.cue, latest.stop, headwind);
  }
  const first = rejectAt(headwind);
  if (first !== undefined && first.stop.outcome !== 'stops') return first.stop;
  if (needed(first) > available) return { outcome: 'does-not-stop-within', shortest: needed(first) };
  const length = Math.min(available, longest);
  const found = brent((airspeed) => needed(rejectAt(airspeed)) - length, headwind, rotationSpeed, tolerance);
  const last = found.outcome === 'root' ? rejectAt(found.root) : undefined;
  if (last?.stop.outcome !== 'stops') throw new Error(`no last point between ${headwind} and ${rotationSpeed} m/s`);
  // short of the length where the stop from a little more is not known: what lies beyond is not known either
  const unknown = latest?.stop.outcome === 'outside-stated-data' && last.stop.distance < length - settled;
  return unknown ? latest.stop : pointOf('last-point', last.cue, last.stop, headwind);
}

function pointOf(
  outcome: 'last-point' | 'rotation-speed',
  { speed, distance }: FirstAction,
  stop: Extract<StopFrom, { outcome: 'stops' }>,
  headwind: number,
): LastPoint {
  return { outcome, airspeed: speed, groundSpeed: speed - headwind, distance, stopDistance: stop.distance };
}

function needed(rejected: Rejected | undefined): number {
  return rejected?.stop.outcome === 'stops' ? rejected.stop.distance : endless;
}
