import { describe, expect, it } from 'vitest';
import { landingAirDistance } from '../../../src/performance/landing/landing-air-distance.ts';
import { landingArc } from '../../../src/performance/landing/landing-arc.ts';
import { landingVectors } from '../../published/landing-vectors.ts';
import { landingVectorRun } from '../../support/landing-runs.ts';

const fitted = landingVectorRun(landingVectors[0] as (typeof landingVectors)[number]);
const unfitted = { ...fitted, floatDecelerationRatio: 0.12 };
const jet = { ...unfitted, referenceSpeed: 68, touchdownSpeed: 0.96 * 68 };

describe('landingAirDistance', () => {
  it('of a jet is the seven seconds, 7 s x (0.98 V_REF - w), where the arc is shorter [AC 25-32; memory]', () => {
    for (const headwind of [-5, 0, 8]) {
      const found = landingAirDistance({ ...jet, headwind });
      expect(found).toMatchObject({ from: 'seven-seconds', floatDistance: 0, time: 7 });
      expect(found.distance).toBeCloseTo(7 * (0.98 * 68 - headwind), 9);
    }
  });

  it('of a light aeroplane is the arc where that is longer, with the float to a slow touchdown', () => {
    const found = landingAirDistance(unfitted);
    const arc = landingArc(unfitted);
    expect(found.from).toBe('arc');
    const floatFrom = 0.96 * unfitted.referenceSpeed;
    const float = Math.max(0, (floatFrom ** 2 - unfitted.touchdownSpeed ** 2) / (2 * 9.80665 * 0.12) - arc.flare);
    expect(float).toBeGreaterThan(0);
    expect(found.floatDistance).toBeCloseTo(float, 9);
    expect(found.distance).toBeCloseTo(arc.straight + arc.flare + float, 9);
    expect(found.time).toBeCloseTo(arc.time + float / ((floatFrom + unfitted.touchdownSpeed) / 2), 9);
  });

  it('takes the wind off the float as well', () => {
    const still = landingAirDistance(unfitted);
    const windy = landingAirDistance({ ...unfitted, headwind: 6 });
    const mean = (0.96 * unfitted.referenceSpeed + unfitted.touchdownSpeed) / 2;
    expect(windy.floatDistance).toBeCloseTo(still.floatDistance * (1 - 6 / mean), 9);
    expect(windy.distance).toBeCloseTo(still.distance - 6 * still.time, 9);
  });

  it('of a fitted aeroplane is the arc alone', () => {
    const found = landingAirDistance(fitted);
    const arc = landingArc(fitted);
    expect(found).toMatchObject({ from: 'arc', floatDistance: 0, flareAboveScreen: false });
    expect(found.distance).toBeCloseTo(arc.straight + arc.flare, 12);
  });

  it('refuses a float without deceleration', () => {
    expect(() => landingAirDistance({ ...unfitted, floatDecelerationRatio: 0 })).toThrow(/floatDecelerationRatio/);
  });
});
