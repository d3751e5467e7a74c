import { standardDensity, standardPressure, standardTemperature } from '../../src/physics/atmosphere.ts';
import type { EngineAir } from '../../src/physics/thrust/engine-air.ts';

/** Dry air at a pressure altitude [m], so many kelvins from the standard day. */
export function standardAir(pressureAltitude: number, deviation = 0): EngineAir {
  const standard = standardTemperature(pressureAltitude);
  return {
    pressureAltitude,
    pressure: standardPressure(pressureAltitude),
    temperature: standard + deviation,
    density: (standardDensity(pressureAltitude) * standard) / (standard + deviation),
  };
}
