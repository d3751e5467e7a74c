import { describe, expect, it } from 'vitest';
import { categories } from '../../../../src/performance/aeroplane.ts';
import { euClassB } from '../../../../src/planning/rules/operating/eu-class-b.ts';
import { classBGradients } from '../../../published/certification.ts';
import { timeOfArrivalFactors } from '../../../published/time-of-arrival.ts';
import { asked, checksFrom, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

describe('class B applies to', () => {
  const why = (some: Parameters<typeof ruled>[0]) => refusal(euClassB, ruled(some), 'landing');
  it('propeller-driven aeroplanes', () => {
    for (const category of categories) {
      expect(why({ category }) === undefined, category).toBe(!category.endsWith('-jet'));
    }
  });
  it('up to 5 700 kg', () => {
    expect(why({ kilograms: 5700 })).toBeUndefined();
    expect(why({ kilograms: 5700.1 })).toMatch(/5 700 kg/);
  });
  it('up to 9 passenger seats, and to aeroplanes that do not state theirs', () => {
    expect(why({ passengerSeats: 9 })).toBeUndefined();
    expect(why({ passengerSeats: 10 })).toMatch(/9 passenger seats/);
    expect(why({})).toBeUndefined();
    const taken = euClassB.appliesTo.map((one) => [one.taken?.(ruled()), one.taken?.(ruled({ passengerSeats: 4 }))]);
    expect(taken.flat().filter((text) => text !== undefined)).toEqual(['at most 9']);
  });
});

describe('class B in flight', () => {
  it.each(timeOfArrivalFactors)('$title', ({ expected }) => {
    const rules = euClassB.landingInFlight;
    if (rules === undefined) throw new Error('class B knows both stages');
    const wet = asked({ surface: { kind: 'paved', state: 'wet' } });
    const [check] = checksFrom(rules, wet, { reference: 500, credited: 600 });
    expectNear(check?.required, 600 * expected, 1e-9);
    expect(check?.startsFrom).toBe('credited');
    expectNear(check?.alternative?.required, (500 * 1.15) / 0.7, 1e-9);
    const [silent] = checksFrom(rules, wet, { reference: 500, credited: undefined });
    expectNear(silent?.required, (500 * 1.15) / 0.7, 1e-9);
  });
});

describe('what class B asks of the climb', () => {
  const demands = [...(euClassB.takeoff.demands ?? []), ...(euClassB.landing.demands ?? [])];
  it.each(classBGradients)('$title', ({ inputs, expected, tolerance, status }) => {
    const found = demands.filter(({ code }) => code === inputs.code);
    expect(found).toHaveLength(1);
    expectNear((found[0]?.gradient ?? Number.NaN) * 100, expected, tolerance);
    expect(found[0]?.status).toBe(status);
    expect(found[0]?.positive === true).toBe(expected === 0);
  });
  it('is asked of twins alone', () => {
    for (const { appliesTo } of demands)
      expect([appliesTo(ruled()), appliesTo(ruled({ engines: 1 }))]).toEqual([true, false]);
  });
});
