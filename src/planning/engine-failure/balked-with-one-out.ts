import type { Configuration } from '../../performance/aeroplane.ts';
import { configuredStallSpeed } from '../../performance/speeds/configured-stall-speed.ts';
import type { Climbed } from '../climb-checks.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { continuousPower } from '../rules/engine-failure-defaults.ts';
import { engineOutClimb } from './engine-out-climb.ts';
import { engineOutDragOf } from './resolve-engine-out.ts';

/** Climb speed over the stall speed with flap and gear up. @see references.EuAirOps340 */
const climbStallRatio = 1.2;

/**
 * The climb on the engines that remain after a balked landing, once flap and gear are up.
 *
 * A landing configuration says nothing of them; the takeoff configuration with the least flap that says how they come up does.
 *
 * @param height - above the runway [m]
 * @returns the climb at continuous power and 1.2 times that stall speed, or why there is none
 * @see references.EuAirOps340
 */
export function balkedWithOneOut(
  question: LandingQuestion,
  { conditions, power }: Pick<PreparedLanding, 'conditions' | 'power'>,
  height: number,
): Climbed {
  const { aeroplane, aeroplaneAt, mass } = question;
  const configuration = cleanest(Object.values(aeroplane.configurations));
  if (configuration === undefined) {
    return {
      why: 'no takeoff configuration says how flap and gear come up, as they are in the climb with one engine out',
    };
  }
  const stall = configuredStallSpeed(configuration.maximumLift, aeroplane.wing.area, mass);
  return engineOutClimb(question, {
    configuration,
    airDragIncrement: configuration.airDragIncrementCoefficient ?? 0,
    dragIncrementCoefficient: engineOutDragOf(aeroplane, aeroplaneAt).coefficient,
    air: conditions.air,
    thrustFactor: power.thrustFactor,
    powerRatio: continuousPower(aeroplane),
    eas: climbStallRatio * stall,
    height,
  });
}

function cleanest(configurations: readonly Configuration[]): Configuration | undefined {
  return configurations
    .filter((one) => one.for.includes('takeoff') && one.climbOut !== undefined)
    .reduce<Configuration | undefined>(
      (least, one) => (least === undefined || one.flap < least.flap ? one : least),
      undefined,
    );
}
