import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import {
  casFromEas,
  casFromMach,
  easFromCas,
  easFromMach,
  easFromTas,
  impactPressureRatio,
  machFromCas,
  machFromEas,
  machOfImpactPressureRatio,
  tasFromEas,
} from '../../src/physics/airspeed.ts';
import { speedOfSound, standardPressure, standardTemperature } from '../../src/physics/atmosphere.ts';
import { a0, p0, rho0 } from '../../src/physics/constants.ts';
import { airDensity } from '../../src/physics/density.ts';
import { fromSi, toSi } from '../../src/units/units.ts';
import { equivalentAirspeeds, machNumbers, trueAirspeeds } from '../published/airspeeds.ts';
import { expectNear, expectRatio } from '../support/near.ts';

interface Flight {
  readonly cas_kt: number;
  readonly pressure_altitude_ft: number;
  readonly isa_dev_C: number;
}

function flown({ cas_kt, pressure_altitude_ft, isa_dev_C }: Flight) {
  const altitude = toSi('length', pressure_altitude_ft, 'ft');
  const pressure = standardPressure(altitude);
  const cas = toSi('speed', cas_kt, 'kt');
  const eas = easFromCas(cas, pressure) as number;
  const tas = tasFromEas(eas, airDensity(pressure, standardTemperature(altitude) + isa_dev_C));
  return { eas: fromSi('speed', eas, 'kt'), tas: fromSi('speed', tas, 'kt'), mach: machFromCas(cas, pressure) };
}

const speeds = fc.double({ min: 1e-3, max: 200, noNaN: true });
const pressures = fc.double({ min: 35_000, max: 115_000, noNaN: true });
const densities = fc.double({ min: 0.3, max: 1.9, noNaN: true });

describe('airspeeds', () => {
  it.each(trueAirspeeds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(flown(inputs).tas, expected, tolerance);
  });
  it.each(equivalentAirspeeds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(flown(inputs).eas, expected, tolerance);
  });
  it.each(machNumbers)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(flown(inputs).mach, expected, tolerance);
  });

  test.prop([speeds, pressures, densities])(
    'CAS to EAS to TAS and back, 0.001 to 200 m/s, 350 to 1150 hPa, 0.3 to 1.9 kg/m3, to 1e-12',
    (cas, pressure, density) => {
      const eas = easFromCas(cas, pressure) as number;
      const back = easFromTas(tasFromEas(eas, density), density);
      expectRatio(casFromEas(back, pressure), cas, 1e-12);
      expectRatio(casFromMach(machFromCas(cas, pressure) as number, pressure), cas, 1e-12);
      expectRatio(easFromMach(machFromEas(eas, pressure), pressure), eas, 1e-14);
    },
  );

  test.prop([fc.double({ min: 1e-5, max: 1, noNaN: true })])('Mach to impact pressure and back, to 1e-12', (mach) => {
    expectRatio(machOfImpactPressureRatio(impactPressureRatio(mach)), mach, 1e-12);
  });

  it('0 is 0 in every kind', () => {
    expect(easFromCas(0, 50_000)).toBe(0);
    expect(casFromEas(0, 50_000)).toBe(0);
    expect(machFromCas(0, 50_000)).toBe(0);
    expect(tasFromEas(0, 0.5)).toBe(0);
  });

  test.prop([speeds])('CAS, EAS and TAS are one at sea level on the standard day', (cas) => {
    expectRatio(easFromCas(cas, p0), cas, 1e-12);
    expectRatio(tasFromEas(cas, rho0), cas, 1e-15);
  });

  test.prop([fc.double({ min: 1, max: 200, noNaN: true }), fc.double({ min: 35_000, max: 101_324, noNaN: true })])(
    'EAS lies below CAS where pressure is below the standard, and rises with CAS',
    (cas, pressure) => {
      const eas = easFromCas(cas, pressure) as number;
      expect(eas).toBeLessThanOrEqual(cas * (1 + 1e-15));
      expect(easFromCas(cas + 0.001, pressure)).toBeGreaterThan(eas);
    },
  );

  test.prop([fc.double({ min: 1, max: 200, noNaN: true }), fc.double({ min: -500, max: 6000, noNaN: true })])(
    'in dry air TAS = M a whether through density or through the speed of sound, to 2e-8',
    (cas, altitude) => {
      const pressure = standardPressure(altitude);
      const temperature = standardTemperature(altitude) + 17;
      const tas = tasFromEas(easFromCas(cas, pressure) as number, airDensity(pressure, temperature));
      expectRatio((machFromCas(cas, pressure) as number) * speedOfSound(temperature), tas, 2e-8);
    },
  );

  it('impact pressure is dynamic pressure (1 + M^2/4 + M^4/40) to fourth order [Gracey, NASA RP-1046; memory]', () => {
    for (const mach of [0.05, 0.1, 0.2, 0.3]) {
      const series = 0.7 * mach ** 2 * (1 + mach ** 2 / 4 + mach ** 4 / 40);
      expectRatio(impactPressureRatio(mach), series, mach ** 6 / 100);
    }
  });

  it('beyond Mach 1 the outcome is named, and misuse throws naming the parameter', () => {
    expect(machFromCas(a0 + 1, p0)).toBe('not-subsonic');
    expect(machFromCas(300, 20_000)).toBe('not-subsonic');
    expect(easFromCas(300, 20_000)).toBe('not-subsonic');
    expect(casFromMach(1.01, p0)).toBe('not-subsonic');
    expect(casFromEas(340, 150_000)).toBeTypeOf('number');
    expect(casFromEas(416, 150_000)).toBe('not-subsonic');
    expect(() => machFromCas(-1, p0)).toThrow(/cas/);
    expect(() => machFromCas(100, 0)).toThrow(/pressure/);
    expect(() => casFromMach(-0.1, p0)).toThrow(/mach/);
    expect(() => easFromMach(0.1, 0)).toThrow(/pressure/);
    expect(() => machFromEas(Number.NaN, p0)).toThrow(/eas/);
    expect(() => tasFromEas(50, 0)).toThrow(/density/);
    expect(() => easFromTas(50, -1)).toThrow(/density/);
  });
});
