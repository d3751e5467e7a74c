import { describe, expect, it } from 'vitest';
import { banded, highOver, ninetyPerCent } from '../../src/planning/band.ts';
import { modelForm } from '../../src/planning/rules/input-uncertainties.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { answered, changed, fourReadings, plainQuestion } from '../support/takeoff-question.ts';

const contributions = (question = plainQuestion) => answered(question).basis.band ?? [];
const of = (name: string, question = plainQuestion) => contributions(question).find((one) => one.of === name);

describe('the 90 % band', () => {
  it('reaches 1.645 standard deviations of ln s to either side [normal distribution, 5 % and 95 % points]', () => {
    expectNear(ninetyPerCent, 1.645, 5e-4);
    const { low, high } = banded(500, 0.2, { method: 'stated' });
    expectRatio(high / 500, Math.exp(0.329), 1e-4);
    expectRatio(low * high, 250_000, 1e-12);
    expect(highOver(0)).toBe(1);
  });
  it('is the root of the sum of the squares of its parts', () => {
    const { distances } = answered(plainQuestion);
    for (const distance of ['groundRoll', 'airDistance'] as const) {
      const squares = contributions().reduce((sum, one) => sum + one[distance] ** 2, 0);
      const { value, high } = distances?.[distance] ?? { value: 0, high: 0 };
      expectRatio(Math.log(high / value), ninetyPerCent * Math.sqrt(squares), 1e-9);
    }
  });
  it('is never narrower than the form of the model alone: 15 % as stated', () => {
    for (const question of [plainQuestion, fourReadings(2000)]) {
      const { value, high } = answered(question).distances?.takeoffDistance ?? { value: 1, high: 0 };
      expect(Math.log(high / value)).toBeGreaterThan(ninetyPerCent * modelForm.stated);
    }
  });
  it('has the exponents of the roll that are published: mass 2.0 to 2.75 on 2 % [FAA-H-8083-25; read]', () => {
    const mass = (of('mass')?.groundRoll ?? 0) / 0.02;
    expect(mass).toBeGreaterThan(2);
    expect(mass).toBeLessThan(2.75);
  });
  it('has still-air wind near twice the share of the lift-off speed, as (1 - w/V)^1.85 to 2 says [FAA-H-8083-25; read]', () => {
    const liftOff = answered(plainQuestion).speeds.liftOff.tas;
    const wind = (of('wind')?.groundRoll ?? 0) / ((3 * 1852) / 3600 / liftOff);
    expect(wind).toBeGreaterThan(1.8);
    expect(wind).toBeLessThan(2.1);
  });
  it('puts every less favourable input on the longer side of the roll', () => {
    for (const { of, groundRoll, airDistance } of contributions(fourReadings(2000))) {
      if (of === 'technique') expect([groundRoll, airDistance]).toEqual([0, 0.15]);
      else expect(groundRoll, of).toBeGreaterThan(0.001);
    }
  });
  it('takes the other side where the better one does not exist: saturated air cannot cool', () => {
    const saturated = changed(plainQuestion, { weather: { dewPoint: 288.15 } });
    expectRatio(of('temperature', saturated)?.groundRoll, of('temperature')?.groundRoll ?? 0, 0.1);
  });
  it('stays finite, and is held at one standard deviation of ln s, where the ground speed at lift-off is next to nothing', () => {
    const liftOff = answered(plainQuestion).speeds.liftOff.tas;
    const gale = changed(plainQuestion, {
      weather: { wind: { kind: 'components', headwind: liftOff * (1 - 1e-9) } },
    });
    const { value, high } = answered(gale).distances?.groundRoll ?? { value: 0, high: 0 };
    expectRatio(high / value, Math.exp(ninetyPerCent), 1e-9);
  });
  it('stays inside measured thrust that ends at the speed of the screen', () => {
    const { screen } = answered(plainQuestion).speeds;
    const measured = changed(plainQuestion, {
      aeroplane: {
        propulsion: {
          kind: 'measured',
          airspeeds: [0, screen.tas],
          thrusts: [2300, 2100],
          density: 1.225,
          densityExponent: 1,
        },
      },
    });
    expect(contributions(measured).length).toBe(10);
  });
});
