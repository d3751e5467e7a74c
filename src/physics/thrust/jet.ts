import { speedOfSound, standardTemperature } from '../atmosphere.ts';
import { p0, T0 } from '../constants.ts';
import type { EngineAir } from './engine-air.ts';
import type { Thrust } from './thrust.ts';

/** A turbofan or turbojet. */
export interface JetEngine {
  /** of one engine, sea level, standard day [N] */
  readonly staticThrust: number;
  /** from the standard temperature of the altitude up to which the rating holds [K] */
  readonly flatRating: number;
  /** absent or below 5: the general form of a high bypass ratio */
  readonly bypassRatio?: number;
  readonly thrustFactor: number;
}

/** Share of sqrt(M) lost: 0.49 in general, 0.43 + 0.014 BPR from 5 to 15. @see references.Mattingly2002, sec. 2.3; references.GudmundssonGa */
function machLapse(bypassRatio: number | undefined): number {
  return bypassRatio === undefined || bypassRatio < 5 ? 0.49 : 0.43 + 0.014 * Math.min(15, bypassRatio);
}

/**
 * Takeoff thrust of turbofans.
 *
 * T = N k T_s delta0 [1 - c sqrt(M) - 3 max(0, theta0 - TR)/(1.5 + M)], the bracket held in 0 to 1; theta0 = theta (1 + 0.2 M^2),
 * delta0 = delta (1 + 0.2 M^2)^3.5, TR = (T_s(PA) + dT)/288.15: ratings are quoted against the standard temperature of the
 * altitude.
 *
 * @param engine - figures of one engine
 * @param engines - N, those that run
 * @param air - pressure, temperature and pressure altitude
 * @returns the thrust against true airspeed
 * @remarks Below Mach 0.4. Bypass ratios below 5 are given the lower thrust of the high-bypass form. No effect of moisture.
 * @see references.Mattingly2002, sec. 2.3, high bypass ratio turbofan
 */
export function jetThrust(engine: JetEngine, engines: number, air: EngineAir): Thrust {
  const sound = 1 / speedOfSound(air.temperature);
  const scale = (engines * engine.thrustFactor * engine.staticThrust * air.pressure) / p0;
  const theta = air.temperature / T0;
  const ratio = (standardTemperature(air.pressureAltitude) + engine.flatRating) / T0;
  const lapse = machLapse(engine.bypassRatio);
  const at = (airspeed: number): number => bracketed(airspeed > 0 ? airspeed * sound : 0, scale, theta, ratio, lapse);
  const fill = (airspeeds: Float64Array, n: number, out: Float64Array): void => {
    for (let i = 0; i < n; i++) {
      const airspeed = airspeeds[i] as number;
      out[i] = bracketed(airspeed > 0 ? airspeed * sound : 0, scale, theta, ratio, lapse);
    }
  };
  const corner = (ratio / theta - 1) / 0.2;
  return { at, fill, kinks: corner > 0 ? [Math.sqrt(corner) / sound] : [], squareRootAtRest: true };
}

function bracketed(mach: number, scale: number, theta: number, ratio: number, lapse: number): number {
  const total = 1 + 0.2 * mach * mach;
  const over = theta * total - ratio;
  const bracket = 1 - lapse * Math.sqrt(mach) - (over > 0 ? (3 * over) / (1.5 + mach) : 0);
  return bracket > 0 ? scale * total * total * total * Math.sqrt(total) * bracket : 0;
}
