import { describe, expect, it } from 'vitest';
import type { ConstantSpeed } from '../../src/performance/aeroplane.ts';
import { propulsionThrust } from '../../src/performance/propulsion.ts';
import { meanPropellerThrust, propulsionThrustFactor } from '../../src/performance/propulsion-thrust-factor.ts';
import { standardAir } from '../support/standard-air.ts';

const tourer: ConstantSpeed = { kind: 'constant-speed', power: 212_000, propellerDiameter: 2.08 };
const liftOff = 34.6;

describe('meanPropellerThrust', () => {
  it('is 5.75 P (sigma N D^2/P)^(1/3) in lbf, hp, ft: to 0.1 % [Torenbeek, sec. 5.4; memory]', () => {
    const power = 300;
    const feet = 6.8;
    const pounds = 5.75 * power * Math.cbrt((2 * feet * feet) / power);
    const found = meanPropellerThrust(power * 745.6999, 2, feet * 0.3048, 1);
    expect(Math.abs(found / (pounds * 4.4482216) - 1)).toBeLessThan(1e-3);
  });

  it('is exceeded by 15 to 19 % by the bare disc of 160 to 310 hp [computed]', () => {
    const disc = propulsionThrust({ ...tourer, thrustFactor: 1 }, 1, standardAir(0)).at(Math.SQRT1_2 * liftOff);
    const ratio = disc / meanPropellerThrust(212_000, 1, 2.08, 1);
    expect(ratio).toBeGreaterThan(1.14);
    expect(ratio).toBeLessThan(1.2);
  });
});

describe('propulsionThrustFactor', () => {
  it('is the stated one untouched', () => {
    expect(propulsionThrustFactor({ ...tourer, thrustFactor: 1.3 }, 1, liftOff)).toEqual({
      value: 1.3,
      from: 'definition',
    });
  });

  it('is the default where the thrust agrees with the mean within 10 %', () => {
    const found = propulsionThrustFactor(tourer, 1, liftOff);
    expect(found).toMatchObject({ value: 0.85, from: 'default' });
    expect(Math.abs((found.ratioToMean ?? Number.NaN) - 1)).toBeLessThan(0.1);
  });

  it('is lowered to agree where the thrust exceeds the mean by more, and never raised', () => {
    const strong = propulsionThrustFactor({ ...tourer, profileFactor: 0.98, inducedFactor: 1 }, 1, 25);
    expect(strong.from).toBe('lowered');
    const thrust = propulsionThrust(
      { ...tourer, profileFactor: 0.98, inducedFactor: 1 },
      1,
      standardAir(0),
      strong.value,
    );
    expect(thrust.at(Math.SQRT1_2 * 25) / meanPropellerThrust(212_000, 1, 2.08, 1)).toBeCloseTo(1, 9);
    const weak = propulsionThrustFactor({ ...tourer, profileFactor: 0.6 }, 1, liftOff);
    expect(weak).toMatchObject({ value: 0.85, from: 'default' });
    expect(weak.ratioToMean).toBeLessThan(0.9);
  });

  it('compares no fixed pitch, jet or measured thrust', () => {
    expect(propulsionThrustFactor({ kind: 'jet', staticThrust: 1e4 }, 2, 60)).toEqual({ value: 1, from: 'default' });
  });
});
