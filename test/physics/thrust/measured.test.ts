import { describe, expect, it } from 'vitest';
import { measuredThrust } from '../../../src/physics/thrust/measured.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust } from '../../support/thrust-properties.ts';

const engine = {
  airspeeds: [0, 20, 40, 80],
  thrusts: [2000, 1900, 1700, 900],
  density: 1.225,
  densityExponent: 1,
  thrustFactor: 1,
};

describe('measuredThrust', () => {
  it('meets its rows and is linear between them', () => {
    const thrust = measuredThrust(engine, 1, standardAir(0));
    engine.airspeeds.forEach((airspeed, i) => {
      expect(thrust.at(airspeed)).toBeCloseTo(engine.thrusts[i] as number, 9);
    });
    expect(thrust.at(30)).toBeCloseTo(1800, 9);
    expect(thrust.kinks).toEqual([20, 40]);
    expectThrust(thrust, 80);
  });

  it('scales with engines, factor and the power of the density ratio', () => {
    const thin = { ...standardAir(0), density: 1.225 / 2 };
    expect(measuredThrust({ ...engine, densityExponent: 0.7, thrustFactor: 0.9 }, 2, thin).at(0)).toBeCloseTo(
      2000 * 2 * 0.9 * 0.5 ** 0.7,
      9,
    );
  });

  it('has nothing beyond its rows: it names its domain and throws outside it', () => {
    const thrust = measuredThrust({ ...engine, airspeeds: [10, 20, 40, 80] }, 1, standardAir(0));
    expect(thrust.domain).toEqual([10, 80]);
    expect(() => thrust.at(0)).toThrow(/airspeed/);
    expect(() => thrust.at(80.001)).toThrow(/airspeed/);
    expect(() => thrust.fill(Float64Array.from([20, 81]), 2, new Float64Array(2))).toThrow(/airspeed/);
  });

  it('takes a speed that rounding has put beyond an end as that end', () => {
    const thrust = measuredThrust({ ...engine, airspeeds: [10, 20, 40, 80] }, 1, standardAir(0));
    const speeds = Float64Array.from([10 * (1 - Number.EPSILON), 80 * (1 + Number.EPSILON)]);
    const filled = new Float64Array(2);
    thrust.fill(speeds, 2, filled);
    expect([...filled]).toEqual([thrust.at(10), thrust.at(80)]);
    expect([thrust.at(speeds[0] as number), thrust.at(speeds[1] as number)]).toEqual([...filled]);
  });

  it('refuses rows that do not rise', () => {
    expect(() => measuredThrust({ ...engine, airspeeds: [0, 20, 20, 80] }, 1, standardAir(0))).toThrow(/airspeeds/);
    expect(() => measuredThrust({ ...engine, thrusts: [1, 2] }, 1, standardAir(0))).toThrow(/airspeeds/);
  });
});
