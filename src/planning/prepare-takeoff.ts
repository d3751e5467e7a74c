import type { Propulsion } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { propulsionAtSetting } from '../performance/power-setting.ts';
import { propulsionThrust } from '../performance/propulsion.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import { isFault } from './chosen.ts';
import { type Conditions, conditionsOf, ruledRuns } from './conditions.ts';
import { isRefused, type Refused } from './fault.ts';
import { type FlownTakeoff, flownTakeoff } from './procedure/flown-takeoff.ts';
import { takeoffProcedureFaults } from './procedure/takeoff-procedure-faults.ts';
import type { TakeoffQuestion } from './question.ts';
import { type ResolvedFriction, resolveFriction } from './resolve-friction.ts';
import { type ResolvedTakeoff, resolveTakeoff } from './resolve-takeoff.ts';
import { type ResolvedThrust, resolveThrust } from './resolve-thrust.ts';
import { type RunConditions, statedRun } from './takeoff-runs.ts';
import { type RaisedSpeed, type TakeoffSpeeds, takeoffSpeeds } from './takeoff-speeds.ts';

/** A takeoff before anything is integrated. */
export interface PreparedTakeoff {
  readonly conditions: Conditions;
  readonly flown: FlownTakeoff;
  readonly resolved: ResolvedTakeoff;
  readonly speeds: TakeoffSpeeds['speeds'];
  /** as the configuration has them; the same object where none is raised */
  readonly scheduled: TakeoffSpeeds['scheduled'];
  /** which of them the certification basis has raised */
  readonly raised: readonly RaisedSpeed[];
  readonly power: ResolvedThrust;
  /** thrust of another definition in other air, at the setting that is flown */
  readonly thrustIn: (air: Air, propulsion: Propulsion, thrustFactor: number) => Thrust;
  readonly friction: ResolvedFriction;
  /** on the runway as it is, in the wind as given */
  readonly run: TakeoffRun;
  /** what the other runs have for it */
  readonly runConditions: RunConditions;
}

/**
 * The takeoff up to its runs, in the order of the work: air, wind, procedure, speeds, thrust, friction.
 *
 * @returns what the runs need, or every fault that the question's own values bring about
 */
export function prepareTakeoff(question: TakeoffQuestion): PreparedTakeoff | Refused {
  const { aeroplane, aeroplaneAt, mass, runway, weather } = question;
  const conditions = conditionsOf(question, 'takeoff');
  if (isRefused(conditions)) return conditions;
  const unflyable = takeoffProcedureFaults(question);
  if (unflyable.length > 0) return { refused: unflyable };
  const { configuration, air, wind } = conditions;
  const flown = flownTakeoff(question, configuration);

  const resolved = resolveTakeoff(question, configuration);
  const found = takeoffSpeeds(question, configuration, resolved, air);
  if (isFault(found)) return { refused: [found] };
  const { speeds, scheduled, raised } = found;

  const liftOffAtMaximumMass = speeds.liftOff.eas * Math.sqrt(aeroplane.masses.maximumTakeoff / mass);
  const power = resolveThrust(aeroplane, aeroplaneAt, liftOffAtMaximumMass, weather.dewPoint !== undefined);
  const thrustIn = (state: Air, propulsion: Propulsion, factor: number) =>
    propulsionThrust(propulsionAtSetting(propulsion, flown.fullPowerRatio), aeroplane.engines, state, factor);
  const { condition } = conditions;
  const friction = resolveFriction(question, runway.surface, condition.refusal);
  const run = statedRun(question, resolved, speeds, {
    thrust: thrustIn(air, aeroplane.propulsion, power.thrustFactor),
    density: air.density,
    headwind: wind.headwind,
    rollingFriction: friction.actual ?? friction.reference,
    contaminantDrag: friction.contaminantDrag,
  });

  const runConditions = {
    ...ruledRuns(conditions),
    actualFriction: friction.actual,
    referenceFriction: friction.reference,
    rollingStartAllowance: flown.rollingStartAllowance,
  };
  return { conditions, flown, resolved, speeds, scheduled, raised, power, thrustIn, friction, run, runConditions };
}
