import { steadyClimb } from '../performance/steady-climb.ts';
import type { TakeoffClimb } from './answer.ts';
import { climbByManual } from './manual/climb-by-manual.ts';
import type { PreparedTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';

/**
 * The climb after takeoff by the flight manual, else by physics: all engines, flap and gear as at the screen, at the screen speed, out of ground effect.
 *
 * @returns undefined where that airspeed lies outside measured thrust
 */
export function climbAfterTakeoff(
  question: TakeoffQuestion,
  { run, conditions, flown }: PreparedTakeoff,
): TakeoffClimb | undefined {
  const { mass, thrust, screenSpeed: airspeed, wingArea, inducedDragFactor, density } = run;
  const byManual = flown.fullPowerRatio === 1 ? climbByManual(question, conditions, airspeed) : undefined;
  if (byManual !== undefined) return byManual;
  const [lowest, highest] = thrust.domain ?? [0, airspeed];
  if (airspeed < lowest || airspeed > highest) return undefined;
  const climb = steadyClimb({
    mass,
    wingArea,
    zeroLiftDragCoefficient: run.airDragCoefficient,
    inducedDragFactor,
    density,
    airspeed,
    thrust: thrust.at(airspeed),
  });
  return { ...climb, method: conditions.chosen.physics };
}
