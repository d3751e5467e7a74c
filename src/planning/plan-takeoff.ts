import { propulsionThrust } from '../performance/propulsion.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import { airBeside } from './air-beside.ts';
import type { ObstaclePath, TakeoffAnswer } from './answer.ts';
import { answerBasis } from './answer-basis.ts';
import { assess } from './assess.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { takeoffCautions } from './cautions/takeoff-cautions.ts';
import { climbChecks } from './climb-checks.ts';
import { isRefused, type Refused } from './fault.ts';
import { obstacleCheck, obstaclePathOf } from './obstacle-path.ts';
import { pathStart } from './path-start.ts';
import { prepareTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';
import { answerSentence } from './sentences/answer-sentence.ts';
import { notReachedSentence } from './sentences/not-reached-sentence.ts';
import { shortfalls } from './shortfalls.ts';
import { takeoffBand } from './takeoff-band.ts';
import { climbAfterTakeoff } from './takeoff-climb.ts';
import { takeoffDistances } from './takeoff-distances.ts';
import { takeoffEffects } from './takeoff-effects.ts';
import { checkedTakeoffs, notReached as notReachedOf, reached, takeoffOf, takeoffRuns } from './takeoff-runs.ts';
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
  const { aeroplane, aeroplaneAt, runway, units } = question;
  const prepared = prepareTakeoff(question);
  if (isRefused(prepared)) return prepared;
  const { conditions, resolved, speeds, power, thrustIn, friction, run } = prepared;
  const { ruleSet, rules, declared, air, wind, condition, creditedHeadwind, doesNotApply } = conditions;
  const { fullPowerRatio, rollingStartAllowance } = prepared.flown;

  const runs = takeoffRuns(run, prepared.runConditions);
  const notReached = notReachedOf(runs);
  const stated = notReached === undefined ? reached(runs.stated) : undefined;
  const band =
    stated &&
    takeoffBand(run, stated, runway.surface, method, (temperatureOff, pressureOff) => {
      const beside = airBeside(question, temperatureOff, pressureOff);
      return beside && { density: beside.density, thrust: thrustIn(beside, aeroplane.propulsion, power.thrustFactor) };
    });
  const distances = stated && band && takeoffDistances(stated, band, aeroplane.certification.screenHeight, method);

  const rollAvailable = declared.credited.tora;
  const climb = stated && climbAfterTakeoff(question, prepared);
  let obstaclePath: ObstaclePath | undefined;
  const { outcome, checks, governing, thin } = assess({
    conditions,
    notReached,
    distances: checkedTakeoffs(runs),
    band,
    rollAvailable,
    further: (ofRunway) => {
      const asked = ruleSet.takeoff.obstacles;
      const demand = asked?.appliesTo(aeroplane) === true ? asked : undefined;
      const start = pathStart(demand, ofRunway, reached(runs.credited ?? runs.stated));
      obstaclePath = start && obstaclePathOf(question, prepared, start);
      const climbs = climbChecks(rules.demands, aeroplane, climb?.gradient);
      return demand === undefined || obstaclePath === undefined
        ? climbs
        : [...climbs, obstacleCheck(demand, obstaclePath)];
    },
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
    rules,
    runwayFactors: conditions.runwayFactors,
    air,
    wind,
    speeds,
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
    climb,
    obstaclePath,
    assessment: checks && { ruleSet: ruleSet.id, basedOn: conditions.basedOn, checks, governing: governing?.code },
    shortfall: notReached
      ? shortfalls(notReached, aeroplanePointer(aeroplaneAt, '/propulsion'))
      : condition.refusal?.shortfall,
    basis: answerBasis(question, 'takeoff', conditions, method, assumed, band),
  };
}
