import type { EngineAir } from '../physics/thrust/engine-air.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { Propulsion } from './aeroplane.ts';

/**
 * Thrust of the running engines of a definition, in one state of the air.
 *
 * @param propulsion - figures of one engine; members absent take propulsionDefaults
 * @param runningEngines - 1 or more
 * @param air - at the runway
 * @param thrustFactor - the factor to use where the definition has none (of propulsionThrustFactor); absent: the kind's default
 */
export function propulsionThrust(
  propulsion: Propulsion,
  runningEngines: number,
  air: EngineAir,
  thrustFactor?: number,
): Thrust {
  throw new Error(`not built: ${propulsion.kind} ${runningEngines} ${air.density} ${thrustFactor}`);
}
