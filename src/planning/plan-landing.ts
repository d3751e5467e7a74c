import { landing } from '../performance/landing/landing.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import { airBeside } from './air-beside.ts';
import type { LandingAnswer } from './answer.ts';
import { answerBasis } from './answer-basis.ts';
import { assess } from './assess.ts';
import { balkedLandingClimb } from './balked-landing.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { landingCautions } from './cautions/landing-cautions.ts';
import { climbChecks } from './climb-checks.ts';
import { isRefused, type Refused } from './fault.ts';
import { landingBand } from './landing-band.ts';
import { landingDistances } from './landing-distances.ts';
import { landingEffects } from './landing-effects.ts';
import { checkedLandings, landingRuns, notStopped, stopped } from './landing-runs.ts';
import { landingShortfalls } from './landing-shortfalls.ts';
import { prepareLanding } from './prepare-landing.ts';
import type { LandingQuestion } from './question.ts';
import { resolveBraking } from './resolve-braking.ts';
import { answerSentence } from './sentences/answer-sentence.ts';
import { notStoppedSentence } from './sentences/not-stopped-sentence.ts';
import { windAnswer } from './wind-along.ts';

/** Distances come from the stated figures of the definition by physics. */
const method = 'stated';

/**
 * The landing, from a question in SI to an answer in SI, in the order of the work: air, wind, speeds, the aeroplane as
 * configured, the distances, what is declared, the checks, the outcome, what should be said, and what it rests on.
 *
 * @returns the answer, or every fault that the question's own values bring about
 */
export function planLanding(question: LandingQuestion): LandingAnswer | Refused {
  const { runway, units } = question;
  const prepared = prepareLanding(question);
  if (isRefused(prepared)) return prepared;
  const { conditions, resolved, power, braking, run } = prepared;
  const { ruleSet, rules, declared, air, wind, condition, creditedHeadwind, doesNotApply } = conditions;
  const { speeds, reference, raised } = prepared.landingSpeeds;

  const runs = landingRuns(run, prepared.runConditions);
  const notReached = notStopped(runs);
  const stated = notReached === undefined ? stopped(runs.stated) : undefined;
  const band =
    stated &&
    landingBand(
      run,
      stated,
      runway.surface,
      method,
      (temperatureOff, pressureOff) => airBeside(question, temperatureOff, pressureOff)?.density,
    );
  const distances = stated && band && landingDistances(stated, band, run.screenHeight, method);
  const balkedLanding = balkedLandingClimb(
    question,
    prepared.thrust,
    resolved.airDragIncrement,
    air.density,
    speeds.landingReference.tas,
  );

  const rollAvailable = declared.credited.lda;
  const { outcome, checks, governing, thin } = assess({
    conditions,
    notReached,
    distances: checkedLandings(runs),
    band,
    rollAvailable,
    further: () => {
      const gradient = balkedLanding.outcome === 'computed' ? balkedLanding.gradient : undefined;
      return climbChecks(rules.demands, question.aeroplane, gradient);
    },
  });

  const assumed = [...landingEffects([...resolved.assumed, ...braking.assumed], stated && run), ...power.assumed];
  const landedWith = (change: Partial<LandingRun>) => stopped(landing({ ...run, ...change }));
  const context = {
    phase: 'landing' as const,
    question,
    ruleSet,
    rules,
    runwayFactors: conditions.runwayFactors,
    air,
    wind,
    speeds,
    reference,
    raised,
    surface: braking.surface,
    noData: braking.noData,
    condition,
    declared,
    doesNotApply,
    outcome,
    checks: checks ?? [],
    governing,
    thin,
    assumed,
    wheelSpeed: speeds.touchdown,
    run,
    stated,
    landedWith,
    brakingWithAntiSkid: () => {
      const { actual, stretches } = resolveBraking({ ...question, procedure: {} }, runway, condition);
      return actual && { braking: actual, stretches };
    },
    dryPavementBraking: braking.reference,
    balkedLanding,
    roll: stated?.groundRoll,
    rollInStillAir: () => landedWith({ headwind: 0 })?.groundRoll,
    rollAvailable,
    wholeDistance: distances?.landingDistance,
  };
  return {
    outcome,
    sentence: answerSentence(context, () => notStoppedSentence(runs, units)),
    cautions: raisedCautions(landingCautions, context),
    air,
    wind: windAnswer(wind, creditedHeadwind),
    speeds,
    distances,
    balkedLanding,
    assessment: checks && { ruleSet: ruleSet.id, basedOn: conditions.basedOn, checks, governing: governing?.code },
    shortfall: notReached ? landingShortfalls(notReached) : condition.refusal?.shortfall,
    basis: answerBasis(question, 'landing', conditions, method, assumed, band),
  };
}
