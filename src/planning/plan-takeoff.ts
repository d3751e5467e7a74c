import type { Propulsion } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { propulsionAtSetting } from '../performance/power-setting.ts';
import { propulsionThrust } from '../performance/propulsion.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import { airBeside } from './air-beside.ts';
import type { TakeoffAnswer } from './answer.ts';
import { assess } from './assess.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { takeoffCautions } from './cautions/takeoff-cautions.ts';
import { isFault } from './chosen.ts';
import { conditionsOf } from './conditions.ts';
import { declaredDistances } from './declared-distances.ts';
import { defaulted } from './defaulted.ts';
import { isRefused, type Refused } from './fault.ts';
import { notGiven } from './not-given.ts';
import { flownTakeoff } from './procedure/flown-takeoff.ts';
import { takeoffProcedureFaults } from './procedure/takeoff-procedure-faults.ts';
import type { TakeoffQuestion } from './question.ts';
import { resolveFriction } from './resolve-friction.ts';
import { resolveTakeoff } from './resolve-takeoff.ts';
import { resolveThrust } from './resolve-thrust.ts';
import { answerSentence } from './sentences/answer-sentence.ts';
import { notReachedSentence } from './sentences/not-reached-sentence.ts';
import { shortfalls } from './shortfalls.ts';
import { takeoffBand } from './takeoff-band.ts';
import { takeoffDistances } from './takeoff-distances.ts';
import { takeoffEffects } from './takeoff-effects.ts';
import {
  checkedTakeoffs,
  notReached as notReachedOf,
  reached,
  statedRun,
  takeoffOf,
  takeoffRuns,
} from './takeoff-runs.ts';
import { takeoffSpeeds } from './takeoff-speeds.ts';
import { windAnswer } from './wind-along.ts';

/** Distances come from the stated figures of the definition by physics. */
const method = 'stated';

/**
 * The takeoff, from a question in SI to an answer in SI, in the order of the work: air, wind, speeds, the aeroplane as
 * configured, the distances, what is declared, the checks, the outcome, what should be said, and what it rests on.
 *
 * @returns the answer, or every fault that the question's own values bring about
 */
export function planTakeoff(question: TakeoffQuestion): TakeoffAnswer | Refused {
  const { aeroplane, aeroplaneAt, mass, runway, weather, units } = question;
  const conditions = conditionsOf(question, 'takeoff');
  if (isRefused(conditions)) return conditions;
  const unflyable = takeoffProcedureFaults(question);
  if (unflyable.length > 0) return { refused: unflyable };
  const { ruleSet, configuration, air, wind, creditedHeadwind, doesNotApply } = conditions;
  const { fullPowerRatio, rollingStartAllowance } = flownTakeoff(question, configuration);

  const resolved = resolveTakeoff(question, configuration);
  const speeds = takeoffSpeeds(question, configuration, resolved, air);
  if (isFault(speeds)) return { refused: [speeds] };

  const liftOffAtMaximumMass = speeds.liftOff.eas * Math.sqrt(aeroplane.masses.maximumTakeoff / mass);
  const power = resolveThrust(aeroplane, aeroplaneAt, liftOffAtMaximumMass, weather.dewPoint !== undefined);
  const thrustIn = (state: Air, propulsion: Propulsion, factor: number) =>
    propulsionThrust(propulsionAtSetting(propulsion, fullPowerRatio), aeroplane.engines, state, factor);
  const thrust = thrustIn(air, aeroplane.propulsion, power.thrustFactor);
  const friction = resolveFriction(runway.surface, aeroplane.propulsion.kind === 'jet');
  const run = statedRun(question, resolved, speeds, {
    thrust,
    density: air.density,
    headwind: wind.headwind,
    rollingFriction: friction.actual ?? friction.reference,
  });

  const rules = ruleSet.takeoff;
  const runs = takeoffRuns(run, {
    creditedHeadwind: doesNotApply === undefined ? creditedHeadwind : wind.headwind,
    actualFriction: friction.actual,
    referenceFriction: friction.reference,
    rollingStartAllowance,
    needsReference:
      doesNotApply === undefined &&
      rules.startsFrom === 'reference' &&
      rules.runwayFactors(runway.surface, runway.slope) !== undefined,
  });
  const notReached = notReachedOf(runs);
  const stated = notReached === undefined ? reached(runs.stated) : undefined;
  const band =
    stated &&
    takeoffBand(run, stated, runway.surface, method, (temperatureOff, pressureOff) => {
      const beside = airBeside(question, temperatureOff, pressureOff);
      return beside && { density: beside.density, thrust: thrustIn(beside, aeroplane.propulsion, power.thrustFactor) };
    });
  const distances = stated && band && takeoffDistances(stated, band, aeroplane.certification.screenHeight, method);

  const declared = declaredDistances(runway, rules.clearwayShare);
  const rollAvailable = declared.credited.tora;
  const { outcome, checks, governing, thin } = assess({
    conditions,
    rules,
    runway,
    declared,
    notReached,
    distances: checkedTakeoffs(runs),
    band,
    rollAvailable,
  });

  const assumed = takeoffEffects(
    [...resolved.assumed, ...power.assumed, ...friction.assumed],
    stated && run,
    (propulsion, factor) => thrustIn(air, propulsion, factor),
  );
  const context = {
    phase: 'takeoff' as const,
    question,
    ruleSet,
    air,
    wind,
    speeds,
    surface: friction.surface,
    declared,
    doesNotApply,
    outcome,
    checks: checks ?? [],
    governing,
    thin,
    assumed,
    wheelSpeed: speeds.liftOff,
    stated,
    roll: stated?.groundRoll,
    rollInStillAir: () => reached(takeoffOf({ ...run, headwind: 0 }, rollingStartAllowance))?.groundRoll,
    fullPowerRatio,
    wholeAtFullPower: () => {
      const full = propulsionThrust(aeroplane.propulsion, aeroplane.engines, air, power.thrustFactor);
      return reached(takeoffOf({ ...run, thrust: full }, rollingStartAllowance))?.takeoffDistance;
    },
    rollingStartAllowance,
    rollAvailable,
    wholeDistance: distances?.takeoffDistance,
  };
  return {
    outcome,
    sentence: answerSentence(context, () => notReachedSentence(runs, units)),
    cautions: raisedCautions(takeoffCautions, context),
    air,
    wind: windAnswer(wind, creditedHeadwind),
    speeds,
    distances,
    assessment: checks && { ruleSet: ruleSet.id, checks, governing: governing?.code },
    shortfall: notReached && shortfalls(notReached, aeroplanePointer(aeroplaneAt, '/propulsion')),
    basis: {
      method,
      band: band?.contributions,
      assumed: [...assumed.map(({ assumption }) => assumption), ...defaulted(question)],
      notGiven: notGiven(question),
      sources: [ruleSet.source, ruleSet.windCredit.source],
    },
  };
}
