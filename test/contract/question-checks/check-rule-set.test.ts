import { describe, expect, it } from 'vitest';
import { checkRuleSet } from '../../../src/contract/question-checks/check-rule-set.ts';
import type { RuleSetChoice } from '../../../src/contract/rule-set-choice.ts';

type Own = Exclude<RuleSetChoice, string>;
const own = (factors: Own['factors'], basedOn = 'eu-class-b'): Own => ({ basedOn, name: 'Brindlecombe Air', factors });
const onWetGrass = { phase: 'takeoff', kind: 'grass', state: 'wet', surfaceFactor: 1.4 } as const;

describe('the rule set of a question', () => {
  it('is one of the list, or an operator\u2019s own based on one of it', () => {
    for (const id of ['unfactored', 'us-part-135']) expect(checkRuleSet(id)).toEqual([]);
    expect(checkRuleSet(own([{ check: 'accelerate-stop', overallFactor: 1.4 }, onWetGrass]))).toEqual([]);
    expect(checkRuleSet('eu-class-d')[0]).toMatchObject({
      pointer: '/ruleSet',
      code: 'unknown-id',
      hint: expect.any(String),
    });
    expect(checkRuleSet(own([onWetGrass], 'eu-class-d'))[0]).toMatchObject({
      pointer: '/ruleSet/basedOn',
      code: 'unknown-id',
    });
  });
  it('says how an operator\u2019s own is given where somebody names it by id', () => {
    expect(checkRuleSet('operator')[0]).toMatchObject({ code: 'unknown-id', hint: expect.stringContaining('basedOn') });
  });
  it('has factors for checks that the set computes', () => {
    const at = (check: string, basedOn = 'eu-class-b') => checkRuleSet(own([{ check, overallFactor: 2 }], basedOn));
    expect(at('landing-distance')).toEqual([]);
    expect(at('landing-distanc')[0]).toMatchObject({
      pointer: '/ruleSet/factors/0/check',
      code: 'unknown-id',
      allowed: 'takeoff-run, takeoff-distance, accelerate-stop, landing-distance',
      hint: 'Perhaps landing-distance.',
    });
    expect(at('accelerate-stop', 'unfactored')).toHaveLength(1);
    expect(at('accelerate-stop-all-engines', 'eu-class-a')).toEqual([]);
    expect(at('takeoff-run-all-engines', 'eu-class-a')).toEqual([]);
  });
  it('has one factor for each check and for each surface of a phase', () => {
    const stop = { check: 'accelerate-stop', overallFactor: 1.4 };
    expect(checkRuleSet(own([stop, stop]))[0]).toMatchObject({ pointer: '/ruleSet/factors/1', code: 'contradiction' });
    expect(checkRuleSet(own([onWetGrass, { ...onWetGrass, surfaceFactor: 2 }]))).toHaveLength(1);
    expect(
      checkRuleSet(own([onWetGrass, { ...onWetGrass, phase: 'landing' }, { ...onWetGrass, state: 'dry' }])),
    ).toEqual([]);
  });
});
