import { describe, expect, it } from 'vitest';
import type { Surface } from '../../../../src/planning/question.ts';
import { euClassC } from '../../../../src/planning/rules/operating/eu-class-c.ts';
import { usableParts } from '../../../published/eu-class-b-landing.ts';
import { slopeFactors, takeoffFactors, wetFactors } from '../../../published/eu-class-c.ts';
import { timeOfArrivalFactors } from '../../../published/time-of-arrival.ts';
import { asked, checksFrom, factorsOn, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { takeoff, landing, landingInFlight } = euClassC;
const heavy = (engines = 2) => ruled({ engines, kilograms: 6000 });
const other: readonly Surface[] = [
  { kind: 'grass', state: 'dry' },
  { kind: 'gravel', state: 'dry' },
  { kind: 'paved', state: 'contaminated' },
];

describe('class C, takeoff', () => {
  it.each(takeoffFactors)('$title', ({ inputs, expected }) => {
    const given = asked({ aeroplane: heavy(inputs.engines) });
    const [check, ...more] = checksFrom(takeoff, given, { reference: 500, credited: undefined });
    expectNear(check?.required, 500 * expected, 1e-9);
    expect([check?.code, check?.of, more]).toEqual(['takeoff-run', 'takeoffDistance', []]);
  });
  it('has no factor for any surface but dry pavement: the check is not assessed, and why', () => {
    for (const surface of [...other, { kind: 'paved', state: 'wet' } as const]) {
      const given = asked({ aeroplane: heavy(), surface });
      const [check] = checksFrom(takeoff, given, { reference: undefined, credited: 500 });
      expect([check?.result, check?.why]).toEqual(['not-assessed', 'class C has no factor for this surface here']);
    }
  });
});

describe('class C, landing', () => {
  it.each(usableParts)('$title', ({ expected }) => {
    const [check] = checksFrom(landing, asked({ aeroplane: heavy() }), { reference: 700, credited: 700 });
    expectNear(check?.required, 700 / expected, 1e-9);
  });
  it.each(wetFactors)('$title', ({ expected, tolerance }) => {
    const given = asked({ aeroplane: heavy(), surface: { kind: 'paved', state: 'wet' } });
    const [check] = checksFrom(landing, given, { reference: 1, credited: undefined });
    expectNear(check?.required, expected, tolerance);
  });
  it('has no factor for any surface but pavement: the check is not assessed, and why', () => {
    for (const surface of other) {
      const given = asked({ aeroplane: heavy(), surface });
      const [check] = checksFrom(landing, given, { reference: undefined, credited: 500 });
      expect([check?.result, check?.why]).toEqual(['not-assessed', 'class C has no factor for this surface here']);
    }
  });
  it.each(timeOfArrivalFactors)('in flight, $title', ({ expected }) => {
    if (landingInFlight === undefined) throw new Error('class C knows both stages');
    const given = asked({ aeroplane: heavy(), surface: { kind: 'grass', state: 'wet' } });
    const [check] = checksFrom(landingInFlight, given, { reference: undefined, credited: 600 });
    expectNear(check?.required, 600 * expected, 1e-9);
  });
});

describe('class C, slope', () => {
  it.each(slopeFactors)('$title', ({ inputs, expected, tolerance }) => {
    const { phase, slope } = inputs;
    const found = (of: number) => factorsOn(euClassC[phase], { kind: 'paved', state: 'dry' }, of);
    expectNear(found(slope)?.[0], expected, tolerance);
    expectNear(found(3 * slope)?.[0], 1.15, 1e-12);
    expect(found(-slope)).toEqual([]);
  });
});

describe('class C applies to', () => {
  const why = (some: Parameters<typeof ruled>[0], phase: 'takeoff' | 'landing' = 'landing') =>
    refusal(euClassC, ruled(some), phase);
  it('piston engines', () => {
    expect(why({ kilograms: 6000 })).toBeUndefined();
    expect(why({ kilograms: 6000, category: 'twin-turboprop' })).toMatch(/piston/);
  });
  it('aeroplanes by their mass alone', () => {
    expect(why({ kilograms: 5700.1, passengerSeats: 9 })).toBeUndefined();
    expect(why({ kilograms: 5700, passengerSeats: 9 })).toMatch(/5 700 kg or above 9/);
  });
  it('aeroplanes by their seats alone', () => {
    expect(why({ kilograms: 5700, passengerSeats: 10 })).toBeUndefined();
    expect(why({ kilograms: 5700 })).toMatch(/5 700 kg or above 9/);
  });
  it('takeoffs with two to four engines, and landings with any', () => {
    for (const [engines, applies] of [
      [1, false],
      [2, true],
      [4, true],
      [5, false],
    ] as const) {
      expect(why({ kilograms: 6000, engines }, 'takeoff') === undefined, String(engines)).toBe(applies);
      expect(why({ kilograms: 6000, engines })).toBeUndefined();
    }
  });
});
