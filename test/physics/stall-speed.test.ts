import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { tasFromEas } from '../../src/physics/airspeed.ts';
import { maximumLiftCoefficientFromStallSpeed, stallSpeed, turnLoadFactor } from '../../src/physics/stall-speed.ts';
import { toSi } from '../../src/units/units.ts';
import { stallSpeeds } from '../published/independent-model-air.ts';
import { stallSpeedsInTurns } from '../published/level-turn.ts';
import { chartLoadFactors } from '../published/pilots-handbook.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const masses = fc.double({ min: 100, max: 100_000, noNaN: true });
const areas = fc.double({ min: 1, max: 600, noNaN: true });
const lifts = fc.double({ min: 0.5, max: 3.5, noNaN: true });

describe('stall speed', () => {
  it.each(stallSpeeds)('$title', ({ inputs, expected, tolerance }) => {
    const eas = stallSpeed(inputs.mass_kg, inputs.wing_area_m2, inputs.maximum_lift);
    expectNear(tasFromEas(eas, inputs.density_kg_m3), expected, tolerance);
  });
  it.each(stallSpeedsInTurns)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(inputs.stall_kt * Math.sqrt(turnLoadFactor(toSi('angle', inputs.bank_deg, 'deg'))), expected, tolerance);
  });
  it.each(chartLoadFactors)('$title (the tolerance covers the chart, which is wrong at 80°)', (figure) => {
    const found = turnLoadFactor(toSi('angle', figure.inputs.bank_deg, 'deg'));
    expectNear(found, figure.expected, figure.tolerance);
  });
  it('at 80° of bank the load factor is 1/cos 80° = 5.7588, not the 5.747 of the chart', () => {
    expectNear(turnLoadFactor(toSi('angle', 80, 'deg')), 5.75877, 5e-6);
  });

  test.prop([masses, areas, lifts, fc.double({ min: 0.5, max: 2, noNaN: true })])(
    'goes as the square root of mass and of load factor, 100 to 100 000 kg, 1 to 600 m2, to 1e-14',
    (mass, area, lift, ratio) => {
      const one = stallSpeed(mass, area, lift);
      expectRatio(stallSpeed(mass * ratio, area, lift), one * Math.sqrt(ratio), 1e-14);
      expectRatio(stallSpeed(mass, area, lift, ratio), one * Math.sqrt(ratio), 1e-14);
      expectRatio(stallSpeed(mass, area * ratio, lift), one / Math.sqrt(ratio), 1e-14);
      expectRatio(stallSpeed(mass, area, lift * ratio), one / Math.sqrt(ratio), 1e-14);
    },
  );

  test.prop([masses, areas, lifts])('gives its lift coefficient back, to 1e-14', (mass, area, lift) => {
    const found = maximumLiftCoefficientFromStallSpeed(stallSpeed(mass, area, lift), mass, area);
    expectRatio(found, lift, 1e-14);
  });

  it('throws naming the parameter', () => {
    expect(() => stallSpeed(0, 16, 1.6)).toThrow(/mass/);
    expect(() => stallSpeed(1000, 0, 1.6)).toThrow(/wingArea/);
    expect(() => stallSpeed(1000, 16, Number.NaN)).toThrow(/maximumLiftCoefficient/);
    expect(() => stallSpeed(1000, 16, 1.6, 0)).toThrow(/loadFactor/);
    expect(() => maximumLiftCoefficientFromStallSpeed(0, 1000, 16)).toThrow(/stallSpeed/);
    expect(() => turnLoadFactor(Math.PI / 2)).toThrow(/bank/);
  });
});
