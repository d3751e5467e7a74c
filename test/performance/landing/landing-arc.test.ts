import { describe, expect, it } from 'vitest';
import { landingArc } from '../../../src/performance/landing/landing-arc.ts';
import { raymerLanding } from '../../published/braking-and-landing.ts';
import { landingVectors } from '../../published/landing-vectors.ts';
import { landingVectorRun } from '../../support/landing-runs.ts';

const foot = 0.3048;
const base = landingVectorRun(landingVectors[0] as (typeof landingVectors)[number]);

describe('landingArc', () => {
  it.each(raymerLanding.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const twin = {
        ...base,
        referenceSpeed: 156.92 * foot,
        touchdownSpeed: (2 * 148.47 - 156.92) * foot,
        approachAngle: (3 * Math.PI) / 180,
        flareLoadFactor: 1 + (0.2 * 32.2 * foot) / 9.80665,
      };
      expect(Math.abs(landingArc(twin)[inputs.part] / foot - expected)).toBeLessThan(tolerance);
    },
  );

  it('has no straight part where the flare begins above the screen, and no jump on the way there', () => {
    const steep = landingArc({ ...base, approachAngle: 0.3 });
    expect(steep.straight).toBe(0);
    expect(steep.flareHeight).toBeGreaterThan(15.24);
    expect(steep.flare).toBeCloseTo(Math.sqrt(steep.radius ** 2 - (steep.radius - 15.24) ** 2), 9);
    const edge = Math.acos(1 - 15.24 / steep.radius);
    const [below, above] = [edge - 1e-7, edge + 1e-7].map((approachAngle) => landingArc({ ...base, approachAngle }));
    expect((below?.straight ?? 0) + (below?.flare ?? 0)).toBeCloseTo(above?.flare ?? Number.NaN, 4);
    expect(below?.time).toBeCloseTo(above?.time ?? Number.NaN, 4);
  });

  it('names an angle or load factor that makes no arc', () => {
    expect(() => landingArc({ ...base, approachAngle: 0 })).toThrow(/approachAngle/);
    expect(() => landingArc({ ...base, flareLoadFactor: 1 })).toThrow(/flareLoadFactor/);
  });
});
