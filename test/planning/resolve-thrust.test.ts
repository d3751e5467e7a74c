import { describe, expect, it } from 'vitest';
import type { Propulsion } from '../../src/performance/aeroplane.ts';
import { resolveThrust } from '../../src/planning/resolve-thrust.ts';

const constantSpeed: Propulsion = { kind: 'constant-speed', power: 149_000, propellerDiameter: 1.9 };
const resolved = (propulsion: Propulsion, moist = true) =>
  resolveThrust({ propulsion, engines: 1 }, '/aeroplane', 32, moist);

describe('the thrust of a definition that leaves figures out', () => {
  it('says each, and the loss by moisture only where a dew point is given', () => {
    const members = (moist: boolean) =>
      resolved(constantSpeed, moist).assumed.map(({ assumption }) =>
        assumption.at.replace('/aeroplane#/propulsion/', ''),
      );
    expect(members(true)).toContain('humidityFactor');
    expect(members(false)).toEqual(members(true).filter((member) => member !== 'humidityFactor'));
  });
  it('says nothing of what is stated', () => {
    const { assumed, thrustFactor } = resolved({
      ...constantSpeed,
      thrustFactor: 0.9,
      profileFactor: 0.88,
      inducedFactor: 1.15,
      altitudeLapseCoefficient: 0.12,
      temperatureExponent: 0.7,
      humidityFactor: 1,
    });
    expect([assumed, thrustFactor]).toEqual([[], 0.9]);
  });
  it('says by how much a factor was lowered, and moves its other end with it', () => {
    const { assumed, thrustFactor } = resolved({ ...constantSpeed, profileFactor: 1, inducedFactor: 1 });
    const factor = assumed.find(({ assumption }) => assumption.at.endsWith('thrustFactor'));
    expect(thrustFactor).toBeLessThan(0.85);
    expect(factor?.assumption.value).toBe(thrustFactor);
    expect(factor?.assumption.because).toMatch(/lowered from 0\.85, with which .* by \d+ %$/);
    expect(factor?.otherEnd?.kind === 'propulsion' && factor.otherEnd.thrustFactor).toBeLessThan(thrustFactor);
  });
});
