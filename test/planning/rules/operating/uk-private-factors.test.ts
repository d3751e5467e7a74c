import { describe, expect, it } from 'vitest';
import { ukPrivateFactors } from '../../../../src/planning/rules/operating/uk-private-factors.ts';
import { runwayFactors } from '../../../../src/planning/rules/runway-factors.ts';
import {
  landingDryGrass,
  landingSurfaces,
  overallFactors,
  rowsComputedInstead,
  slopes,
  takeoffSurfaces,
} from '../../../published/uk-safety-sense.ts';
import { asked, checksFrom, factorsOn, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { takeoff, landing } = ukPrivateFactors;
const one = (rules: typeof landing, surface: Parameters<typeof factorsOn>[1]) =>
  runwayFactors(rules, asked({ surface }));

describe('the private factors', () => {
  it.each(takeoffSurfaces)('$title', ({ inputs, expected, status }) => {
    expect(one(takeoff, inputs)?.map((found) => [found.value, found.status])).toEqual([[expected, status]]);
  });
  it.each(landingSurfaces)('$title', ({ inputs, expected, status }) => {
    expect(one(landing, inputs)?.map((found) => [found.value, found.status])).toEqual([[expected, status]]);
  });
  it.each(landingDryGrass)('$title', ({ inputs, expected }) => {
    const given = asked({ surface: { kind: 'grass', state: 'dry', grass: 'short' } });
    const [check] = checksFrom(landing, given, { reference: 500, credited: undefined });
    const shown = inputs.shown === 'taken' ? check : check?.alternative;
    expectNear(shown?.required, 500 * expected * 1.43, 1e-9);
    expect(shown?.factors.map(({ value }) => value)).toEqual([expected, 1.43]);
  });
  it.each(slopes)('$title', ({ inputs, expected, tolerance }) => {
    const { phase, slope } = inputs;
    expectNear(factorsOn(ukPrivateFactors[phase], { kind: 'paved', state: 'dry' }, slope)?.[0], expected, tolerance);
  });
  it('take the larger of linear and compound for a slope: linear below a step, compound above, nothing the other way', () => {
    const at = (slope: number) => factorsOn(takeoff, { kind: 'paved', state: 'dry' }, slope);
    expectNear(at(0.01)?.[0], 1.05, 1e-12);
    expect(1.1 ** 0.5).toBeLessThan(1.05);
    expectNear(at(0.04)?.[0], 1.21, 1e-12);
    expect([at(0), at(-0.01)]).toEqual([[], []]);
  });
  it.each(overallFactors)('$title', ({ inputs, expected }) => {
    const checks = checksFrom(ukPrivateFactors[inputs.phase], asked(), { reference: 500, credited: 500 });
    for (const { required } of checks) expectNear(required, 500 * expected, 1e-9);
  });
  it('compare the roll with TORA, the takeoff distance with TODA and the landing distance with LDA', () => {
    const all = [takeoff, landing].flatMap((rules) => checksFrom(rules, asked(), { reference: 1, credited: 1 }));
    expect(all.map(({ code, of, against }) => [code, of, against])).toEqual([
      ['takeoff-run', 'groundRoll', 'tora'],
      ['takeoff-distance', 'takeoffDistance', 'toda'],
      ['landing-distance', 'landingDistance', 'lda'],
    ]);
  });
  it.each(rowsComputedInstead)('is not applied, for it is computed: $title', ({ inputs, expected, status }) => {
    const found = ukPrivateFactors[inputs.phase].notApplied?.find(({ factor }) => factor.code === inputs.code);
    expect([found?.factor.value, found?.factor.status]).toEqual([expected, status]);
    expect(found?.why).toMatch(/computes/);
  });
  it('multiply grass and soft ground, and take 1.60 only where the grass is said to be short', () => {
    expect(factorsOn(takeoff, { kind: 'grass', state: 'dry', firmness: 'soft' })).toEqual([1.2, 1.25]);
    expect(factorsOn(takeoff, { kind: 'grass', state: 'damp', firmness: 'soft' })).toEqual([1.3, 1.25]);
    expect(factorsOn(landing, { kind: 'grass', state: 'wet', firmness: 'soft' })).toEqual([1.35, 1.25]);
    expect(factorsOn(landing, { kind: 'grass', state: 'wet', grass: 'long' })).toEqual([1.35]);
    expect(factorsOn(landing, { kind: 'grass', state: 'damp', grass: 'short' })).toEqual([1.6]);
    expect(factorsOn(takeoff, { kind: 'grass', state: 'wet', grass: 'short' })).toEqual([1.3]);
  });
  it('take snow as 25 % or more, and do not speak of ice, slush, gravel or firm dirt', () => {
    for (const rules of [takeoff, landing]) {
      expect(factorsOn(rules, { kind: 'snow', state: 'dry' })).toEqual([1.25]);
      expect(factorsOn(rules, { kind: 'paved', state: 'contaminated', contaminant: { kind: 'wet-snow' } })).toEqual([
        1.25,
      ]);
      expect(
        factorsOn(rules, { kind: 'paved', state: 'contaminated', contaminant: { kind: 'slush' } }),
      ).toBeUndefined();
      for (const kind of ['ice', 'gravel', 'dirt'] as const)
        expect(factorsOn(rules, { kind, state: 'dry' })).toBeUndefined();
    }
  });
  it('show by a factor of 25 % or more that a runway is too short, and without physics never that it is enough', () => {
    const on = (toda: number, credited: number | undefined) => {
      const published = { tora: toda, toda, asda: toda, lda: toda };
      return checksFrom(takeoff, asked({ surface: { kind: 'snow', state: 'dry' }, published }), {
        reference: 500,
        credited,
      });
    };
    const results = (toda: number, credited?: number) => on(toda, credited).map(({ result }) => result);
    expect(results(831)).toEqual(['fails', 'fails']);
    expect(results(832)).toEqual(['not-assessed', 'not-assessed']);
    expect(results(832, 600)).toEqual(['passes', 'passes']);
    expect(on(832, undefined)[0]?.factors[0]?.atLeast).toBe(true);
  });
});

describe('the private factors apply to', () => {
  const why = (some: Parameters<typeof ruled>[0]) => refusal(ukPrivateFactors, ruled(some), 'takeoff');
  it('propeller-driven aeroplanes', () => {
    expect(why({ category: 'twin-turboprop' })).toBeUndefined();
    expect(why({ category: 'twin-jet' })).toMatch(/propeller-driven/);
  });
  it('up to 5 700 kg', () => {
    expect(why({ kilograms: 5700 })).toBeUndefined();
    expect(why({ kilograms: 5700.1 })).toMatch(/5 700 kg/);
  });
});
