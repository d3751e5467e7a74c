import { describe, expect, it } from 'vitest';
import { euClassB } from '../../src/planning/rules/operating/eu-class-b.ts';
import { unfactored } from '../../src/planning/rules/operating/unfactored.ts';
import { windCredit } from '../../src/planning/wind-credit.ts';
import { creditedWinds } from '../published/wind.ts';
import { expectNear } from '../support/near.ts';

describe('the wind that rules credit', () => {
  it.each(creditedWinds)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(windCredit(inputs.component_kt, euClassB.takeoff.windCredit), expected, tolerance);
  });
  it('is the wind as given without rules, and nothing is made of a calm', () => {
    for (const component of [-10, 0, 10]) expect(windCredit(component, unfactored.takeoff.windCredit)).toBe(component);
    expect(windCredit(0, euClassB.landing.windCredit)).toBe(0);
  });
});
