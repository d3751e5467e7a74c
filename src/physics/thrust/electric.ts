import { type ActuatorDisc, actuatorDiscThrust } from './actuator-disc.ts';
import type { EngineAir } from './engine-air.ts';
import type { Thrust } from './thrust.ts';

/** An electric motor with a governed propeller. */
export interface ElectricEngine extends ActuatorDisc {
  /** of one motor [W], the same in any air */
  readonly power: number;
}

/**
 * Thrust of electric motors: the actuator disc at a power that does not depend on the air.
 *
 * @param engine - figures of one motor
 * @param engines - those that run
 * @param air - density only
 * @see references.McCormick1995, ch. 6
 */
export function electricThrust(engine: ElectricEngine, engines: number, air: EngineAir): Thrust {
  return actuatorDiscThrust(engine, engines, engine.power, engine.power, air.density);
}
