import { describe, expect, it } from 'vitest';
import { turbopropPower, turbopropThrust } from '../../../src/physics/thrust/turboprop.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust } from '../../support/thrust-properties.ts';

const engine = { power: 634_000, flatRating: 20, lapseExponent: 2 };
const disc = { propellerDiameter: 2.5, profileFactor: 0.88, inducedFactor: 1.15, thrustFactor: 0.85 };

describe('turbopropPower', () => {
  it('is flat up to the rating at sea level and falls by theta^-2 past it', () => {
    expect(turbopropPower(engine, standardAir(0, -20))).toBe(634_000);
    expect(turbopropPower(engine, standardAir(0, 20))).toBeCloseTo(634_000, 6);
    const fall = turbopropPower(engine, standardAir(0, 21)) / 634_000;
    // 0.7 to 1.0 % a kelvin past the corner [usual range; memory]
    expect(1 - fall).toBeGreaterThan(0.006);
    expect(1 - fall).toBeLessThan(0.01);
  });

  it('meets the corner earlier the higher the field', () => {
    const ratio = (pressureAltitude: number, deviation: number) =>
      turbopropPower(engine, standardAir(pressureAltitude, deviation)) / 634_000;
    expect(ratio(0, 15)).toBe(1);
    const air = standardAir(2000, 15);
    expect(ratio(2000, 15)).toBeCloseTo((air.pressure / 101_325) * (308.15 / air.temperature) ** 2, 12);
    expect(ratio(2000, 15)).toBeLessThan(1);
  });

  it('never exceeds the flat rating', () => {
    expect(turbopropPower(engine, standardAir(-1000, -60))).toBe(634_000);
  });
});

describe('turbopropThrust', () => {
  it('is never negative, never rises with airspeed, and fill equals at', () => {
    expectThrust(turbopropThrust({ ...engine, ...disc }, 2, standardAir(1500, 20)), 150);
  });
});
