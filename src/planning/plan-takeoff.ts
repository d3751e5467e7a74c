import { propulsionThrust } from '../performance/propulsion.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import { airBeside } from './air-beside.ts';
import type { ObstaclePath, TakeoffAnswer } from './answer.ts';
import { answerBasis } from './answer-basis.ts';
import { assess } from './assess.ts';
import type { AnyAssumed, Assumed } from './assumed.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { takeoffCautions } from './cautions/takeoff-cautions.ts';
import { isFault } from './chosen.ts';
import { climbChecks, climbedWithAll } from './climb-checks.ts';
import { decisionOfSingle } from './engine-failure/decision-fault.ts';
import { engineFailureOf } from './engine-failure/engine-failure.ts';
import { engineOutClimbs } from './engine-failure/engine-out-climbs.ts';
import { isRefused, type Refused } from './fault.ts';
import { checkedRuns } from './found.ts';
import { foundTakeoff } from './found-takeoff.ts';
import { outsideManualSentence } from './manual/outside-manual-sentence.ts';
import { outsideManualShortfalls } from './manual/outside-manual-shortfalls.ts';
import { sharesOf } from './manual/shares.ts';
import { askedAsFitted } from './method.ts';
import { obstacleCheck, obstaclePathOf } from './obstacle-path.ts';
import { pathStart } from './path-start.ts';
import { prepareTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';
import { reportWindCoding } from './report-wind-coding.ts';
import { answerSentence } from './sentences/answer-sentence.ts';
import { notReachedSentence } from './sentences/not-reached-sentence.ts';
import { shortfalls } from './shortfalls.ts';
import { takeoffBand } from './takeoff-band.ts';
import { climbAfterTakeoff } from './takeoff-climb.ts';
import { takeoffDistances } from './takeoff-distances.ts';
import { takeoffEffects } from './takeoff-effects.ts';
import { reached, scaledTakeoff, takeoffOf, takeoffRuns } from './takeoff-runs.ts';
import { windAnswer } from './wind-along.ts';

/**
 * The takeoff, from a question in SI to an answer in SI, in the order of the work: air, wind, speeds, the aeroplane as
 * configured, the distances by physics and by the flight manual, what is declared, the checks, the outcome, what should be
 * said, and what it rests on.
 *
 * @returns the answer, or every fault that the question's own values bring about
 */
export function planTakeoff(asked: TakeoffQuestion): TakeoffAnswer | Refused {
  const question = askedAsFitted(asked, 'takeoff');
  const { aeroplane, aeroplaneAt, runway, units } = question;
  const single = decisionOfSingle(question);
  if (single !== undefined) return { refused: [single] };
  const prepared = prepareTakeoff(question);
  if (isRefused(prepared)) return prepared;
  const { conditions, resolved, speeds, raised, power, thrustIn, friction, run } = prepared;
  const { ruleSet, rules, declared, air, wind, condition, creditedHeadwind, doesNotApply } = conditions;
  const { fullPowerRatio, rollingStartAllowance } = prepared.flown;

  const physics = takeoffRuns(run, prepared.runConditions);
  const found = foundTakeoff(question, prepared, physics);
  const { methods, edge, runs, notReached, runwayFactors } = found;
  const stated = notReached === undefined ? runs.stated : undefined;
  const windCoding = reportWindCoding(question.report, wind);
  const band =
    stated &&
    takeoffBand(run, stated, runway.surface, found.modelForm, windCoding, (temperatureOff, pressureOff) => {
      const beside = airBeside(question, temperatureOff, pressureOff);
      return beside && { density: beside.density, thrust: thrustIn(beside, aeroplane.propulsion, power.thrustFactor) };
    });
  const byPhysics = reached(physics.stated);
  const shares = sharesOf(stated, byPhysics);
  const asAnswered = byPhysics && scaledTakeoff(byPhysics, shares);
  const distances =
    stated &&
    band &&
    takeoffDistances(stated, band, aeroplane.certification.screenHeight, { methods, edge }, asAnswered);

  const engineFailure =
    physics.stated === undefined || byPhysics !== undefined ? engineFailureOf(question, prepared) : undefined;
  if (engineFailure !== undefined && isFault(engineFailure)) return { refused: [engineFailure] };
  const oneOut = engineFailure && engineOutClimbs(question, prepared, engineFailure.out, rules.demands);

  const rollAvailable = declared.credited.tora;
  const climb = stated && climbAfterTakeoff(question, prepared);
  const checked = checkedRuns(runs);
  let obstaclePath: ObstaclePath | undefined;
  const { outcome, checks, governing, thin } = assess({
    conditions,
    runwayFactors,
    startsFrom: found.startsFrom,
    notReached,
    distances: checked,
    band,
    rollAvailable,
    engineFailure: engineFailure && { ...engineFailure, outcome: engineFailure.engineOut.outcome },
    further: (ofRunway) => {
      const obstacles = ruleSet.takeoff.obstacles;
      const demand = obstacles?.appliesTo(aeroplane) === true ? obstacles : undefined;
      const start = pathStart(demand, ofRunway, (checked.credited ?? checked.stated)?.wholeDistance);
      obstaclePath = start && obstaclePathOf(question, prepared, start);
      const climbs = climbChecks(rules.demands, aeroplane, (asked) =>
        asked.engines === 'all' ? climbedWithAll(climb) : (oneOut?.of(asked) ?? { why: notComputed }),
      );
      return demand === undefined || obstaclePath === undefined
        ? climbs
        : [...climbs, obstacleCheck(demand, obstaclePath)];
    },
  });

  const assumed = takeoffEffects(
    [
      ...resolved.assumed,
      ...power.assumed,
      ...friction.assumed,
      ...furtherAssumed(engineFailure?.assumed, friction.assumed),
    ],
    found.startsFrom === 'reference' && stated ? run : undefined,
    (propulsion, factor) => thrustIn(air, propulsion, factor),
  );
  const takenOff = (other: TakeoffRun) => {
    const result = reached(takeoffOf(other, rollingStartAllowance));
    return result && scaledTakeoff(result, shares);
  };
  const context = {
    phase: 'takeoff' as const,
    question,
    ruleSet,
    rules,
    runwayFactors,
    air,
    wind,
    speeds,
    raised,
    engineFailure: engineFailure && oneOut && { ...engineFailure, climb: oneOut.shown },
    surface: friction.surface,
    noData: friction.noData,
    condition,
    contaminantDrag: friction.contaminantDrag,
    declared,
    doesNotApply,
    outcome,
    checks: checks ?? [],
    governing,
    thin,
    assumed,
    found,
    wheelSpeed: speeds.liftOff,
    stated: stated && asAnswered,
    roll: stated?.groundRoll,
    rollInStillAir: () => takenOff({ ...run, headwind: 0 })?.groundRoll,
    fullPowerRatio,
    wholeAtFullPower: () => {
      const full = propulsionThrust(aeroplane.propulsion, aeroplane.engines, air, power.thrustFactor);
      return takenOff({ ...run, thrust: full })?.takeoffDistance;
    },
    rollingStartAllowance,
    rollAvailable,
    wholeDistance: distances?.takeoffDistance,
  };
  const isOutside = notReached?.outcome === 'outside-flight-manual';
  return {
    outcome,
    sentence: answerSentence(context, () =>
      isOutside ? outsideManualSentence(notReached, units) : notReachedSentence(notReached, physics, units),
    ),
    cautions: raisedCautions(takeoffCautions, context),
    air,
    wind: windAnswer(wind, creditedHeadwind),
    speeds: { ...speeds, decision: engineFailure?.decision },
    distances,
    climb,
    engineOut: engineFailure && oneOut && { ...engineFailure.engineOut, climb: oneOut.shown },
    obstaclePath,
    assessment: checks && { ruleSet: ruleSet.id, basedOn: conditions.basedOn, checks, governing: governing?.code },
    shortfall: isOutside
      ? outsideManualShortfalls(notReached)
      : notReached
        ? shortfalls(notReached, aeroplanePointer(aeroplaneAt, '/propulsion'))
        : condition.refusal?.shortfall,
    basis: answerBasis(question, 'takeoff', conditions, found, assumed, band),
  };
}

const notComputed = 'the climb with one engine out is not computed';

/** What an engine failure assumes beside what the takeoff has assumed already of the same places. */
function furtherAssumed(further: readonly AnyAssumed[] = [], said: readonly AnyAssumed[]): readonly Assumed[] {
  const places = new Set(said.map(({ assumption }) => assumption.at));
  return further
    .filter(({ assumption }) => !places.has(assumption.at))
    .map(({ name, assumption }) => ({ name, assumption }));
}
