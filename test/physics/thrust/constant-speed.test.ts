import { describe, expect, it } from 'vitest';
import { constantSpeedThrust } from '../../../src/physics/thrust/constant-speed.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust } from '../../support/thrust-properties.ts';

const engine = {
  power: 212_000,
  propellerDiameter: 2.08,
  profileFactor: 0.88,
  inducedFactor: 1.15,
  thrustFactor: 0.85,
  altitudeLapseCoefficient: 0.12,
  temperatureExponent: 0.7,
  humidityFactor: 1.5,
};

describe('constantSpeedThrust', () => {
  it('is never negative, never rises with airspeed, and fill equals at', () => {
    expectThrust(constantSpeedThrust(engine, 1, standardAir(0)), 120);
    expectThrust(constantSpeedThrust(engine, 2, standardAir(3500, 25)), 120);
    expectThrust(constantSpeedThrust({ ...engine, criticalAltitude: 4000 }, 1, standardAir(3500, 25)), 120);
  });

  it('at rest goes with (P^2 rho)^(1/3): a turbocharged engine below its critical altitude loses by density alone', () => {
    const turbo = { ...engine, criticalAltitude: 4000 };
    const low = constantSpeedThrust(turbo, 1, standardAir(0)).at(0);
    const high = constantSpeedThrust(turbo, 1, standardAir(2000)).at(0);
    expect(high / low).toBeCloseTo(Math.cbrt(standardAir(2000).density / 1.225), 9);
  });
});
