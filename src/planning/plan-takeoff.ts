import type { Propulsion } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { propulsionThrust } from '../performance/propulsion.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import { airBeside } from './air-beside.ts';
import type { TakeoffAnswer } from './answer.ts';
import { assessTakeoff } from './assess-takeoff.ts';
import { assumptionEffects } from './assumption-effects.ts';
import { highOver, takeoffBand } from './band.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { takeoffCautions } from './cautions/takeoff-cautions.ts';
import { airAtRunway, chosenConfiguration, chosenRuleSet, isFault } from './chosen.ts';
import { declaredDistances } from './declared-distances.ts';
import { defaulted } from './defaulted.ts';
import type { Refused } from './fault.ts';
import { governingCheck } from './margins.ts';
import { notGiven } from './not-given.ts';
import { outcomeOf, thinBecause } from './outcome.ts';
import type { Question } from './question.ts';
import { resolveFriction } from './resolve-friction.ts';
import { resolveTakeoff } from './resolve-takeoff.ts';
import { resolveThrust } from './resolve-thrust.ts';
import { takeoffSentence } from './sentences/takeoff-sentence.ts';
import { shortfalls } from './shortfalls.ts';
import { takeoffDistances } from './takeoff-distances.ts';
import { notReached as notReachedOf, reached, statedRun, takeoffRuns } from './takeoff-runs.ts';
import { takeoffSpeeds } from './takeoff-speeds.ts';
import { windAlong, windAnswer } from './wind-along.ts';
import { windCredit } from './wind-credit.ts';

/** Distances come from the stated figures of the definition by physics. */
const method = 'stated';

/**
 * The takeoff, from a question in SI to an answer in SI, in the order of the work: air, wind, speeds, the aeroplane as
 * configured, the distances, what is declared, the checks, the outcome, what should be said, and what it rests on.
 *
 * @returns the answer, or every fault that the question's own values bring about
 */
export function planTakeoff(question: Question): TakeoffAnswer | Refused {
  const { aeroplane, aeroplaneAt, mass, runway, weather } = question;
  const ruleSet = chosenRuleSet(question.ruleSet);
  const configuration = chosenConfiguration(question, 'takeoff');
  const air = airAtRunway(question);
  const wind = windAlong(runway, weather.wind);
  if (isFault(ruleSet) || isFault(configuration) || isFault(air) || isFault(wind)) {
    return { refused: [ruleSet, configuration, air, wind].filter(isFault) };
  }
  const creditedHeadwind = windCredit(wind.headwind, ruleSet.windCredit);

  const resolved = resolveTakeoff(question, configuration);
  const speeds = takeoffSpeeds(question, configuration, resolved, air);
  if (isFault(speeds)) return { refused: [speeds] };

  const liftOffAtMaximumMass = speeds.liftOff.eas * Math.sqrt(aeroplane.masses.maximumTakeoff / mass);
  const power = resolveThrust(aeroplane, aeroplaneAt, liftOffAtMaximumMass, weather.dewPoint !== undefined);
  const thrustIn = (state: Air, propulsion: Propulsion, factor: number) =>
    propulsionThrust(propulsion, aeroplane.engines, state, factor);
  const thrust = thrustIn(air, aeroplane.propulsion, power.thrustFactor);
  const friction = resolveFriction(runway.surface, aeroplane.propulsion.kind === 'jet');
  const run = statedRun(question, resolved, speeds, {
    thrust,
    density: air.density,
    headwind: wind.headwind,
    rollingFriction: friction.actual ?? friction.reference,
  });

  const doesNotApply = ruleSet.doesNotApply(aeroplane);
  const rules = ruleSet.takeoff;
  const runs = takeoffRuns(run, {
    creditedHeadwind: doesNotApply === undefined ? creditedHeadwind : wind.headwind,
    actualFriction: friction.actual,
    referenceFriction: friction.reference,
    needsReference:
      doesNotApply === undefined &&
      rules.startsFrom === 'reference' &&
      rules.runwayFactors(runway.surface, runway.slope) !== undefined,
  });
  const notReached = notReachedOf(runs);
  const stated = notReached === undefined ? reached(runs.stated) : undefined;
  const noSurface = runs.credited === undefined && runs.reference === undefined;
  const band =
    stated &&
    takeoffBand(run, stated, runway.surface, method, (temperatureOff, pressureOff) => {
      const beside = airBeside(question, temperatureOff, pressureOff);
      return beside && { density: beside.density, thrust: thrustIn(beside, aeroplane.propulsion, power.thrustFactor) };
    });
  const distances = stated && band && takeoffDistances(stated, band, aeroplane.certification.screenHeight, method);

  const declared = declaredDistances(runway, rules.clearwayShare);
  const isAssessed = notReached === undefined && doesNotApply === undefined && !noSurface;
  const checks = isAssessed ? assessTakeoff(rules, runs, runway, declared) : [];
  const governing = governingCheck(checks);
  const high = (of: string) => highOver((of === 'groundRoll' ? band?.groundRoll : band?.takeoffDistance) ?? 0);
  const thinRatio = ruleSet.thinMargin.ratio;
  const rollAvailable = declared.credited.tora;
  const outcome = outcomeOf({
    notReached,
    doesNotApply,
    noSurface,
    checks,
    roll: stated?.groundRoll,
    rollAvailable,
    thinRatio,
    highOver: high,
  });
  const thin = outcome === 'enough-but-thin' ? thinBecause(checks, thinRatio, high) : undefined;

  const assumed = assumptionEffects(
    [...resolved.assumed, ...power.assumed, ...friction.assumed],
    stated && run,
    (propulsion, factor) => thrustIn(air, propulsion, factor),
  );
  const context = {
    question,
    ruleSet,
    air,
    wind,
    speeds,
    surface: friction.surface,
    run: stated && run,
    runs,
    stated,
    distances,
    declared,
    doesNotApply,
    checks,
    governing,
    outcome,
    thin,
    assumed,
  };
  return {
    outcome,
    sentence: takeoffSentence(context),
    cautions: raisedCautions(takeoffCautions, context),
    air,
    wind: windAnswer(wind, creditedHeadwind),
    speeds,
    distances,
    assessment: isAssessed ? { ruleSet: ruleSet.id, checks, governing: governing?.code } : undefined,
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
