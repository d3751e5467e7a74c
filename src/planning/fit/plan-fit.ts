import type { Work } from '../../numerics/work.ts';
import type { Configuration } from '../../performance/aeroplane.ts';
import { fitLanding } from '../../performance/fit/fit-landing.ts';
import { acceptedGreatest, acceptedRms, type FitResult } from '../../performance/fit/fit-result.ts';
import { fitTakeoff, measuredLift } from '../../performance/fit/fit-takeoff.ts';
import type { LandingParameter } from '../../performance/fit/landing-model.ts';
import type { TakeoffParameter } from '../../performance/fit/takeoff-parameters.ts';
import type { Assumption, Caution } from '../answer.ts';
import type { Fault, Refused } from '../fault.ts';
import { atManualSpeeds } from '../manual/at-manual-speeds.ts';
import { resolveTakeoff } from '../resolve-takeoff.ts';
import { percentText } from '../sentences/measure-text.ts';
import { saidFinding } from './finding-sentence.ts';
import type { FitAnswer } from './fit-answer.ts';
import { type FitPoints, fitPoints } from './fit-points.ts';
import type { FitQuestion } from './fit-question.ts';
import { landingFitFigures } from './fitted-figures.ts';
import { heldSentence } from './held-sentence.ts';

/**
 * A fit from question to answer: points, procedure, fit, what there is to say of it.
 *
 * @param question - its configuration exists and is for the phase
 * @returns work that yields between its parts, and then the answer or every fault
 */
export function* planFit(question: FitQuestion): Work<FitAnswer | Refused> {
  const { aeroplane, phase, stalls } = question;
  const configuration = aeroplane.configurations[question.configuration] as Configuration;
  const found = fitPoints(question, configuration);
  if (Array.isArray(found)) return { refused: found as Fault[] };
  const { points, origins } = found as FitPoints;

  const lift = stalls.length === 0 ? undefined : measuredLift(stalls, aeroplane.wing.area);
  const flown = lift === undefined ? configuration : { ...configuration, maximumLift: lift.maximumLift };
  const { free, declared } = question;
  const asked = { aeroplane, configuration: flown, points, declared };
  const ofMass = points[0]?.mass ?? aeroplane.masses.maximumTakeoff;
  let result: FitResult;
  let assumed: readonly Assumption[];
  if (phase === 'takeoff') {
    const figures = (mass: number) => resolveTakeoff(question, atManualSpeeds(flown, { ...question, mass }));
    assumed = figures(ofMass)
      .assumed.map(({ assumption }) => assumption)
      .filter(({ at }) => !at.endsWith('/pullUpLoadFactor'));
    result = yield* fitTakeoff({ ...asked, figures, free: free as readonly TakeoffParameter[] | undefined });
  } else {
    const at = (mass: number) => landingFitFigures(question, atManualSpeeds(flown, { ...question, mass }));
    assumed = at(ofMass).assumed;
    const figures = (mass: number) => at(mass).figures;
    result = yield* fitLanding({ ...asked, figures, free: free as readonly LandingParameter[] | undefined });
  }

  const findings = result.findings.map((finding) => saidFinding(finding, question, origins));
  const fitted = result.outcome === 'fitted' ? result : undefined;
  const outcome = fitted === undefined ? 'not-fitted' : fitted.accepted ? 'accepted' : 'not-accepted';
  return {
    outcome,
    sentence: sentenceOf(result, findings[0]?.message),
    cautions: fitted === undefined ? [] : heldCautions(fitted),
    findings,
    result: fitted,
    origins,
    maximumLift:
      lift?.maximumLift.kind === 'coefficient'
        ? { coefficient: lift.maximumLift.coefficient, relativeSd: lift.relativeSd }
        : undefined,
    assumed,
  };
}

function sentenceOf(result: FitResult, first: string | undefined): string {
  if (result.outcome === 'not-fitted') return `No fit. ${first ?? ''}`.trimEnd();
  const { rms, greatest, residuals } = result;
  const misses = `${residuals.filter(({ leftOut }) => !leftOut).length} distances missed by ${percentText(rms)} rms and ${percentText(Math.abs(greatest.logRatio))} at most`;
  if (result.accepted) return `The fit is accepted: ${misses}.`;
  const because = first ?? `accepted are ${percentText(acceptedRms)} rms and ${percentText(acceptedGreatest)} at most.`;
  return `The fit is not accepted: ${misses}. ${first === undefined ? because.charAt(0).toUpperCase() + because.slice(1) : because}`;
}

/** A note for each parameter that the distances do not show. */
function heldCautions({ parameters }: Extract<FitResult, { outcome: 'fitted' }>): Caution[] {
  return parameters.flatMap(({ name, held, value }): Caution[] =>
    held === undefined
      ? []
      : [
          {
            code: 'parameter-held',
            severity: 'note',
            message: heldSentence(name, value, held),
            value,
            source: 'HouseFit',
          },
        ],
  );
}
