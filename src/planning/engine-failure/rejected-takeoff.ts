import { type LastPoint, lastPointToStop } from '../../performance/engine-failure/last-point-to-stop.ts';
import { speedsAtDistances } from '../../performance/engine-failure/speeds-at-distances.ts';
import { takeoff } from '../../performance/takeoff/takeoff.ts';
import type { Assumption, SpeedSet } from '../answer.ts';
import { isFault } from '../chosen.ts';
import { ConfiguredSpeeds } from '../configured-speeds.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { advisoryStop, stopRuleOf, timelineOf } from '../rules/certification/stop-rule.ts';
import { measureText } from '../sentences/measure-text.ts';
import { brakedRun, resolveStop } from './resolve-stop.ts';

/** The last cue to stop from which the aeroplane stands within the length, for one kind of cue. */
export interface LastCue {
  readonly outcome: LastPoint['outcome'] | 'no-data-for-this-surface' | 'never-reaches-lift-off-speed';
  /** why there is none */
  readonly why?: string | undefined;
  readonly speed?: SpeedSet;
  /** [m/s] */
  readonly groundSpeed?: number;
  /** brake release to the cue, and to the stop [m] */
  readonly distance?: number;
  readonly stopDistance?: number;
  /** the shortest stop that there is [m] */
  readonly shortest?: number;
}

/** The speed to expect at a distance from brake release [m], with all engines. */
export interface ExpectedSpeed {
  readonly distance: number;
  readonly speed: SpeedSet;
  /** [m/s] */
  readonly groundSpeed: number;
}

/** The rejected takeoff of any aeroplane, advisory: in the wind, on the surface and slope as given. */
export interface Rejected {
  /** what the stop has to fit in; absent where neither is declared, and the cue at rotation is shown */
  readonly within?: { readonly of: 'asda' | 'tora'; readonly available: number } | undefined;
  /** cue to the first action, and from there until brakes and idle are effective [s] */
  readonly reactionTime: number;
  readonly transitionTime: number;
  /** the engines are idle from the cue on */
  readonly lossOfPower: LastCue;
  /** they go on at full thrust until the first action */
  readonly powerHolds: LastCue;
  /** at each quarter of TORA before lift-off */
  readonly expected: readonly ExpectedSpeed[];
  readonly assumed: readonly Assumption[];
}

/** Stands for a length that nobody has declared [m]. */
const longest = 1e9;

/**
 * From where a takeoff still stops, and the speeds to expect on the way.
 *
 * No rule asks it of singles and light twins; the time to react is that of a pilot who does not expect it.
 *
 * @see references.KrenkelSalzman1968
 */
export function rejectedTakeoff(question: TakeoffQuestion, prepared: PreparedTakeoff): Rejected {
  const { conditions, run, flown, friction } = prepared;
  const { tora, asda } = conditions.declared.credited;
  const allowance = flown.rollingStartAllowance;
  const resolved = resolveStop(question, prepared);
  const reactionTime = timelineOf(advisoryStop).recognitionTime;
  const { transitionTime } = timelineOf(stopRuleOf(question.aeroplane));
  const { braking } = resolved;
  const configured = new ConfiguredSpeeds(question, conditions.configuration, conditions.air);
  const inKinds = (tas: number): SpeedSet => {
    const set = configured.ofTrue(Math.max(0, tas));
    if (isFault(set)) throw new RangeError(`${tas} m/s is not below the speed of sound`);
    return set;
  };
  const within =
    asda !== undefined
      ? ({ of: 'asda', available: asda } as const)
      : tora !== undefined
        ? ({ of: 'tora', available: tora } as const)
        : undefined;
  const shared = {
    within,
    reactionTime,
    transitionTime,
    assumed: resolved.assumed.map(({ assumption }) => assumption),
  };
  if (braking.actual === undefined || friction.actual === undefined) {
    const why = `the stop is not computed on this surface: ${braking.noData ?? friction.noData ?? braking.surface}`;
    const none = { outcome: 'no-data-for-this-surface', why } as const;
    return { ...shared, lossOfPower: none, powerHolds: none, expected: [] };
  }
  const ground = { braking: braking.actual, contaminantDrag: braking.contaminantDrag };
  const stop = brakedRun(run, resolved, ground, resolved.idleThrust);
  const roll = takeoff(run);
  if (roll.outcome === 'never-reaches-lift-off-speed') {
    const why = `the aeroplane does not get beyond ${measureText(question.units, 'speed', roll.atAirspeed)} true airspeed`;
    const none = { outcome: roll.outcome, why } as const;
    return { ...shared, lossOfPower: none, powerHolds: none, expected: [] };
  }
  const available = (within?.available ?? longest) - allowance;
  const last = lastPointToStop({ allEngines: run, stop, reactionTime, transitionTime }, Math.max(0, available));
  const cue = (point: LastPoint) => cueOf(point, question.units, allowance, inKinds);
  return {
    ...shared,
    lossOfPower: cue(last.lossOfPower),
    powerHolds: cue(last.powerHolds),
    expected: tora === undefined ? [] : expectedSpeeds(prepared, tora, inKinds),
  };
}

function cueOf(
  point: LastPoint,
  units: TakeoffQuestion['units'],
  allowance: number,
  inKinds: (tas: number) => SpeedSet,
): LastCue {
  const speed = (si: number) => measureText(units, 'speed', si);
  switch (point.outcome) {
    case 'last-point':
    case 'rotation-speed':
      return {
        outcome: point.outcome,
        speed: inKinds(point.airspeed),
        groundSpeed: point.groundSpeed,
        distance: point.distance + allowance,
        stopDistance: point.stopDistance + allowance,
      };
    case 'does-not-stop-within':
      return {
        outcome: point.outcome,
        why: 'not even a cue at brake release leaves length enough',
        shortest: point.shortest + allowance,
      };
    case 'ground-speed-not-positive':
      return {
        outcome: point.outcome,
        why: `the headwind of ${speed(point.headwind)} is not below the rotation speed`,
      };
    case 'never-stops':
      return {
        outcome: point.outcome,
        why: `the brakes do not slow the aeroplane down at ${speed(point.atGroundSpeed)} over the ground`,
      };
    case 'outside-stated-data':
      return {
        outcome: point.outcome,
        why: `thrust is not known at ${speed(point.airspeed)} true airspeed; its data end at ${speed(point.bound)}`,
      };
  }
}

function expectedSpeeds(
  { run, flown }: PreparedTakeoff,
  tora: number,
  inKinds: (tas: number) => SpeedSet,
): readonly ExpectedSpeed[] {
  const allowance = flown.rollingStartAllowance;
  const marks = [1, 2, 3, 4].map((quarter) => (quarter * tora) / 4).filter((distance) => distance >= allowance);
  const found = speedsAtDistances(
    run,
    marks.map((distance) => distance - allowance),
  );
  if (found.outcome !== 'speeds') return [];
  return found.points.flatMap((point, i) =>
    point === 'beyond-lift-off'
      ? []
      : [{ distance: marks[i] as number, speed: inKinds(point.trueAirspeed), groundSpeed: point.groundSpeed }],
  );
}
