import { describe, expect, it } from 'vitest';
import { euClassA } from '../../../../src/planning/rules/operating/eu-class-a.ts';
import { requirements } from '../../../../src/planning/rules/requirements.ts';
import {
  contaminatedFactors,
  printedFactors,
  usableParts,
  usablePartsWithApproval,
  wetFactors,
} from '../../../published/eu-class-a.ts';
import { timeOfArrivalFactors } from '../../../published/time-of-arrival.ts';
import { asked, checksFrom, factorsOn, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { takeoff, landing, landingInFlight } = euClassA;
if (landingInFlight === undefined) throw new Error('class A knows both stages');
const wet = { kind: 'paved', state: 'wet' } as const;
const jet = ruled({ category: 'twin-jet', basis: 'cs-25', kilograms: 9000 });
const turboprop = ruled({ category: 'twin-turboprop', basis: 'cs-23-commuter', kilograms: 6000 });
const overall = (category: 'twin-jet' | 'twin-turboprop') => {
  const [one] = requirements(landing, asked({ aeroplane: ruled({ category }) }));
  return one?.factor?.value ?? Number.NaN;
};
/** One landing check from 1000 m on the reference and as much as is given on the runway as it is. */
const landed = (rules: typeof landing, given: Parameters<typeof asked>[0], credited: number | undefined) =>
  checksFrom(rules, asked(given), { reference: 1000, credited })[0];

describe('class A, landing before departure', () => {
  it.each(usableParts)('$title', ({ inputs, expected }) => {
    expectNear(1 / overall(inputs.category), expected, 1e-15);
  });
  it.each(printedFactors)('$title', ({ inputs, expected, tolerance }) => {
    expectNear(overall(inputs.category), expected, tolerance);
  });
  it.each(usablePartsWithApproval)('is not applied: $title', ({ expected }) => {
    expectNear(1 / (landing.notApplied?.[0]?.factor.value ?? 0), expected, 1e-15);
  });
  it.each(wetFactors)('$title', ({ inputs, expected, tolerance }) => {
    const aeroplane = ruled({ category: inputs.category });
    expectNear(landed(landing, { aeroplane, surface: wet }, undefined)?.required, 1000 * expected, 1000 * tolerance);
  });
  it('takes the wet runway as it is where that is longer, and the dry one times 1.15 stands beside it', () => {
    const longer = landed(landing, { aeroplane: jet, surface: wet }, 1200);
    expect(longer?.startsFrom).toBe('credited');
    expectNear(longer?.required, 1200 / 0.6, 1e-9);
    expectNear(longer?.alternative?.required, 1150 / 0.6, 1e-9);
    const shorter = landed(landing, { aeroplane: jet, surface: wet }, 1100);
    expect(shorter?.startsFrom).toBe('reference');
    expectNear(shorter?.required, 1150 / 0.6, 1e-9);
  });
  it.each(contaminatedFactors)('$title', ({ expected }) => {
    const under = { aeroplane: jet, surface: { kind: 'paved', state: 'contaminated' }, isSlippery: true } as const;
    const longer = landed(landing, under, 1800);
    expectNear(longer?.required, 1800 * expected, 1e-9);
    expectNear(longer?.alternative?.required, 1150 / 0.6, 1e-9);
    expectNear(landed(landing, under, 1600)?.required, 1150 / 0.6, 1e-9);
  });
  it('never passes a contaminated runway by the factor of a wet one alone, and fails by it', () => {
    const under = { aeroplane: jet, surface: { kind: 'paved', state: 'flooded' }, isSlippery: true } as const;
    const long = { tora: undefined, toda: undefined, asda: undefined, lda: 5000 };
    const passing = landed(landing, { ...under, published: long }, undefined);
    expect([passing?.result, passing?.margin]).toEqual(['not-assessed', undefined]);
    expect(passing?.why).toMatch(/1\.15 is the least/);
    expect(landed(landing, { ...under, published: { ...long, lda: 1900 } }, undefined)?.result).toBe('fails');
  });
  it('takes damp as wet, speaks of pavement alone and has no factor for slope', () => {
    expect(factorsOn(landing, { kind: 'paved', state: 'dry' }, -0.02)).toEqual([]);
    expect(factorsOn(landing, { kind: 'paved', state: 'damp' })).toEqual([1.15]);
    expect(factorsOn(landing, { kind: 'grass', state: 'dry' })).toBeUndefined();
  });
});

describe('class A, landing in flight', () => {
  it.each(timeOfArrivalFactors)('$title', ({ expected }) => {
    const found = landed(landingInFlight, { aeroplane: jet, surface: wet }, 1200);
    expectNear(found?.required, 1200 * expected, 1e-9);
    expect(found?.alternative).toBeUndefined();
  });
  it('shows the length required before departure beside it outside CS-25, and takes it where physics is silent', () => {
    const found = landed(landingInFlight, { aeroplane: turboprop, surface: wet }, 1200);
    expectNear(found?.required, 1200 * 1.15, 1e-9);
    expectNear(found?.alternative?.required, 1150 / 0.7, 1e-9);
    expectNear(landed(landingInFlight, { aeroplane: turboprop, surface: wet }, undefined)?.required, 1150 / 0.7, 1e-9);
    const rules = { aeroplane: jet, surface: wet };
    expect(() => landed(landingInFlight, rules, undefined)).toThrow('from');
  });
});

describe('class A, takeoff', () => {
  it('compares each distance with and without an engine failure, and says why where there is none', () => {
    const published = { tora: 2000, toda: 2400, asda: 2200, lda: 2000 };
    const checks = checksFrom(takeoff, asked({ aeroplane: jet, published }), { reference: undefined, credited: 1000 });
    expect(checks.map(({ code, result }) => [code, result])).toEqual([
      ['takeoff-run-all-engines', 'passes'],
      ['takeoff-run-engine-out', 'not-assessed'],
      ['takeoff-distance-all-engines', 'passes'],
      ['takeoff-distance-engine-out', 'not-assessed'],
      ['accelerate-stop-all-engines', 'not-assessed'],
      ['accelerate-stop-engine-out', 'not-assessed'],
    ]);
    for (const { result, why, required } of checks) {
      if (result === 'not-assessed') expect([why, required]).toEqual(['nothing is computed', undefined]);
    }
    const computed = {
      accelerateStopDistance: 2300,
      accelerateStopAllEngines: 2199,
      accelerateStopEngineOut: 2300,
      accelerateGoDistance: 2390,
      engineOutTakeoffRun: 1999,
    };
    const all = checksFrom(
      takeoff,
      asked({ aeroplane: jet, published }),
      { reference: undefined, credited: 1000 },
      { onRunway: computed },
    );
    expect(all.map(({ of, margin }) => [of, margin])).toEqual([
      ['takeoffRun', 850],
      ['engineOutTakeoffRun', 1],
      ['takeoffDistance', 1250],
      ['accelerateGoDistance', 10],
      ['accelerateStopAllEngines', 1],
      ['accelerateStopEngineOut', -100],
    ]);
    const missing = { onRunway: computed, notAssessed: 'the aeroplane does not state /brakes' };
    const without = checksFrom(
      takeoff,
      asked({ aeroplane: jet, published }),
      { reference: undefined, credited: 1 },
      missing,
    );
    expect(without.filter(({ why }) => why === missing.notAssessed)).toHaveLength(4);
  });
});

describe('class A applies to', () => {
  const why = (some: Parameters<typeof ruled>[0]) => refusal(euClassA, ruled(some), 'takeoff');
  const twin = { category: 'twin-turboprop', kilograms: 5701 } as const;
  it('more than one engine', () => {
    expect(why({ ...twin, engines: 2 })).toBeUndefined();
    expect(why({ ...twin, engines: 1 })).toMatch(/more than one engine/);
  });
  it('jets and turboprops', () => {
    expect(why(twin)).toBeUndefined();
    expect(why({ ...twin, category: 'twin-piston' })).toMatch(/jets and turboprops/);
    expect(why({ ...twin, category: 'twin-electric' })).toMatch(/jets and turboprops/);
  });
  it('turboprops by their mass alone', () => {
    expect(why({ ...twin, passengerSeats: 9 })).toBeUndefined();
    expect(why({ ...twin, passengerSeats: 9, kilograms: 5700 })).toMatch(/above 5 700 kg or above 9/);
  });
  it('turboprops by their seats alone', () => {
    expect(why({ ...twin, kilograms: 5700, passengerSeats: 10 })).toBeUndefined();
    expect(why({ ...twin, kilograms: 5700, passengerSeats: 9 })).toMatch(/above 5 700 kg or above 9/);
  });
  it('jets whatever their mass and seats', () => {
    expect(why({ category: 'twin-jet', kilograms: 3000, passengerSeats: 4 })).toBeUndefined();
    expect(why({ category: 'twin-turboprop', kilograms: 3000, passengerSeats: 4 })).toBeDefined();
  });
});
