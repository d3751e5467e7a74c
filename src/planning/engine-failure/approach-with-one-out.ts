import { configuredStallSpeed } from '../../performance/speeds/configured-stall-speed.ts';
import type { Climbed } from '../climb-checks.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { engineOutClimb } from './engine-out-climb.ts';
import { engineOutDragOf } from './resolve-engine-out.ts';

/** The most that the approach climb speed may be over the stall speed, taken where none is stated. @see references.Cfr25s121, (d) */
const greatestStallRatio = 1.4;

/**
 * The climb on the engines that remain in the configuration of the approach, gear up, at full power.
 *
 * @returns the climb, or why there is none: the definition says which configuration it is
 * @see references.Cfr25s121, (d)
 */
export function approachWithOneOut(
  question: LandingQuestion,
  { conditions, power }: Pick<PreparedLanding, 'conditions' | 'power'>,
): Climbed {
  const { aeroplane, aeroplaneAt, mass } = question;
  const approach = aeroplane.engineOut?.approach;
  const configuration = approach && aeroplane.configurations[approach.configuration];
  if (approach === undefined || configuration === undefined) {
    return { why: 'no configuration of the approach with one engine out is known' };
  }
  const stall = configuredStallSpeed(configuration.maximumLift, aeroplane.wing.area, mass);
  const { climbOut: _, ...held } = configuration;
  return engineOutClimb(question, {
    configuration: held,
    airDragIncrement: approach.airDragIncrementCoefficient,
    dragIncrementCoefficient: engineOutDragOf(aeroplane, aeroplaneAt).coefficient,
    air: conditions.air,
    thrustFactor: power.thrustFactor,
    powerRatio: 1,
    eas: (approach.stallRatio ?? greatestStallRatio) * stall,
    height: 0,
  });
}
