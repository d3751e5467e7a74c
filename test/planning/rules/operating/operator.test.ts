import { describe, expect, it } from 'vitest';
import type { OperatorFactor, OperatorRules, Surface } from '../../../../src/planning/question.ts';
import { euClassA } from '../../../../src/planning/rules/operating/eu-class-a.ts';
import { euClassB } from '../../../../src/planning/rules/operating/eu-class-b.ts';
import { euClassC } from '../../../../src/planning/rules/operating/eu-class-c.ts';
import { operatorFaults, operatorRuleSet, operatorRules } from '../../../../src/planning/rules/operating/operator.ts';
import { unfactored } from '../../../../src/planning/rules/operating/unfactored.ts';
import { usLandingByConditionCode } from '../../../../src/planning/rules/operating/us-landing-by-condition-code.ts';
import { asked, checksFrom, factorsOn, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const own = (...factors: OperatorFactor[]): OperatorRules => ({ name: 'Brindlecombe Air', factors });
const overall = (check: string, overallFactor: number) => ({ check, overallFactor });
const onGrass = (surfaceFactor: number, state: Surface['state'] = 'wet') =>
  ({ phase: 'takeoff', kind: 'grass', state, surfaceFactor }) as const;
const alone = { tora: 1000, toda: undefined, asda: undefined };
const faults = (...[rules, phase, given, factors]: Parameters<typeof operatorFaults>) =>
  operatorFaults(rules, phase, given, factors).map(({ pointer, allowed }) => [pointer, allowed]);

describe('an operator\u2019s own rules', () => {
  it('have a name of their own and say what they are based on', () => {
    const set = operatorRuleSet(euClassB, own(overall('landing-distance', 2)));
    expect(set).toMatchObject({ id: 'operator', phrase: 'under the factors of Brindlecombe Air' });
    expect(set.title).toContain(euClassB.title);
  });
  it('put a larger overall factor in place of the rule\u2019s, and leave every other check as it is', () => {
    const rules = operatorRules(euClassB.takeoff, 'takeoff', own(overall('takeoff-distance', 1.4)));
    const given = asked({ published: { tora: 1000, toda: 1200, asda: 1300 } });
    const checks = checksFrom(rules, given, { reference: 500, credited: 500 });
    expect(checks.map(({ code, required }) => [code, required])).toEqual([
      ['takeoff-run', 500],
      ['takeoff-distance', 700],
      ['accelerate-stop', 650],
    ]);
    expect(checks[1]?.factors.at(-1)).toMatchObject({ source: 'OperatorsOwn', status: 'judgement' });
  });
  it('put a larger surface factor in place of the rule\u2019s on firm ground in that state, and nowhere else', () => {
    const rules = operatorRules(euClassB.takeoff, 'takeoff', own(onGrass(1.5)));
    expect(factorsOn(rules, { kind: 'grass', state: 'wet' }, 0.01)).toEqual([1.5, 1.05]);
    expect(factorsOn(rules, { kind: 'grass', state: 'dry' })).toEqual([1.2]);
    expect(factorsOn(rules, { kind: 'grass', state: 'wet', firmness: 'soft' })).toBeUndefined();
    expect(
      factorsOn(operatorRules(euClassB.landing, 'landing', own(onGrass(1.5))), { kind: 'grass', state: 'wet' }),
    ).toEqual([1.15, 1.15]);
  });
  it('give a set without factors one', () => {
    const rules = operatorRules(unfactored.takeoff, 'takeoff', own(overall('takeoff-run', 1.1), onGrass(1.4)));
    const given = asked({ surface: { kind: 'grass', state: 'wet' } });
    const [run, whole] = checksFrom(rules, given, { reference: 500, credited: 600 });
    expectNear(run?.required, 500 * 1.4 * 1.1, 1e-9);
    expectNear(whole?.required, 500 * 1.4, 1e-9);
  });
  it('never assess what the rules leave not assessed', () => {
    const rules = operatorRules(
      euClassC.takeoff,
      'takeoff',
      own(overall('takeoff-run', 3), { ...onGrass(2), state: 'dry' }),
    );
    const given = asked({ aeroplane: ruled({ kilograms: 6000 }), surface: { kind: 'grass', state: 'dry' } });
    expect(checksFrom(rules, given, { reference: 100, credited: 100 })[0]?.result).toBe('not-assessed');
  });
  it('keep the larger of two where the rule has one on the runway as it is and one on the reference', () => {
    const rules = euClassB.landingInFlight;
    if (rules === undefined) throw new Error('class B knows both stages');
    const mine = own(overall('landing-distance', 1.3));
    expect(operatorFaults(rules, 'landing', asked(), mine)).toEqual([]);
    const [check] = checksFrom(operatorRules(rules, 'landing', mine), asked(), { reference: 700, credited: 700 });
    expectNear(check?.required, 700 * 1.3, 1e-9);
    expectNear(check?.alternative?.required, 1000, 1e-9);
  });
  it('show no other reading that asks for less than theirs', () => {
    const published = { tora: 1000, toda: 1200, asda: 1300 };
    const shown = (factor: number) => {
      const rules = operatorRules(euClassB.takeoff, 'takeoff', own(overall('takeoff-run', factor)));
      return checksFrom(rules, asked({ published }), { reference: 500, credited: 500 })[0]?.alternative?.required;
    };
    expect([shown(1.2), shown(1.25), shown(1.3)]).toEqual([625, undefined, undefined]);
  });

  it('are refused by name where a factor is below the rule\u2019s, and not where it equals it', () => {
    const at = (factor: number) =>
      operatorFaults(euClassB.takeoff, 'takeoff', asked({ published: alone }), own(overall('takeoff-run', factor)));
    expect(at(1.25)).toEqual([]);
    const [fault] = at(1.249);
    expect(fault).toMatchObject({ code: 'out-of-range', pointer: '/ruleSet/factors/0/overallFactor', received: 1.249 });
    expect(fault?.message).toBe(
      'The operator\u0027s factor 1.249 is below 1.25 of the rules it is based on: takeoff distance against TORA where there is neither stopway nor clearway, (b)(1).',
    );
    expect(fault?.allowed).toBe('1.25 or more');
  });
  it('are refused by the case that the question is in: what is declared, and the engines', () => {
    const run = own(overall('takeoff-run', 1.1));
    const more = { tora: 1000, toda: 1200, asda: 1300 };
    expect(faults(euClassB.takeoff, 'takeoff', asked({ published: alone }), run)).toHaveLength(1);
    expect(faults(euClassB.takeoff, 'takeoff', asked({ published: more }), run)).toEqual([]);
    const landing = own(overall('landing-distance', 1.5));
    const of = (category: 'twin-jet' | 'twin-turboprop') =>
      faults(euClassA.landing, 'landing', asked({ aeroplane: ruled({ category }) }), landing);
    expect(of('twin-jet')).toEqual([['/ruleSet/factors/0/overallFactor', '1.6667 or more']]);
    expect(of('twin-turboprop')).toEqual([]);
  });
  it('are refused where a surface factor is below the product of the rule\u2019s on that surface', () => {
    const given = (surface: Surface) => asked({ surface });
    const at = (factor: number, surface: Surface) =>
      faults(euClassB.takeoff, 'takeoff', given(surface), own(onGrass(factor)));
    expect(at(1.3, { kind: 'grass', state: 'wet' })).toEqual([]);
    expect(at(1.29, { kind: 'grass', state: 'wet' })).toEqual([['/ruleSet/factors/0/surfaceFactor', '1.3 or more']]);
    expect(at(1.29, { kind: 'grass', state: 'dry' })).toEqual([]);
    const landing = own({ ...onGrass(1.32), phase: 'landing' });
    const onWet = (more: Partial<Surface>) =>
      faults(euClassB.landing, 'landing', given({ kind: 'grass', state: 'wet', ...more }), landing);
    expect(onWet({})[0]?.[1]).toBe('1.3225 or more');
    expect(onWet({ grass: 'short' })[0]?.[1]).toBe('1.6 or more');
    expect(faults(euClassB.takeoff, 'takeoff', given({ kind: 'grass', state: 'wet' }), landing)).toEqual([]);
  });
  it('may be anything from 1 on where the rule has no factor', () => {
    expect(faults(unfactored.takeoff, 'takeoff', asked(), own(overall('takeoff-run', 1)))).toEqual([]);
    const given = asked({ conditionCode: 3 });
    expect(faults(usLandingByConditionCode.landing, 'landing', given, own(overall('landing-distance', 1)))).toEqual([]);
    expect(faults(usLandingByConditionCode.takeoff, 'takeoff', given, own(overall('landing-distance', 1)))).toEqual([]);
  });
});
