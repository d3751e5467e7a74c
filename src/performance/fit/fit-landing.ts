import type { Work } from '../../numerics/work.ts';
import type { Configuration } from '../aeroplane.ts';
import type { LandingFigures } from '../landing/landing-figures.ts';
import type { FitAsked } from './fit-asked.ts';
import type { FitPoint } from './fit-point.ts';
import type { FitResult } from './fit-result.ts';
import { fitStory } from './fit-story.ts';
import { scaledSpeed } from './fit-takeoff.ts';
import { type LandingParameter, landingModel } from './landing-model.ts';
import type { FitAeroplane } from './takeoff-model.ts';

/** A fit to distances of a landing. */
export interface LandingFitAsked {
  readonly aeroplane: FitAeroplane;
  readonly configuration: Pick<Configuration, 'flap' | 'maximumLift'>;
  /** the procedure at a mass [kg] */
  readonly figures: (mass: number) => LandingFigures;
  readonly points: readonly FitPoint[];
  readonly free?: readonly LandingParameter[] | undefined;
  readonly declared?: FitAsked['declared'];
}

/**
 * Effective braking friction and approach angle that make the physics of a landing agree with published or measured distances;
 * the idle thrust and the flare's load factor are fixed, and there is no float.
 *
 * @returns work, and then the fit with its residuals, verdict and findings
 * @see references.HouseFit
 */
export function fitLanding({
  aeroplane,
  configuration,
  figures,
  points,
  free,
  declared,
}: LandingFitAsked): Work<FitResult<LandingParameter>> {
  return fitStory({
    phase: 'landing',
    category: aeroplane.category,
    wingArea: aeroplane.wing.area,
    maximumMass: aeroplane.masses.maximumLanding ?? aeroplane.masses.maximumTakeoff,
    flap: configuration.flap,
    maximumLift: configuration.maximumLift,
    speedFactor: 1,
    points,
    free,
    declared,
    model: ({ maximumLift, speedFactor, points: at }) =>
      landingModel(
        aeroplane,
        maximumLift,
        (mass) => {
          const { landingReference, touchdown, ...rest } = figures(mass);
          return {
            ...rest,
            landingReference: scaledSpeed(landingReference, speedFactor),
            touchdown: scaledSpeed(touchdown, speedFactor),
          };
        },
        at,
      ),
  });
}
