import { accelerateGo } from '../../performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../performance/engine-failure/accelerate-stop.ts';
import { balancedField } from '../../performance/engine-failure/balanced-field.ts';
import { type DecisionLimits, decisionBounds } from '../../performance/engine-failure/decision-bounds.ts';
import type {
  AccelerateGo,
  AccelerateStop,
  BalancedField,
  EngineFailureRun,
} from '../../performance/engine-failure/engine-failure-run.ts';
import { propulsionAtSetting } from '../../performance/power-setting.ts';
import { propulsionThrust } from '../../performance/propulsion.ts';
import { easFromCas } from '../../physics/airspeed.ts';
import { airBeside } from '../air-beside.ts';
import type { SpeedSet } from '../answer.ts';
import type { AnyAssumed } from '../assumed.ts';
import { banded, highOver } from '../band.ts';
import { isFault } from '../chosen.ts';
import { ConfiguredSpeeds } from '../configured-speeds.ts';
import type { Fault } from '../fault.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { engineOutScreen } from '../rules/engine-failure-defaults.ts';
import { isTransport } from '../rules/named-aeroplanes.ts';
import { type Decided, decidedSpeed, isField } from './decided-speed.ts';
import { decisionFault } from './decision-fault.ts';
import type { DecisionSpeed, EngineOut } from './engine-failure-answer.ts';
import { type EngineFailureBand, engineFailureBand } from './engine-failure-band.ts';
import type { CheckedFailure, FailureDistances } from './engine-failure-check.ts';
import { failureRun } from './engine-failure-runs.ts';
import { fieldWhy } from './field-why.ts';
import { type ResolvedEngineOut, resolveEngineOut } from './resolve-engine-out.ts';
import { type ResolvedStop, resolveStop } from './resolve-stop.ts';

/** What an engine failure comes to, for the answer, the checks, the cautions and the working. */
export interface EngineFailure {
  readonly engineOut: Omit<EngineOut, 'climb'>;
  readonly decision: DecisionSpeed | undefined;
  readonly decided: Decided | undefined;
  readonly stop: ResolvedStop;
  readonly out: ResolvedEngineOut;
  /** as stated; undefined where physics does not speak of the surface */
  readonly run: EngineFailureRun | undefined;
  readonly checked: CheckedFailure;
  /** the high end of the band over the value, for what a check is of; undefined where there is none */
  readonly highOver: (of: string) => number | undefined;
  readonly assumed: readonly AnyAssumed[];
}

/**
 * What comes of an engine failure in the takeoff of an aeroplane with more than one engine.
 *
 * The decision speed is found in the wind that counts under the rules, and the distances of the answer at that speed in the wind as
 * given. The flight manual's tables of a takeoff with all engines say nothing of a failure: all of it is physics.
 *
 * @param prepared - of the same question
 * @returns undefined for a single; a fault where the speed asked for is out of order
 */
export function engineFailureOf(
  question: TakeoffQuestion,
  prepared: PreparedTakeoff,
): EngineFailure | Fault | undefined {
  const { aeroplane } = question;
  if (aeroplane.engines < 2) return undefined;
  const { conditions, run, flown, power, friction, runConditions } = prepared;
  const { air, asked, declared } = conditions;
  const stop = resolveStop(question, prepared);
  const out = resolveEngineOut(question, prepared);
  if (isFault(out)) return out;
  const { braking } = stop;
  const assumed = [...stop.assumed, ...out.assumed];
  const outcomeless = { ...answerBase(prepared, stop, out), outcome: 'no-data-for-this-surface' as const };
  if (braking.actual === undefined || friction.actual === undefined) {
    const why = `the stop is not computed on this surface: ${braking.noData ?? friction.noData ?? braking.surface}`;
    const checked: CheckedFailure = { onRunway: nothing, why };
    const engineOut = { ...outcomeless, why };
    return {
      engineOut,
      decision: undefined,
      decided: undefined,
      stop,
      out,
      run: undefined,
      checked,
      highOver: none,
      assumed,
    };
  }

  const propulsion = propulsionAtSetting(aeroplane.propulsion, flown.fullPowerRatio);
  const remaining = propulsionThrust(propulsion, aeroplane.engines - 1, air, power.thrustFactor);
  const ground = { braking: braking.actual, contaminantDrag: braking.contaminantDrag, screenHeight: out.screenHeight };
  const stated = failureRun(run, remaining, aeroplane.engines, stop, out, ground);
  const counting =
    runConditions.creditedHeadwind === run.headwind ? stated : inWind(stated, runConditions.creditedHeadwind);
  const allowance = flown.rollingStartAllowance;
  const lengths = {
    accelerateStopDistanceAvailable: (declared.credited.asda ?? Number.POSITIVE_INFINITY) - allowance,
    takeoffDistanceAvailable: (declared.credited.toda ?? Number.POSITIVE_INFINITY) - allowance,
  };
  const limits = limitsOf(question, out);
  const configured = new ConfiguredSpeeds(question, conditions.configuration, air);
  const askedFor = askedSpeed(question, configured, air.pressure);
  if (askedFor !== undefined && isFault(askedFor)) return askedFor;
  const decided = decidedSpeed(counting, limits, lengths, askedFor?.tas);
  if (askedFor !== undefined && decided.bounds !== undefined && decided.field.outcome !== 'no-decision-speed') {
    const fault = decisionFault(question, askedFor, decided.bounds);
    if (fault !== undefined) return fault;
  }

  const at = decided.outcome === 'decided' ? evaluated(stated, decided.speed) : undefined;
  const atCounting = decided.outcome === 'decided' && counting !== stated ? evaluated(counting, decided.speed) : at;
  const field = counting === stated ? decided.field : balancedIn(stated, limits);
  const method = conditions.chosen.physics;
  const band =
    decided.outcome === 'decided'
      ? engineFailureBand(stated, decided.speed, question.runway.surface, method, (temperatureOff, pressureOff) => {
          const beside = airBeside(question, temperatureOff, pressureOff);
          return (
            beside && {
              density: beside.density,
              all: propulsionThrust(propulsion, aeroplane.engines, beside, power.thrustFactor),
              remaining: propulsionThrust(propulsion, aeroplane.engines - 1, beside, power.thrustFactor),
            }
          );
        })
      : undefined;

  const isWet = isTransport(aeroplane) && engineOutScreen(aeroplane, asked.surface) < engineOutScreen(aeroplane, dry);
  const onDry = isWet ? dryDistances(question, prepared, counting, stop, limits, lengths, allowance) : undefined;
  const missing = [...stop.missing, ...out.missing];
  const why = fieldWhy(decided.field, question.units);
  return {
    engineOut: {
      ...outcomeless,
      outcome: field.outcome,
      ...(isField(field) ? {} : { why: fieldWhy(field, question.units) }),
      ...distancesOf(at, field, band, method, allowance),
    },
    decision: decided.outcome === 'decided' ? decisionOf(decided, configured) : undefined,
    decided,
    stop,
    out,
    run: stated,
    checked: {
      onRunway: checkedDistances(atCounting, allowance, isWet),
      dry: onDry,
      notAssessed:
        missing.length === 0
          ? undefined
          : `a distance of the certification rests on what the aeroplane does not state: ${missing.join(' and ')}`,
      why,
    },
    highOver: (of) => highOverIn(band, of),
    assumed,
  };
}

const dry = { kind: 'paved', state: 'dry' } as const;
const none = () => undefined;
const nothing: FailureDistances = {
  accelerateStopDistance: undefined,
  accelerateStopAllEngines: undefined,
  accelerateStopEngineOut: undefined,
  accelerateGoDistance: undefined,
  engineOutTakeoffRun: undefined,
};

/** What an answer says of an engine failure whatever comes of it. */
function answerBase({ conditions }: PreparedTakeoff, { rule }: ResolvedStop, out: ResolvedEngineOut) {
  return {
    screenHeight: out.screenHeight,
    liftOff: out.liftOff,
    screen: out.screen,
    stopRule: rule.id,
    timeline: rule.delays,
    method: conditions.chosen.physics,
  };
}

interface Evaluated {
  readonly stop: AccelerateStop;
  readonly go: AccelerateGo;
}

function evaluated(run: EngineFailureRun, speed: number): Evaluated {
  return { stop: accelerateStop(run, speed), go: accelerateGo(run, speed) };
}

function inWind(run: EngineFailureRun, headwind: number): EngineFailureRun {
  return { ...run, allEngines: { ...run.allEngines, headwind }, stop: { ...run.stop, headwind } };
}

function balancedIn(run: EngineFailureRun, limits: DecisionLimits): BalancedField {
  const bounds = decisionBounds(run, limits);
  return 'outcome' in bounds ? bounds : balancedField(run, bounds);
}

function limitsOf({ aeroplane: { brakes, wheels } }: TakeoffQuestion, out: ResolvedEngineOut): DecisionLimits {
  return {
    minimumControlSpeedOnGround: out.minimumControl?.tas,
    brakeEnergy: brakes?.energyLimit,
    tyreSpeed: wheels?.tyreSpeedLimit,
  };
}

function askedSpeed(
  { decisionSpeed }: TakeoffQuestion,
  configured: ConfiguredSpeeds,
  pressure: number,
): SpeedSet | Fault | undefined {
  if (decisionSpeed === undefined) return undefined;
  return configured.inKinds(easFromCas(decisionSpeed, pressure), '/decisionSpeed');
}

/** 25.109(b) and 25.113(b): on a wet runway what is required is never less than on the same runway dry, with its own decision speed. */
function dryDistances(
  { aeroplane }: TakeoffQuestion,
  { friction }: PreparedTakeoff,
  counting: EngineFailureRun,
  stop: ResolvedStop,
  limits: DecisionLimits,
  lengths: Parameters<typeof decidedSpeed>[2],
  allowance: number,
): FailureDistances {
  const run: EngineFailureRun = {
    ...counting,
    allEngines: { ...counting.allEngines, rollingFriction: friction.reference, contaminantDrag: undefined },
    stop: { ...counting.stop, braking: stop.braking.reference, contaminantDrag: undefined },
    screenHeight: engineOutScreen(aeroplane, dry),
  };
  const decided = decidedSpeed(run, limits, lengths);
  return checkedDistances(decided.outcome === 'decided' ? evaluated(run, decided.speed) : undefined, allowance);
}

/** @param isWet - on a wet runway the run goes on to its lower screen */
function checkedDistances(at: Evaluated | undefined, allowance: number, isWet = false): FailureDistances {
  if (at === undefined) return nothing;
  const { stop, go } = at;
  const stops = stop.outcome === 'stops' ? stop : undefined;
  const goes = go.outcome === 'reaches-screen' ? go : undefined;
  return {
    accelerateStopDistance: stops && stops.distance + allowance,
    accelerateStopAllEngines: stops && stops.allEnginesDistance + allowance,
    accelerateStopEngineOut: stops && stops.engineFailureDistance + allowance,
    accelerateGoDistance: goes && goes.distance + allowance,
    engineOutTakeoffRun: goes && goes.groundRoll + goes.airDistance * (isWet ? 1 : 0.5) + allowance,
  };
}

function distancesOf(
  at: Evaluated | undefined,
  field: BalancedField,
  band: EngineFailureBand | undefined,
  method: EngineOut['method'],
  allowance: number,
): Partial<EngineOut> {
  if (at === undefined || band === undefined) return {};
  const { stop, go } = at;
  return {
    ...(stop.outcome === 'stops'
      ? {
          accelerateStopDistance: banded(stop.distance + allowance, band.stop, { method }),
          failureSpeed: stop.failureSpeed,
          brakeEnergy: stop.brakeEnergy,
        }
      : {}),
    ...(go.outcome === 'reaches-screen'
      ? { accelerateGoDistance: banded(go.distance + allowance, band.go, { method }) }
      : {}),
    ...(isField(field) ? { balancedFieldLength: banded(field.length + allowance, band.balanced, { method }) } : {}),
  };
}

/** The decision speed and its range in their kinds. */
function decisionOf(decided: Extract<Decided, { outcome: 'decided' }>, configured: ConfiguredSpeeds): DecisionSpeed {
  const inKinds = (tas: number): SpeedSet => {
    // in a tailwind an aeroplane at standstill is blown from behind
    const set = configured.ofTrue(Math.max(0, tas));
    if (isFault(set)) throw new RangeError(`a decision speed of ${tas} m/s is not below that of sound`);
    return set;
  };
  const { range, because, speed } = decided;
  return {
    ...inKinds(speed),
    because,
    ...(range.outcome === 'decision-speeds'
      ? {
          range: {
            lowest: inKinds(range.lowest.speed),
            highest: inKinds(range.highest.speed),
            lowestBecause: range.lowest.because,
            highestBecause: range.highest.because,
          },
        }
      : {}),
  };
}

function highOverIn(band: EngineFailureBand | undefined, of: string): number | undefined {
  if (band === undefined) return undefined;
  if (of.startsWith('accelerateStop')) return highOver(band.stop);
  return of === 'accelerateGoDistance' || of === 'engineOutTakeoffRun' ? highOver(band.go) : undefined;
}
