import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { scheduledSpeed } from '../../../src/performance/speeds/scheduled-speed.ts';
import { standardPressure } from '../../../src/physics/atmosphere.ts';
import { fromSi, toSi } from '../../../src/units/units.ts';
import { equivalentAirspeeds } from '../../published/airspeeds.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

describe('a scheduled speed', () => {
  test.prop([fc.double({ min: 1, max: 2, noNaN: true }), fc.double({ min: 35_000, max: 115_000, noNaN: true })])(
    'by ratio is that many stall speeds in EAS at any pressure',
    (ratio, pressure) => {
      expect(scheduledSpeed({ kind: 'stall-ratio', ratio }, 1000, 25, pressure)).toBe(ratio * 25);
    },
  );

  it.each(equivalentAirspeeds)('by CAS at its own mass: $title', ({ inputs, expected, tolerance }) => {
    const schedule = { kind: 'cas', cas: toSi('speed', inputs.cas_kt, 'kt'), mass: 1000 } as const;
    const pressure = standardPressure(toSi('length', inputs.pressure_altitude_ft, 'ft'));
    const found = scheduledSpeed(schedule, 1000, 25, pressure) as number;
    expectNear(fromSi('speed', found, 'kt'), expected, tolerance);
  });

  test.prop([fc.double({ min: 500, max: 2000, noNaN: true })])(
    'by CAS goes as the square root of mass, 500 to 2000 kg, at sea level to 1e-12',
    (mass) => {
      const schedule = { kind: 'cas', cas: 30, mass: 1000 } as const;
      expectRatio(scheduledSpeed(schedule, mass, 25, 101_325), 30 * Math.sqrt(mass / 1000), 1e-12);
    },
  );

  it('names what is beyond Mach 1 and throws for no mass', () => {
    const schedule = { kind: 'cas', cas: 400, mass: 1000 } as const;
    expect(scheduledSpeed(schedule, 1000, 25, 101_325)).toBe('not-subsonic');
    expect(() => scheduledSpeed(schedule, 0, 25, 101_325)).toThrow(/mass/);
    expect(() => scheduledSpeed({ ...schedule, mass: 0 }, 1000, 25, 101_325)).toThrow(/mass/);
  });
});
