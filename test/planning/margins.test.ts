import { describe, expect, it } from 'vitest';
import type { Factor } from '../../src/planning/answer.ts';
import { checkOf, governingCheck } from '../../src/planning/margins.ts';
import type { Requirement } from '../../src/planning/rules/rule-set.ts';

const factor = (code: string, value: number): Factor => ({
  code,
  value,
  because: 'a test',
  source: 'EuAirOps305',
  status: 'read',
});
const overall = factor('overall', 1.15);
const wet = factor('surface', 1.3);
const requirement: Requirement = {
  code: 'takeoff-distance',
  of: 'takeoffDistance',
  against: 'toda',
  factor: overall,
  source: 'EuAirOps305',
};
const declared = (toda?: number) => {
  const lengths = { tora: undefined, toda, asda: undefined };
  return { published: lengths, credited: lengths };
};

describe('a check', () => {
  it('passes where only the arithmetic is short: 600 x 1.3 x 1.15 against 897', () => {
    const check = checkOf(requirement, { reference: 600, credited: undefined }, [wet], declared(897 - 1e-7));
    expect(check.result).toBe('passes');
  });
  it('fails where the runway is short by more than 1e-6 m', () => {
    const check = checkOf(requirement, { reference: 600, credited: undefined }, [wet], declared(897 - 2e-6));
    expect(check.result).toBe('fails');
    expect(check.margin).toBeLessThan(0);
  });
  it('multiplies the reference by surface and overall factor, each once', () => {
    const check = checkOf(requirement, { reference: 600, credited: 600 }, [wet], declared(1000));
    expect(check.required).toBeCloseTo(897, 9);
    expect(check.factors).toEqual([wet, overall]);
    expect(check.startsFrom).toBe('reference');
    expect(check.marginRatio).toBeCloseTo(103 / 897, 12);
  });
  it('takes the credited distance just above the reference times its factors, and not just below', () => {
    const at = (credited: number) => checkOf(requirement, { reference: 600, credited }, [wet], declared(1000));
    expect(at(779.9).startsFrom).toBe('reference');
    expect(at(780.1).startsFrom).toBe('credited');
    expect(at(779.9).alternative?.required).toBeCloseTo(779.9 * 1.15, 9);
    expect(at(780.1).alternative?.required).toBeCloseTo(897, 9);
    expect(at(780.1).required).toBeCloseTo(780.1 * 1.15, 9);
  });
  it('stands on physics alone where the rules do not speak of the surface', () => {
    const check = checkOf(requirement, { reference: undefined, credited: 700 }, undefined, declared(1000));
    expect([check.startsFrom, check.factors, check.alternative]).toEqual(['credited', [overall], undefined]);
  });
  it('shows nothing beside it where both are the same distance', () => {
    const check = checkOf(requirement, { reference: 700, credited: 700 }, [], declared(1000));
    expect([check.startsFrom, check.alternative]).toEqual(['reference', undefined]);
  });
  it('shows the other reading of the rule from the same distance, with its own overall factor in place of the first', () => {
    const other = factor('overall', 1.25);
    const two = { ...requirement, alternatives: [{ factor: other, because: 'the other paragraph' }] };
    const check = checkOf(two, { reference: 600, credited: 500 }, [wet], declared(1000));
    expect(check.alternative).toEqual({
      startsFrom: 'reference',
      distance: 600,
      factors: [wet, other],
      required: 600 * 1.3 * 1.25,
      because: 'the other paragraph',
    });
  });
  it('shows both the rule\u2019s other reading and the one of factors or physics that was not taken', () => {
    const other = factor('overall', 1.25);
    const two = { ...requirement, alternatives: [{ factor: other, because: 'the other paragraph' }] };
    const check = checkOf(two, { reference: 600, credited: 900 }, [wet], declared(2000));
    expect([check.alternative?.startsFrom, check.alternative?.required]).toEqual(['credited', 900 * 1.25]);
    expect(check.furtherAlternatives?.map((one) => [one.startsFrom, one.required])).toEqual([
      ['reference', 600 * 1.3 * 1.15],
    ]);
    const three = { ...requirement, alternatives: [{ factor: factor('surface', 1.2), because: 'another print' }] };
    const byPhysics = checkOf(three, { reference: 600, credited: 900 }, [wet], declared(1));
    expect(byPhysics.alternative?.because).toMatch(/ask for less$/);
  });
  it('takes another overall factor on the runway as it is where the rule has one', () => {
    const two = { ...requirement, onRunway: factor('overall', 1.05) };
    const at = (credited: number) => checkOf(two, { reference: 600, credited }, [wet], declared(2000));
    expect(at(850)).toMatchObject({ startsFrom: 'reference', required: 600 * 1.3 * 1.15 });
    expect(at(860)).toMatchObject({ startsFrom: 'credited', required: 860 * 1.05 });
  });
  it('decides by the runway as it is where the rule says so, although the factors ask for more', () => {
    const two = { ...requirement, onRunway: factor('overall', 1.05), runwayDecides: 'the other length' };
    const check = checkOf(two, { reference: 600, credited: 500 }, [wet], declared(2000));
    expect(check).toMatchObject({ startsFrom: 'credited', required: 525 });
    expect([check.alternative?.required, check.alternative?.because]).toEqual([600 * 1.3 * 1.15, 'the other length']);
    const silent = checkOf(two, { reference: 600, credited: undefined }, [wet], declared(2000));
    expect(silent).toMatchObject({ startsFrom: 'reference', required: 600 * 1.3 * 1.15 });
  });
  it('takes the level runway where that is longer than the one as it is, which stands beside it', () => {
    const at = (credited: number, factors?: readonly Factor[]) =>
      checkOf(requirement, { reference: 600, credited, level: 700 }, factors, declared(2000));
    const alone = at(650);
    expect(alone).toMatchObject({ startsFrom: 'level', distance: 700, required: 700 * 1.15 });
    expect(alone.alternative).toMatchObject({ startsFrom: 'credited', required: 650 * 1.15 });
    expect(at(710)).toMatchObject({ startsFrom: 'credited', required: 710 * 1.15, alternative: undefined });
    const byFactors = at(650, [wet]);
    expect(byFactors).toMatchObject({ startsFrom: 'reference', required: 600 * 1.3 * 1.15 });
    expect([byFactors.alternative?.startsFrom, byFactors.furtherAlternatives]).toEqual(['credited', undefined]);
    const byPhysics = at(650, [factor('surface', 1.1)]);
    expect(byPhysics.startsFrom).toBe('level');
    expect(byPhysics.alternative).toMatchObject({ startsFrom: 'reference', required: 600 * 1.1 * 1.15 });
    expect(byPhysics.furtherAlternatives).toMatchObject([{ startsFrom: 'credited', required: 650 * 1.15 }]);
  });
  it('is not assessed where what the rule compares is not computed, with what is available and nothing required', () => {
    const two = { ...requirement, notAssessed: 'not computed' };
    const check = checkOf(two, { reference: undefined, credited: 1 }, [], declared(9));
    expect(check).toMatchObject({ result: 'not-assessed', why: 'not computed', available: 9, factors: [overall] });
    expect([check.required, check.distance, check.startsFrom]).toEqual([undefined, undefined, undefined]);
  });
  it('never passes by a factor that is the least it may be, where physics is silent, and fails by it', () => {
    const least: Factor = { ...wet, atLeast: true };
    const at = (toda: number, credited?: number) =>
      checkOf(requirement, { reference: 600, credited }, [least], declared(toda)).result;
    expect([at(896), at(897), at(897, 600)]).toEqual(['fails', 'not-assessed', 'passes']);
  });
  it('is not assessed where its length is not declared, and still says what would be required', () => {
    const check = checkOf(requirement, { reference: 600, credited: undefined }, [wet], declared());
    expect([check.result, check.why, check.margin]).toEqual(['not-assessed', 'TODA is not declared', undefined]);
    expect(check.required).toBeCloseTo(897, 9);
  });
  it('throws where there is nothing to start from', () => {
    expect(() => checkOf(requirement, { reference: 600, credited: undefined }, undefined, declared(1))).toThrow('from');
  });
});

describe('the governing check', () => {
  const check = (code: string, marginRatio?: number) => ({
    ...checkOf(requirement, { reference: 600, credited: undefined }, [wet], declared(1000)),
    code,
    marginRatio,
  });
  it('has the least margin as a share of what it requires, not the fewest metres', () => {
    expect(governingCheck([check('a', 0.3), check('b', 0.1), check('c', 0.2)])?.code).toBe('b');
  });
  it('is the first of equals, and never one that was not assessed', () => {
    expect(governingCheck([check('a'), check('b', 0.1), check('c', 0.1)])?.code).toBe('b');
    // equal but for the last bit
    expect(governingCheck([check('a', 0.1), check('b', 0.1 - 1e-16)])?.code).toBe('a');
    expect(governingCheck([check('a')])).toBeUndefined();
    expect(governingCheck([])).toBeUndefined();
  });
});
