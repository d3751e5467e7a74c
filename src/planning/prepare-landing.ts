import type { LandingRun } from '../performance/landing/landing-run.ts';
import { propulsionThrust } from '../performance/propulsion.ts';
import { configuredStallSpeed } from '../performance/speeds/configured-stall-speed.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import { isFault } from './chosen.ts';
import { type Conditions, conditionsOf, ruledRuns } from './conditions.ts';
import { isRefused, type Refused } from './fault.ts';
import { heldThrust } from './held-thrust.ts';
import { type LandingConditions, statedLanding } from './landing-runs.ts';
import { type LandingSpeeds, landingSpeeds } from './landing-speeds.ts';
import { landingProcedureFaults } from './procedure/landing-procedure-faults.ts';
import type { LandingQuestion } from './question.ts';
import { type ResolvedBraking, resolveBraking } from './resolve-braking.ts';
import { type ResolvedLanding, resolveLanding } from './resolve-landing.ts';
import { type ResolvedThrust, resolveThrust } from './resolve-thrust.ts';
import { takeoffDefaults } from './rules/takeoff-defaults.ts';

/** A landing before anything is integrated. */
export interface PreparedLanding {
  readonly conditions: Conditions;
  readonly power: ResolvedThrust;
  /** all engines at full power, for the climb after a balked landing */
  readonly thrust: Thrust;
  readonly resolved: ResolvedLanding;
  readonly landingSpeeds: LandingSpeeds;
  readonly braking: ResolvedBraking;
  /** on the runway as it is, in the wind as given */
  readonly run: LandingRun;
  /** what the other runs have for it */
  readonly runConditions: LandingConditions;
}

/**
 * The landing up to its runs, in the order of the work: air, wind, procedure, thrust, speeds, braking.
 *
 * @returns what the runs need, or every fault that the question's own values bring about
 */
export function prepareLanding(question: LandingQuestion): PreparedLanding | Refused {
  const { aeroplane, aeroplaneAt, runway, weather } = question;
  const { wing, masses, propulsion, engines } = aeroplane;
  const conditions = conditionsOf(question, 'landing');
  if (isRefused(conditions)) return conditions;
  const unflyable = landingProcedureFaults(question);
  if (unflyable.length > 0) return { refused: unflyable };
  const { configuration, air, wind } = conditions;

  const stallAtMaximumMass = configuredStallSpeed(configuration.maximumLift, wing.area, masses.maximumTakeoff);
  const liftOff = takeoffDefaults.liftOffStallRatio.value * stallAtMaximumMass;
  const power = resolveThrust(aeroplane, aeroplaneAt, liftOff, weather.dewPoint !== undefined);
  const thrust = propulsionThrust(propulsion, engines, air, power.thrustFactor);

  const resolved = resolveLanding(question, configuration, heldThrust(thrust).at(0));
  const speeds = landingSpeeds(question, configuration, resolved, air);
  if (isFault(speeds)) return { refused: [speeds] };
  const braking = resolveBraking(question, runway, conditions.condition);
  const run = statedLanding(question, resolved, speeds.speeds, {
    density: air.density,
    headwind: wind.headwind,
    braking: braking.actual ?? braking.reference,
    stretches: braking.stretches,
    contaminantDrag: braking.contaminantDrag,
  });
  const runConditions = {
    ...ruledRuns(conditions),
    actualBraking: braking.actual,
    referenceBraking: braking.reference,
  };
  return { conditions, power, thrust, resolved, landingSpeeds: speeds, braking, run, runConditions };
}
