import { describe, expect, it } from 'vitest';
import { unfactored } from '../../../../src/planning/rules/operating/unfactored.ts';
import { asked, checksFrom, factorsOn, refusal, ruled } from '../../../support/asked.ts';

describe('unfactored', () => {
  it('compares the roll with TORA, the distance with TODA and the landing distance with LDA, without a factor', () => {
    const checks = [unfactored.takeoff, unfactored.landing].flatMap((rules) =>
      checksFrom(rules, asked(), { reference: undefined, credited: 600 }),
    );
    expect(checks.map(({ code, of, against, factors, required }) => [code, of, against, factors, required])).toEqual([
      ['takeoff-run', 'groundRoll', 'tora', [], 600],
      ['takeoff-distance', 'takeoffDistance', 'toda', [], 600],
      ['landing-distance', 'landingDistance', 'lda', [], 600],
    ]);
    expect(factorsOn(unfactored.takeoff, { kind: 'grass', state: 'wet' }, 0.02)).toBeUndefined();
    expect(refusal(unfactored, ruled({ category: 'twin-jet' }), 'takeoff')).toBeUndefined();
  });
});
