import { describe, expect, it } from 'vitest';
import type { Check } from '../../src/planning/answer.ts';
import { type Deciding, outcomeOf, thinBecause } from '../../src/planning/outcome.ts';

const check = (required: number, available?: number, of = 'takeoffDistance'): Check => ({
  code: 'takeoff-distance',
  of,
  startsFrom: 'credited',
  factors: [],
  unit: 'distance',
  required,
  available,
  margin: available === undefined ? undefined : available - required,
  marginRatio: available === undefined ? undefined : (available - required) / required,
  result: available === undefined ? 'not-assessed' : available >= required ? 'passes' : 'fails',
  source: 'Judgement',
});
const base: Deciding = {
  notReached: undefined,
  doesNotApply: undefined,
  noSurface: false,
  checks: [check(500, 1000)],
  roll: 300,
  rollAvailable: 1000,
  thinRatio: 0.1,
  highOver: () => 1.3,
};
const never = { outcome: 'ground-speed-not-positive', headwind: 40, liftOffSpeed: 30 } as const;

describe('the outcome', () => {
  it.each<[string, Partial<Deciding>]>([
    ['enough', {}],
    ['ground-speed-not-positive', { notReached: never }],
    ['rule-set-does-not-apply', { doesNotApply: 'it is a jet' }],
    ['no-data-for-this-surface', { noSurface: true }],
    ['roll-longer-than-runway', { roll: 1000.00001 }],
    ['enough', { roll: 1000.0000005 }],
    ['enough', { roll: undefined }],
    ['enough', { rollAvailable: undefined }],
    ['not-enough', { checks: [check(500, 1000), check(500, 499)] }],
    ['nothing-to-compare', { checks: [check(500, 1000), check(500)] }],
    ['nothing-to-compare', { checks: [] }],
    ['enough-but-thin', { checks: [check(500, 549)] }],
    ['enough-but-thin', { checks: [check(500, 649)] }],
    ['enough', { checks: [check(500, 650)] }],
  ])('is %s with %j changed', (outcome, change) => {
    expect(outcomeOf({ ...base, ...change })).toBe(outcome);
  });
  it('lets the more serious hide the less: no distance, rules, surface, roll, failing, missing', () => {
    const layers: [string, Partial<Deciding>][] = [
      ['nothing-to-compare', { checks: [check(500)] }],
      ['not-enough', { checks: [check(500), check(500, 400)] }],
      ['roll-longer-than-runway', { roll: 2000 }],
      ['no-data-for-this-surface', { noSurface: true }],
      ['rule-set-does-not-apply', { doesNotApply: 'it is a jet' }],
      ['ground-speed-not-positive', { notReached: never }],
    ];
    let all = base;
    for (const [outcome, change] of layers) {
      all = { ...all, ...change };
      expect(outcomeOf(all)).toBe(outcome);
    }
  });
});

describe('thin', () => {
  const high = (of: string) => (of === 'groundRoll' ? 1.5 : 1.3);
  it('turns at the figure of the rule set', () => {
    expect(thinBecause([check(500, 549.9)], 0.1, () => 1)?.kind).toBe('margin');
    expect(thinBecause([check(500, 550)], 0.1, () => 1)).toBeUndefined();
    expect(thinBecause([check(500, 574.9)], 0.15, () => 1)?.kind).toBe('margin');
  });
  it('turns where the high end of the band of its own distance would not pass, and names that check', () => {
    const roll = check(500, 700, 'groundRoll');
    const found = thinBecause([check(500, 651), roll], 0.1, high);
    expect([found?.kind, found?.check, found?.requiredAtHigh]).toEqual(['band', roll, 750]);
    expect(thinBecause([check(500, 650), check(500, 750, 'groundRoll')], 0.1, high)).toBeUndefined();
  });
});
