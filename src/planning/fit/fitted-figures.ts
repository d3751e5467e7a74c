import type { Configuration, ScheduledSpeed } from '../../performance/aeroplane.ts';
import type { LandingFigures } from '../../performance/landing/landing-figures.ts';
import { propulsionThrust } from '../../performance/propulsion.ts';
import { p0, rho0, T0 } from '../../physics/constants.ts';
import type { Assumption } from '../answer.ts';
import { resolveLanding } from '../resolve-landing.ts';
import { referenceSpeedRules } from '../rules/certification/reference-speed.ts';
import { landingScreenHeight } from '../rules/landing-defaults.ts';
import type { FitQuestion } from './fit-question.ts';

const standardDay = { pressureAltitude: 0, pressure: p0, temperature: T0, density: rho0 };
/** What a fit makes anew is not an assumption of it. */
const fitted = ['approachAngle', 'floatDecelerationRatio', 'airDragIncrementCoefficient'];

/** The procedure of a landing that a fit holds fixed, and what was filled in of it. */
export function landingFitFigures(
  question: FitQuestion,
  configuration: Configuration,
): { readonly figures: LandingFigures; readonly assumed: readonly Assumption[] } {
  const { propulsion, engines, certification } = question.aeroplane;
  const staticThrust = propulsionThrust(propulsion, engines, standardDay).at(0);
  const { assumed, landingReference, ...resolved } = resolveLanding(question, configuration, staticThrust);
  const rule = referenceSpeedRules[certification.basis];
  return {
    figures: {
      ...resolved,
      landingReference: landingReference === undefined ? atLeast(rule.stallRatio) : raised(landingReference, rule),
      screenHeight: landingScreenHeight,
    },
    assumed: assumed
      .map(({ assumption }) => assumption)
      .filter(({ at }) => !fitted.some((member) => at.endsWith(`/${member}`))),
  };
}

function atLeast(ratio: number): ScheduledSpeed {
  return { kind: 'stall-ratio', ratio };
}

/** A stated ratio below the least of the certification basis is raised to it, as in an answer. */
function raised(
  stated: ScheduledSpeed,
  { stallRatio, binds }: { readonly stallRatio: number; readonly binds: boolean },
): ScheduledSpeed {
  return binds && stated.kind === 'stall-ratio' && stated.ratio < stallRatio ? atLeast(stallRatio) : stated;
}
