import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contaminantDrag } from '../../src/physics/contaminant-drag.ts';
import type { LooseContaminant } from '../../src/physics/runway-surface.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const gear = { tyres: 3, tyreWidth: 0.16, tyreDeflection: 0.02, sprayLength: 0 };
const kinds: readonly LooseContaminant[] = ['water', 'slush', 'wet-snow', 'dry-snow'];
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('contaminantDrag', () => {
  it('three tyres of 16 cm, 2 cm flattened, in 12 mm of slush, by hand [AMC 25.1591 displacement drag; memory]', () => {
    // f = (0.020 + 0.012)/0.16 = 0.2; b = 2 x 0.16 x sqrt(0.2 - 0.04) = 0.32 x 0.4 = 0.128 m
    // front of one tyre 0.012 x 0.128 = 0.001536 m2; k = 850/2 x 0.75 x 3 x 0.001536 = 1.4688 kg/m
    expectNear(contaminantDrag('slush', 0.012, gear), 1.4688, 1e-12);
    // at 25 m/s over the ground: 918 N, on a 1000 kg aeroplane 0.094 of its weight
    expectNear(contaminantDrag('slush', 0.012, gear) * 25 ** 2, 918, 1e-9);
  });

  it('with 4 m of fuselage in the spray: C_D 0.75 + 0.0656 x 4, by hand [AMC 25.1591, 8 x 0.0025 a foot; memory]', () => {
    // 4 m = 13.1234 ft; 13.1234 x 0.02 = 0.262467; k = 850/2 x 1.012467 x 3 x 0.001536 = 1.982816
    expectNear(contaminantDrag('slush', 0.012, { ...gear, sprayLength: 4 }), 1.982816, 1e-6);
  });

  it('goes as the density: 1000, 850, 400, 200 kg/m3 [AMC 25.1591; memory]', () => {
    const [water = 0, ...others] = kinds.map((kind) => contaminantDrag(kind, 0.01, gear));
    expect(others.map((drag) => Math.round((1000 * drag) / water))).toEqual([850, 400, 200]);
  });

  it('takes the whole width from half a tyre of depth on, and the largest chord is the width', () => {
    const half = { ...gear, tyres: 1, tyreDeflection: 0.08 };
    expectNear(contaminantDrag('water', 0.01, half), 0.5 * 1000 * 0.75 * 0.01 * 0.16, 1e-12);
    expectRatio(contaminantDrag('water', 0.01, { ...half, tyreDeflection: 0.069_999_999 }), 0.6, 1e-12);
  });

  it('is nothing up to 3 mm [AMC 25.1591; read], and there after', () => {
    for (const kind of kinds) {
      expect(contaminantDrag(kind, 0.003, gear)).toBe(0);
      expect(contaminantDrag(kind, 0.0031, gear)).toBeGreaterThan(0);
    }
  });

  it('grows with depth, tyres, width, deflection and spray, and never falls', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...kinds),
        between(0, 0.3),
        between(0, 0.3),
        between(0.05, 0.5),
        between(0, 0.2),
        between(0, 20),
        (kind, one, other, tyreWidth, tyreDeflection, sprayLength) => {
          const own = { tyres: 3, tyreWidth, tyreDeflection, sprayLength };
          const shallow = Math.min(one, other);
          const deep = Math.max(one, other);
          const drag = contaminantDrag(kind, deep, own);
          const least = contaminantDrag(kind, shallow, own);
          if (deep > shallow && deep > 0.003) expect(drag).toBeGreaterThan(least);
          expect(drag).toBeGreaterThanOrEqual(least);
          for (const more of [
            { tyres: 4 },
            { tyreWidth: 1.1 * tyreWidth },
            { tyreDeflection: tyreDeflection + 0.01 },
          ]) {
            expect(contaminantDrag(kind, deep, { ...own, ...more })).toBeGreaterThanOrEqual(drag * (1 - 1e-12));
          }
          expect(contaminantDrag(kind, deep, { ...own, sprayLength: sprayLength + 1 })).toBeGreaterThanOrEqual(drag);
        },
      ),
    );
  });

  it('refuses figures that are none', () => {
    expect(() => contaminantDrag('water', Number.NaN, gear)).toThrow(/depth/);
    expect(() => contaminantDrag('water', 0.01, { ...gear, tyreWidth: 0 })).toThrow(/tyreWidth/);
    expect(() => contaminantDrag('water', 0.01, { ...gear, tyreDeflection: -0.01 })).toThrow(/tyreDeflection/);
    expect(() => contaminantDrag('water', 0.01, { ...gear, tyres: -1 })).toThrow(/tyres/);
    expect(() => contaminantDrag('water', 0.01, { ...gear, sprayLength: Number.NaN })).toThrow(/sprayLength/);
  });
});
