import { describe, expect, it } from 'vitest';
import { usPart91 } from '../../../../src/planning/rules/operating/us-part-91.ts';
import { usPart121 } from '../../../../src/planning/rules/operating/us-part-121.ts';
import { usPart135 } from '../../../../src/planning/rules/operating/us-part-135.ts';
import type { RuledAeroplane, RuleSet } from '../../../../src/planning/rules/rule-set.ts';
import {
  alternates,
  destinations,
  destinationsRecalled,
  dispatchFactors,
  jetAlternates,
  otherOperations,
  requiredRunways,
  wetFactors,
} from '../../../published/us-operating-rules.ts';
import { asked, checksFrom, factorsOn, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const sets: Readonly<Record<string, RuleSet>> = {
  'us-part-91': usPart91,
  'us-part-121': usPart121,
  'us-part-135': usPart135,
};
const setOf = (id: string) => sets[id] as RuleSet;
const wet = { kind: 'paved', state: 'wet' } as const;
const jet = ruled({ category: 'twin-jet', basis: 'cs-25', kilograms: 9000 });
const turboprop = ruled({ category: 'twin-turboprop', basis: 'cs-25', kilograms: 9000 });
const landed = (set: RuleSet, aeroplane: RuledAeroplane, surface: Parameters<typeof factorsOn>[1] = wet) =>
  checksFrom(set.landing, asked({ aeroplane, surface }), { reference: 600, credited: undefined })[0];
const dry = { kind: 'paved', state: 'dry' } as const;
const codes = (set: RuleSet, aeroplane: RuledAeroplane) =>
  checksFrom(set.takeoff, asked({ aeroplane }), { reference: undefined, credited: 600 }).map(({ code, result }) => [
    code,
    result,
  ]);

describe('Parts 121 and 135, landing', () => {
  it.each(destinations)('$title', ({ inputs, expected }) => {
    const aeroplane = ruled({ category: inputs.category, basis: 'cs-25' });
    expectNear(landed(setOf(inputs.set), aeroplane, dry)?.required, 600 / expected, 1e-9);
  });
  it.each(destinationsRecalled)('$title', ({ inputs, expected, status }) => {
    const found = landed(usPart135, ruled({ category: 'twin-piston', ...inputs }), dry);
    expectNear(found?.required, 600 / expected, 1e-9);
    expect(found?.factors[0]?.status).toBe(status);
  });
  it.each(wetFactors)('$title', ({ inputs, expected, status }) => {
    const set = setOf(inputs.set);
    expect(factorsOn(set.landing, wet, 0, jet)).toEqual([expected]);
    expect(factorsOn(set.landing, { kind: 'paved', state: 'damp' }, 0, jet)).toEqual([expected]);
    expect(factorsOn(set.landing, wet, 0, turboprop)).toEqual([]);
    expect(landed(set, jet)?.factors[0]?.status).toBe(status);
  });
  it.each(alternates)('beside it at an alternate: $title', ({ inputs, expected, status }) => {
    const { category, basis } = inputs;
    const found = landed(setOf(inputs.set), ruled({ category, basis, kilograms: 9000 }), dry);
    expectNear(found?.alternative?.required, 600 / expected, 1e-9);
    expect(found?.alternative?.factors[0]?.status).toBe(status);
    expectNear(found?.required, 600 / 0.6, 1e-9);
  });
  it.each(jetAlternates)('the same: $title', ({ inputs, expected }) => {
    const found = landed(setOf(inputs.set), jet, dry);
    expect(found?.alternative).toBeUndefined();
    expectNear(found?.required, 600 / expected, 1e-9);
  });
  it.each(otherOperations)('is not applied: $title', ({ inputs, expected }) => {
    const found = setOf(inputs.set).landing.notApplied?.map(({ factor }) => 1 / factor.value);
    expectNear(found?.[0], expected, 1e-15);
  });
  it.each(requiredRunways)('$title', ({ inputs, expected, tolerance }) => {
    const given = asked({ aeroplane: jet });
    const [check] = checksFrom(usPart135.landing, given, { reference: inputs.ld_ft, credited: inputs.ld_ft });
    expectNear(check?.required, expected, tolerance);
  });
  it.each(dispatchFactors)('$title', ({ inputs, expected, tolerance }) => {
    const found = landed(usPart121, jet, { kind: 'paved', state: inputs.state });
    expectNear((found?.required ?? Number.NaN) / 600, expected, tolerance);
  });
});

describe('Part 135, small aeroplanes', () => {
  it.each(['single-piston', 'twin-piston', 'single-turboprop', 'single-electric', 'twin-jet'] as const)(
    'has no factor for %s outside the transport and commuter categories',
    (category) => {
      const found = landed(usPart135, ruled({ category, kilograms: 5669 }), dry);
      expect([found?.required, found?.factors, found?.source]).toEqual([600, [], 'Cfr135s399']);
      expect(codes(usPart135, ruled({ category, kilograms: 5669 }))).toEqual([['takeoff-run', 'passes']]);
    },
  );
  it('has one above 12 500 lb, and its takeoff is not assessed', () => {
    expect(landed(usPart135, ruled({ kilograms: 5669.9 }), dry)?.required).toBe(600);
    const large = ruled({ kilograms: 5670 });
    expectNear(landed(usPart135, large, dry)?.required, 1000, 1e-9);
    expect(codes(usPart135, large)).toEqual([['accelerate-stop', 'not-assessed']]);
  });
  it('has one for a commuter turbine whatever its mass, and the takeoff of the commuter category', () => {
    const commuter = ruled({ category: 'twin-turboprop', basis: 'cs-23-commuter', kilograms: 5000 });
    expectNear(landed(usPart135, commuter, dry)?.required, 1000, 1e-9);
    expect(codes(usPart135, commuter).map(([code]) => code)).toEqual([
      'takeoff-run-all-engines',
      'takeoff-run-engine-out',
      'takeoff-distance-all-engines',
      'takeoff-distance-engine-out',
      'accelerate-stop',
    ]);
  });
});

describe('Part 91', () => {
  it('takes the distances as they are, against TORA and LDA', () => {
    const found = checksFrom(usPart91.takeoff, asked(), { reference: undefined, credited: 600 });
    expect(found.map(({ code, of, against, required }) => [code, of, against, required])).toEqual([
      ['takeoff-run', 'takeoffDistance', 'tora', 600],
    ]);
    const [landing] = checksFrom(usPart91.landing, asked(), { reference: undefined, credited: 700 });
    expect([landing?.against, landing?.required, landing?.source]).toEqual(['lda', 700, 'Cfr91s103']);
    expect(factorsOn(usPart91.landing, wet)).toBeUndefined();
  });
  it('asks 91.605 of turbine aeroplanes of the transport category, and of no others', () => {
    const bySource = (aeroplane: RuledAeroplane) =>
      checksFrom(usPart91.takeoff, asked({ aeroplane }), { reference: undefined, credited: 600 })[0]?.source;
    expect(bySource(jet)).toBe('Cfr91s605');
    expect(bySource({ ...jet, certification: { ...jet.certification, basis: 'cs-23-commuter' } })).toBe('Cfr91s103');
    expect(bySource({ ...jet, category: 'twin-piston' })).toBe('Cfr91s103');
    expect(bySource(turboprop)).toBe('Cfr91s605');
  });
});

describe('Part 121 applies to', () => {
  const why = (some: Partial<RuledAeroplane>) => refusal(usPart121, { ...jet, ...some }, 'landing');
  it('more than one engine', () => {
    expect(why({ engines: 2 })).toBeUndefined();
    expect(why({ engines: 1 })).toMatch(/more than one engine/);
  });
  it('turbine engines', () => {
    expect(why({ category: 'twin-turboprop' })).toBeUndefined();
    expect(why({ category: 'twin-piston' })).toMatch(/turbine/);
  });
  it('the transport and the commuter category', () => {
    const of = (basis: RuledAeroplane['certification']['basis']) =>
      why({ certification: { ...jet.certification, basis } });
    expect([of('cs-25'), of('cs-23-commuter')]).toEqual([undefined, undefined]);
    expect([of('cs-23-amendment-4'), of('none')]).toEqual([
      expect.stringMatching(/transport and commuter/),
      expect.stringMatching(/transport and commuter/),
    ]);
  });
});
