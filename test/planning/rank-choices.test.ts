import { describe, expect, it } from 'vitest';
import type { Check, Outcome } from '../../src/planning/answer.ts';
import { type Ranked, rankChoices } from '../../src/planning/rank-choices.ts';

/** A choice with one check of this required and available length [m]. */
function choice(outcome: Outcome, required?: number, available?: number): Ranked {
  if (required === undefined || available === undefined) return { outcome };
  const margin = available - required;
  const check: Check = {
    code: 'takeoff-run',
    of: 'takeoffDistance',
    startsFrom: 'credited',
    factors: [],
    unit: 'distance',
    required,
    available,
    margin,
    marginRatio: margin / required,
    result: margin < 0 ? 'fails' : 'passes',
    source: 'Judgement',
  };
  return { outcome, assessment: { ruleSet: 'unfactored', checks: [check] } };
}

describe('rankChoices', () => {
  it('puts the largest least margin in per cent first, not the longest spare length', () => {
    expect(rankChoices([choice('enough', 1000, 1300), choice('enough', 400, 600)])).toEqual([1, 0]);
  });

  it('ranks those not enough by the least shortfall as a length, not in per cent', () => {
    expect(rankChoices([choice('not-enough', 500, 400), choice('not-enough', 2000, 1950)])).toEqual([1, 0]);
  });

  it('keeps the groups apart: enough or thin, not all assessed, not enough, without distances', () => {
    const asked = [
      choice('never-reaches-lift-off-speed'),
      choice('not-enough', 800, 799),
      choice('nothing-to-compare', 500, 900),
      choice('enough-but-thin', 800, 810),
      choice('roll-longer-than-runway', 1500, 700),
      choice('enough', 800, 1200),
    ];
    expect(rankChoices(asked)).toEqual([5, 3, 2, 1, 4, 0]);
  });

  it('keeps the order of the question where choices are equal', () => {
    const same = choice('enough', 500, 700);
    expect(rankChoices([same, same, same])).toEqual([0, 1, 2]);
  });

  it('takes the least of several checks', () => {
    const two = choice('enough', 500, 1500);
    const tight = choice('enough', 500, 550).assessment?.checks[0] as Check;
    const both: Ranked = {
      outcome: 'enough',
      assessment: { ruleSet: 'unfactored', checks: [...(two.assessment?.checks ?? []), tight] },
    };
    expect(rankChoices([both, choice('enough', 500, 600)])).toEqual([1, 0]);
  });
});
