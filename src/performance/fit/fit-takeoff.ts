import type { Work } from '../../numerics/work.ts';
import type { Configuration, MaximumLift, ScheduledSpeed } from '../aeroplane.ts';
import { maximumLiftCoefficient } from '../speeds/maximum-lift-coefficient.ts';
import type { TakeoffFigures } from '../takeoff/takeoff-figures.ts';
import type { FitAsked } from './fit-asked.ts';
import type { FitPoint, StallMeasurement } from './fit-point.ts';
import type { FitResult } from './fit-result.ts';
import { fitStory } from './fit-story.ts';
import { type FitAeroplane, takeoffModel } from './takeoff-model.ts';
import type { TakeoffParameter } from './takeoff-parameters.ts';

/** A fit to distances of a takeoff. */
export interface TakeoffFitAsked {
  readonly aeroplane: FitAeroplane;
  readonly configuration: Pick<Configuration, 'flap' | 'maximumLift'>;
  /** the procedure at a mass [kg] */
  readonly figures: (mass: number) => TakeoffFigures;
  readonly points: readonly FitPoint[];
  /** parameters to free; absent: all that the points show */
  readonly free?: readonly TakeoffParameter[] | undefined;
  /** units in which columns and speeds are declared, where that is known */
  readonly declared?: FitAsked['declared'];
}

/**
 * Thrust factor, shift of the drag in the air and the lapses of piston power that make the physics of a takeoff agree with
 * published or measured distances.
 *
 * @param asked - in SI; heights at or below the screen, marker speeds up to lift-off
 * @returns work, and then the fit with its residuals, verdict and findings
 * @remarks Maximum lift, rolling friction and drag on the ground are not free: the distances show only their products with what is.
 * @see references.HouseFit
 */
export function fitTakeoff({
  aeroplane,
  configuration,
  figures,
  points,
  free,
  declared,
}: TakeoffFitAsked): Work<FitResult<TakeoffParameter>> {
  return fitStory({
    phase: 'takeoff',
    category: aeroplane.category,
    wingArea: aeroplane.wing.area,
    maximumMass: aeroplane.masses.maximumTakeoff,
    flap: configuration.flap,
    maximumLift: configuration.maximumLift,
    speedFactor: 1,
    points,
    free,
    declared,
    model: ({ maximumLift, speedFactor, points: at }) =>
      takeoffModel(
        aeroplane,
        maximumLift,
        (mass) => {
          const { rotation, liftOff, screen, ...rest } = figures(mass);
          return {
            ...rest,
            rotation: scaledSpeed(rotation, speedFactor),
            liftOff: scaledSpeed(liftOff, speedFactor),
            screen: scaledSpeed(screen, speedFactor),
          };
        },
        at,
      ),
  });
}

/** A calibrated speed times a factor; a ratio to the stall speed as it is. */
export function scaledSpeed(speed: ScheduledSpeed, factor: number): ScheduledSpeed {
  return speed.kind === 'cas' ? { ...speed, cas: speed.cas * factor } : speed;
}

/**
 * Maximum lift from measured stall speeds: the mean of their coefficients, each weighed by its uncertainty; twice that of the
 * speed.
 *
 * @param stalls - one or more, 1-g, CAS [m/s]
 * @param wingArea - [m2]
 * @returns the coefficient and its standard deviation over it
 */
export function measuredLift(
  stalls: readonly StallMeasurement[],
  wingArea: number,
): { readonly maximumLift: MaximumLift; readonly relativeSd: number } {
  if (stalls.length === 0) throw new RangeError('stalls must be one or more');
  let weights = 0;
  let sum = 0;
  for (const { cas, mass, relativeSd } of stalls) {
    const weight = 1 / (2 * relativeSd) ** 2;
    weights += weight;
    sum += weight * Math.log(maximumLiftCoefficient({ kind: 'stall-speed', cas, mass, definition: 'one-g' }, wingArea));
  }
  return {
    maximumLift: { kind: 'coefficient', coefficient: Math.exp(sum / weights) },
    relativeSd: 1 / Math.sqrt(weights),
  };
}
