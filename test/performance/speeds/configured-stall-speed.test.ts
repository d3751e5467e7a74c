import { fc, test } from '@fast-check/vitest';
import { describe, it } from 'vitest';
import { configuredStallSpeed } from '../../../src/performance/speeds/configured-stall-speed.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

const masses = fc.double({ min: 100, max: 100_000, noNaN: true });
const stated = { kind: 'stall-speed', cas: 25, mass: 1000, definition: 'one-g' } as const;

describe('stall speed of a configuration', () => {
  test.prop([fc.double({ min: 1, max: 600, noNaN: true })])(
    'is the stated one at its mass, whatever the wing area, 1 to 600 m2, to 1e-14',
    (wingArea) => {
      expectRatio(configuredStallSpeed(stated, wingArea, 1000), 25, 1e-14);
      expectRatio(configuredStallSpeed({ ...stated, definition: 'minimum' }, wingArea, 1000), 25 / 0.94, 1e-14);
    },
  );

  test.prop([masses, fc.double({ min: 0.5, max: 2, noNaN: true })])(
    'goes as the square root of mass and load factor, 100 to 100 000 kg, to 1e-14',
    (mass, loadFactor) => {
      expectRatio(configuredStallSpeed(stated, 16, mass), 25 * Math.sqrt(mass / 1000), 1e-14);
      expectRatio(
        configuredStallSpeed(stated, 16, mass, loadFactor),
        25 * Math.sqrt((mass * loadFactor) / 1000),
        1e-14,
      );
    },
  );

  it('of CLmax 1.6, 16.2 m2, 1043 kg is 25.38235693 m/s EAS [14 CFR 25.103; by hand]', () => {
    // sqrt(2 x 1043 x 9.80665/(1.225 x 16.2 x 1.6)) = sqrt(644.2640...)
    expectNear(configuredStallSpeed({ kind: 'coefficient', coefficient: 1.6 }, 16.2, 1043), 25.38235693, 1e-8);
  });
});
