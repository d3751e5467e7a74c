import { steadyClimb } from '../performance/steady-climb.ts';
import type { TakeoffClimb } from './answer.ts';
import type { PreparedTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';

/**
 * The climb after takeoff: all engines, flap and gear as at the screen, at the screen speed, out of ground effect.
 *
 * @returns undefined where that airspeed lies outside measured thrust
 */
export function climbAfterTakeoff(
  { mass }: Pick<TakeoffQuestion, 'mass'>,
  { run }: PreparedTakeoff,
): TakeoffClimb | undefined {
  const { thrust, screenSpeed: airspeed, wingArea, inducedDragFactor, density } = run;
  const [lowest, highest] = thrust.domain ?? [0, airspeed];
  if (airspeed < lowest || airspeed > highest) return undefined;
  return steadyClimb({
    mass,
    wingArea,
    zeroLiftDragCoefficient: run.airDragCoefficient,
    inducedDragFactor,
    density,
    airspeed,
    thrust: thrust.at(airspeed),
  });
}
