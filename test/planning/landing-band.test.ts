import { describe, expect, it } from 'vitest';
import { ninetyPerCent } from '../../src/planning/band.ts';
import { modelForm } from '../../src/planning/rules/input-uncertainties.ts';
import { along, landed, plainLanding, wetPavement } from '../support/landing-question.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { changed } from '../support/takeoff-question.ts';

const contributions = (question = plainLanding) => landed(question).basis.band ?? [];
const of = (name: string, question = plainLanding) => contributions(question).find((one) => one.of === name);

describe('the 90 % band of a landing', () => {
  it('is the root of the sum of the squares of its parts', () => {
    const { distances } = landed(plainLanding);
    const pairs = [
      ['groundRoll', distances?.groundRoll],
      ['airDistance', distances?.airDistance],
      ['wholeDistance', distances?.landingDistance],
    ] as const;
    for (const [name, distance] of pairs) {
      const squares = contributions().reduce((sum, one) => sum + one[name] ** 2, 0);
      expectRatio(Math.log((distance?.high ?? 0) / (distance?.value ?? 1)), ninetyPerCent * Math.sqrt(squares), 1e-9);
    }
  });
  it('weighs roll against air distance by their lengths', () => {
    const { distances } = landed(plainLanding);
    const share = (distances?.groundRoll.value ?? 0) / (distances?.landingDistance.value ?? 1);
    for (const one of contributions()) {
      expectNear(one.wholeDistance, one.groundRoll * share + one.airDistance * (1 - share), 1e-12);
    }
  });
  it('puts every less favourable input on the longer side', () => {
    for (const question of [plainLanding, changed(plainLanding, along(-6))]) {
      for (const one of contributions(question)) {
        expect(one.groundRoll, one.of).toBeGreaterThanOrEqual(0);
        expect(one.airDistance, one.of).toBeGreaterThanOrEqual(0);
      }
    }
  });
  it('begins with the form of the model, 15 % as stated', () => {
    expect(contributions()[0]).toEqual({
      of: 'model form',
      groundRoll: modelForm.stated,
      airDistance: modelForm.stated,
      wholeDistance: expect.closeTo(modelForm.stated, 12),
    });
  });
  it('has a roll that grows as the first power of mass, since friction does too: 0.8 to 1.1 on 2 %, the free roll as its root', () => {
    const exponent = (of('mass')?.groundRoll ?? 0) / 0.02;
    expect(exponent).toBeGreaterThan(0.8);
    expect(exponent).toBeLessThan(1.1);
  });
  it('takes braking as more uncertain where it is wet', () => {
    const wet = of('braking friction', changed(plainLanding, { runway: { surface: wetPavement } }));
    expect(wet?.groundRoll ?? 0).toBeGreaterThan(of('braking friction')?.groundRoll ?? 1);
    expect(Math.abs(wet?.airDistance ?? 1)).toBe(0);
  });
  it('takes 15 ft at the threshold for 4.572 m over the tangent of the approach', () => {
    const air = landed(plainLanding).distances?.airDistance.value ?? 0;
    expectRatio(of('height over the threshold')?.airDistance, 4.572 / Math.tan(Math.PI / 60) / air, 1e-12);
  });
});
