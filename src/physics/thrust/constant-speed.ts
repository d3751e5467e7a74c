import { type ActuatorDisc, actuatorDiscThrust } from './actuator-disc.ts';
import type { EngineAir } from './engine-air.ts';
import { type PistonLapse, pistonPowerRatio } from './piston-power-ratio.ts';
import type { Thrust } from './thrust.ts';

/** A piston engine with a constant-speed propeller. */
export interface ConstantSpeedEngine extends PistonLapse, ActuatorDisc {
  /** rated, of one engine [W] */
  readonly power: number;
}

/**
 * Thrust of constant-speed propellers on piston engines at full throttle: the actuator disc at the power left by
 * altitude, temperature and moisture.
 *
 * @param engine - figures of one engine
 * @param engines - those that run
 * @param air - at the runway
 * @see references.McCormick1995, ch. 6; references.GaggFerrar1934
 */
export function constantSpeedThrust(engine: ConstantSpeedEngine, engines: number, air: EngineAir): Thrust {
  return actuatorDiscThrust(engine, engines, engine.power * pistonPowerRatio(engine, air), engine.power, air.density);
}
