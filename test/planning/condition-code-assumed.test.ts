import { describe, expect, it } from 'vitest';
import { conditionCodeAssumed } from '../../src/planning/condition-code-assumed.ts';

describe('condition codes by thirds', () => {
  it('are said to count by the poorest in a takeoff, where they differ', () => {
    const said = conditionCodeAssumed({ given: [5, 3, 4], codes: [5, 3, 4] }, 'takeoff');
    expect(said.map(({ at, value }) => [at, value])).toEqual([['/runway/surface/runwayConditionCode', 3]]);
    expect(said[0]?.because).toMatch(/^5, 3 and 4 are given by thirds; in a takeoff the poorest counts throughout/);
  });
  it('name the poorest that counts, where what lies there is poorer still', () => {
    expect(conditionCodeAssumed({ given: [5, 3, 4], codes: [1, 1, 1] }, 'takeoff')[0]?.value).toBe(1);
  });
  it('need no word where they are alike, are counted third by third, or are not given', () => {
    expect(conditionCodeAssumed({ given: [3, 3, 3], codes: [3, 3, 3] }, 'takeoff')).toEqual([]);
    expect(conditionCodeAssumed({ given: [5, 3, 4], codes: [5, 3, 4] }, 'landing')).toEqual([]);
    expect(conditionCodeAssumed({ given: undefined, codes: undefined }, 'takeoff')).toEqual([]);
    expect(conditionCodeAssumed({ given: undefined, codes: [2, 2, 2] }, 'takeoff')).toEqual([]);
  });
});
