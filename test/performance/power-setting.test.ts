import { describe, expect, it } from 'vitest';
import type { Propulsion } from '../../src/performance/aeroplane.ts';
import { propulsionAtSetting } from '../../src/performance/power-setting.ts';
import { propulsionThrust } from '../../src/performance/propulsion.ts';
import { dryAir } from '../support/catalogue-takeoff.ts';

const disc = { propellerDiameter: 1.9, thrustFactor: 1 };
const propulsions: readonly Propulsion[] = [
  { kind: 'fixed-pitch', staticThrust: 2400, propellerDiameter: 1.9, thrustFactor: 1 },
  { kind: 'jet', staticThrust: 9000, thrustFactor: 1 },
  { kind: 'constant-speed', power: 150_000, ...disc },
  { kind: 'turboprop', power: 500_000, ...disc, staticThrust: 9000 },
  { kind: 'electric', power: 90_000, ...disc },
  { kind: 'measured', airspeeds: [0, 60], thrusts: [2500, 1500], density: 1.2, densityExponent: 1, thrustFactor: 1 },
];
const thrust = (propulsion: Propulsion, airspeed: number) => propulsionThrust(propulsion, 1, dryAir()).at(airspeed);

describe('a power setting', () => {
  it.each(propulsions.map((one) => [one.kind, one] as const))('of %s gives less thrust at every speed', (_, one) => {
    for (const airspeed of [0, 15, 30, 50]) {
      expect(thrust(propulsionAtSetting(one, 0.9), airspeed)).toBeLessThan(thrust(one, airspeed));
    }
    expect(propulsionAtSetting(one, 1)).toBe(one);
  });
  it('gives static thrust as the ratio where thrust is stated, and to the power 2/3 of it from a disc [momentum theory]', () => {
    for (const one of propulsions) {
      const ratio = thrust(propulsionAtSetting(one, 0.8), 0) / thrust(one, 0);
      const isDisc = one.kind === 'constant-speed' || one.kind === 'turboprop' || one.kind === 'electric';
      expect(ratio, one.kind).toBeCloseTo(isDisc ? 0.8 ** (2 / 3) : 0.8, 6);
    }
  });
  it.each([0, -0.1, 1.01, Number.NaN])('refuses %f by name', (ratio) => {
    expect(() => propulsionAtSetting(propulsions[0] as Propulsion, ratio)).toThrow(/fullPowerRatio/);
  });
});
