import type { EngineAir } from './engine-air.ts';
import { type PistonLapse, pistonPowerRatio } from './piston-power-ratio.ts';
import type { Thrust } from './thrust.ts';

/** A piston engine with a fixed-pitch propeller. */
export interface FixedPitchEngine extends PistonLapse {
  /** of one engine, sea level, standard day [N] */
  readonly staticThrust: number;
  /** [m] */
  readonly propellerDiameter: number;
  /** |b| of the linear propeller polar, 0.04 to 0.07 */
  readonly polarSlopeCoefficient: number;
  /** on the whole of the thrust */
  readonly thrustFactor: number;
}

/**
 * Thrust of fixed-pitch propellers at full throttle.
 *
 * T = N k (T_s Phi - |b| rho D^2 V^2), not below 0: an engine of constant torque on a linear propeller polar
 * C_T/J^2 = m C_P/J^2 + b.
 *
 * @param engine - figures of one engine
 * @param engines - N, those that run
 * @param air - Phi from its pressure altitude, temperature and moisture; rho as it is
 * @returns the thrust against true airspeed
 * @remarks Unstalled blades at full throttle, below about Mach 0.3.
 * @see references.Lowry1995
 */
export function fixedPitchThrust(engine: FixedPitchEngine, engines: number, air: EngineAir): Thrust {
  const scale = engines * engine.thrustFactor;
  const atRest = scale * engine.staticThrust * pistonPowerRatio(engine, air);
  const slope = scale * engine.polarSlopeCoefficient * air.density * engine.propellerDiameter ** 2;
  const at = (airspeed: number): number => {
    if (airspeed <= 0) return atRest;
    const thrust = atRest - slope * airspeed * airspeed;
    return Math.max(thrust, 0);
  };
  const fill = (airspeeds: Float64Array, n: number, out: Float64Array): void => {
    for (let i = 0; i < n; i++) {
      const airspeed = airspeeds[i] as number;
      const thrust = airspeed > 0 ? atRest - slope * airspeed * airspeed : atRest;
      out[i] = Math.max(thrust, 0);
    }
  };
  return { at, fill, kinks: slope > 0 && atRest > 0 ? [Math.sqrt(atRest / slope)] : [] };
}
