import { describe, expect, it } from 'vitest';
import {
  a0,
  constants,
  g0,
  gamma,
  lapseRate,
  p0,
  pressureExponent,
  R,
  rho0,
  T0,
  tropopause,
  tropopauseTemperature,
  vapourDeficit,
  vapourMassRatio,
} from '../../src/physics/constants.ts';
import { references } from '../../src/references.ts';
import { toSi } from '../../src/units/units.ts';
import { seaLevelSpeedOfSound, standardConstants } from '../published/iso2533.ts';
import { expectNear } from '../support/near.ts';

const ours: Record<string, number> = {
  'isa-const-g0': g0,
  'isa-const-p0': p0,
  'isa-const-T0': T0,
  'isa-const-rho0': rho0,
  'isa-const-R_specific': R,
  'isa-const-kappa': gamma,
  'isa-const-lapse_troposphere': -lapseRate,
  'isa-const-tropopause_geopotential': tropopause,
  'isa-const-T_stratosphere': tropopauseTemperature,
};

describe('constants of the air', () => {
  for (const { id, quantity, expected, unit } of standardConstants.filter(({ id }) => id in ours)) {
    it(`${id}: ${quantity} = ${expected} ${unit} exactly [ISO 2533:1975, tables 1 and 4; read]`, () => {
      expect(ours[id]).toBe(expected);
    });
  }

  it('R is the universal constant of the same edition over the molar mass 28.96442 kg/kmol, to 2e-8', () => {
    const universal = standardConstants.find(({ id }) => id === 'isa-const-R_star')?.expected as number;
    expectNear(universal / 28.96442 / R, 1, 2e-8);
  });

  it.each(seaLevelSpeedOfSound)('$title', ({ expected, tolerance }) => {
    expectNear(a0 / toSi('speed', 1, 'kt'), expected, tolerance);
  });

  it('the standard is consistent: p0 = rho0 R T0 and a0^2 = gamma p0/rho0 to 2e-8', () => {
    expectNear(p0 / (rho0 * R * T0), 1, 2e-8);
    expectNear((a0 * a0 * rho0) / (gamma * p0), 1, 2e-8);
  });

  it('the pressure exponent is 5.2558798 [ISO 2533:1975, formula (12); computed]', () => {
    expectNear(pressureExponent, 5.2558798, 5e-8);
  });

  it('vapour weighs 18.01528/28.96546 of dry air, rounded to 0.622, and lacks the rest [CIPM-2007; secondary; 1e-4]', () => {
    expectNear(vapourMassRatio, 18.01528 / 28.96546, 1e-4);
    expect(vapourMassRatio + vapourDeficit).toBe(1);
  });

  it('each has a unit and a source in the bibliography', () => {
    for (const [name, { value, unit, source }] of Object.entries(constants)) {
      expect(Number.isFinite(value), name).toBe(true);
      expect(unit, name).not.toBe('');
      expect(references[source], name).toBeDefined();
    }
  });
});
