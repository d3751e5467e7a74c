import { landing } from '../performance/landing/landing.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import { airBeside } from './air-beside.ts';
import type { LandingAnswer } from './answer.ts';
import { answerBasis } from './answer-basis.ts';
import { assess } from './assess.ts';
import { balkedLandingClimb } from './balked-landing.ts';
import { raisedCautions } from './cautions/caution-test.ts';
import { landingCautions } from './cautions/landing-cautions.ts';
import { climbChecks, climbedWithAll } from './climb-checks.ts';
import { approachWithOneOut } from './engine-failure/approach-with-one-out.ts';
import { balkedWithOneOut } from './engine-failure/balked-with-one-out.ts';
import { isRefused, type Refused } from './fault.ts';
import { checkedRuns } from './found.ts';
import { foundLanding } from './found-landing.ts';
import { landingBand } from './landing-band.ts';
import { landingDistances } from './landing-distances.ts';
import { landingEffects } from './landing-effects.ts';
import { landingRuns, scaledLanding, stopped } from './landing-runs.ts';
import { landingShortfalls } from './landing-shortfalls.ts';
import { outsideManualSentence } from './manual/outside-manual-sentence.ts';
import { outsideManualShortfalls } from './manual/outside-manual-shortfalls.ts';
import { sharesOf } from './manual/shares.ts';
import { askedAsFitted } from './method.ts';
import { prepareLanding } from './prepare-landing.ts';
import type { LandingQuestion } from './question.ts';
import { reportWindCoding } from './report-wind-coding.ts';
import { resolveBraking } from './resolve-braking.ts';
import { answerSentence } from './sentences/answer-sentence.ts';
import { notStoppedSentence } from './sentences/not-stopped-sentence.ts';
import { windAnswer } from './wind-along.ts';

/**
 * The landing, from a question in SI to an answer in SI, in the order of the work: air, wind, speeds, the aeroplane as
 * configured, the distances by physics and by the flight manual, what is declared, the checks, the outcome, what should be said, and what it rests on.
 *
 * @returns the answer, or every fault that the question's own values bring about
 */
export function planLanding(asked: LandingQuestion): LandingAnswer | Refused {
  const question = askedAsFitted(asked, 'landing');
  const { runway, units } = question;
  const prepared = prepareLanding(question);
  if (isRefused(prepared)) return prepared;
  const { conditions, resolved, power, braking, run } = prepared;
  const { ruleSet, rules, declared, air, wind, condition, creditedHeadwind, doesNotApply } = conditions;
  const { speeds, reference, raised } = prepared.landingSpeeds;

  const physics = landingRuns(run, prepared.runConditions);
  const found = foundLanding(question, prepared, physics);
  const { methods, edge, runs, notReached, runwayFactors } = found;
  const stated = notReached === undefined ? runs.stated : undefined;
  const windCoding = reportWindCoding(question.report, wind);
  const band =
    stated &&
    landingBand(
      run,
      stated,
      runway.surface,
      found.modelForm,
      windCoding,
      (temperatureOff, pressureOff) => airBeside(question, temperatureOff, pressureOff)?.density,
    );
  const byPhysics = stopped(physics.stated);
  const shares = sharesOf(stated, byPhysics);
  const asAnswered = byPhysics && scaledLanding(byPhysics, shares);
  const distances = stated && band && landingDistances(stated, band, run.screenHeight, { methods, edge }, asAnswered);
  const balkedLanding = balkedLandingClimb(question, prepared);

  const rollAvailable = declared.credited.lda;
  const { outcome, checks, governing, thin } = assess({
    conditions,
    runwayFactors,
    startsFrom: found.startsFrom,
    notReached,
    distances: checkedRuns(runs),
    band,
    rollAvailable,
    further: () => {
      const balked = balkedLanding.outcome === 'computed' ? balkedLanding : undefined;
      return climbChecks(rules.demands, question.aeroplane, ({ engines, of, atHeight = 0 }) => {
        if (of === 'approach') return approachWithOneOut(question, prepared);
        return engines === 'all' ? climbedWithAll(balked) : balkedWithOneOut(question, prepared, atHeight);
      });
    },
  });

  const assumed = [
    ...landingEffects(
      [...resolved.assumed, ...braking.assumed],
      found.startsFrom === 'reference' && stated ? run : undefined,
    ),
    ...power.assumed,
  ];
  const landedWith = (change: Partial<LandingRun>) => {
    const result = stopped(landing({ ...run, ...change }));
    return result && scaledLanding(result, shares);
  };
  const context = {
    phase: 'landing' as const,
    question,
    ruleSet,
    rules,
    runwayFactors,
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
    found,
    stated: stated && asAnswered,
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
  const isOutside = notReached?.outcome === 'outside-flight-manual';
  return {
    outcome,
    sentence: answerSentence(context, () =>
      isOutside ? outsideManualSentence(notReached, units) : notStoppedSentence(notReached, physics, units),
    ),
    cautions: raisedCautions(landingCautions, context),
    air,
    wind: windAnswer(wind, creditedHeadwind),
    speeds,
    distances,
    balkedLanding,
    assessment: checks && { ruleSet: ruleSet.id, basedOn: conditions.basedOn, checks, governing: governing?.code },
    shortfall: isOutside
      ? outsideManualShortfalls(notReached)
      : notReached
        ? landingShortfalls(notReached)
        : condition.refusal?.shortfall,
    basis: answerBasis(question, 'landing', conditions, found, assumed, band),
  };
}
