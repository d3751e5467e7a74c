import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { type SpeedSet, speedSet } from '../../../src/performance/speeds/speed-set.ts';
import { standardPressure, standardTemperature } from '../../../src/physics/atmosphere.ts';
import { airDensity } from '../../../src/physics/density.ts';
import { fromSi, toSi } from '../../../src/units/units.ts';
import { equivalentAirspeeds, trueAirspeeds } from '../../published/airspeeds.ts';
import { stallSpeeds } from '../../published/independent-model-air.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

const standard = { pressure: 101_325, density: 1.225 };
const calibration = { indicated: [20, 30, 60], calibrated: [25, 32, 60] };

describe('a speed in its kinds', () => {
  it.each(trueAirspeeds.filter((row) => equivalentAirspeeds.some(({ id }) => id === row.id.replace('tas', 'eas'))))(
    '$title, from its EAS of the same table, to 0.06 kt',
    ({ id, inputs, expected }) => {
      const altitude = toSi('length', inputs.pressure_altitude_ft, 'ft');
      const pressure = standardPressure(altitude);
      const density = airDensity(pressure, standardTemperature(altitude) + inputs.isa_dev_C);
      const eas = equivalentAirspeeds.find((row) => row.id === id.replace('tas', 'eas'))?.expected as number;
      const set = speedSet(toSi('speed', eas, 'kt'), 25, { pressure, density }) as SpeedSet;
      expectNear(fromSi('speed', set.tas, 'kt'), expected, 0.06);
      expectNear(fromSi('speed', set.cas, 'kt'), inputs.cas_kt, 0.06);
    },
  );

  it.each(stallSpeeds)('$title, its ratio 1.15 times as fast in TAS', ({ inputs, expected }) => {
    const stall = expected * Math.sqrt(inputs.density_kg_m3 / 1.225);
    const set = speedSet(1.15 * stall, stall, { pressure: 90_000, density: inputs.density_kg_m3 }) as SpeedSet;
    expectRatio(set.tas, 1.15 * expected, 1e-12);
    expectRatio(set.stallRatio, 1.15, 1e-15);
  });

  test.prop([fc.double({ min: 1, max: 150, noNaN: true })])('are one at sea level on the standard day', (eas) => {
    const set = speedSet(eas, 25, standard) as SpeedSet;
    expectRatio(set.cas, eas, 1e-12);
    expect(set.eas).toBe(eas);
    expectRatio(set.tas, eas, 1e-15);
    expect(set).not.toHaveProperty('ias');
  });

  it('has an IAS where the table reaches and none beyond it', () => {
    expectNear((speedSet(32, 25, standard, calibration) as SpeedSet).ias, 30, 1e-9);
    expectNear((speedSet(28.5, 25, standard, calibration) as SpeedSet).ias, 25, 1e-9);
    expect(speedSet(24, 25, standard, calibration)).not.toHaveProperty('ias');
    expect(speedSet(61, 25, standard, calibration)).not.toHaveProperty('ias');
  });

  it('names what is beyond Mach 1 and throws for no stall speed', () => {
    expect(speedSet(400, 25, standard)).toBe('not-subsonic');
    expect(() => speedSet(30, 0, standard)).toThrow(/stallEas/);
  });
});
