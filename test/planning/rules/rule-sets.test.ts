import { describe, expect, it } from 'vitest';
import { unfactored } from '../../../src/planning/rules/operating/unfactored.ts';
import { ruleSetOf, ruleSets } from '../../../src/planning/rules/rule-sets.ts';
import { references } from '../../../src/references.ts';
import { statedTrainer } from '../../support/takeoff-question.ts';

describe('the rule sets', () => {
  it('have ids in kebab-case, each once, found again by id', () => {
    expect(ruleSets.map(({ id }) => id)).toEqual(['unfactored', 'eu-class-b']);
    for (const set of ruleSets) expect(ruleSetOf(set.id)).toBe(set);
    expect(ruleSetOf('toString')).toBeUndefined();
  });
  it('source every figure', () => {
    const declared = { tora: 1000, toda: 1200, asda: 1300 };
    for (const { source, windCredit, thinMargin, takeoff } of ruleSets) {
      const factors = takeoff.runwayFactors({ kind: 'grass', state: 'wet' }, 0.01) ?? [];
      const requirements = takeoff.requirements({ published: declared, credited: declared });
      const overall = requirements.flatMap(({ factor }) => factor ?? []);
      for (const one of [windCredit, thinMargin, ...requirements, ...factors, ...overall]) {
        expect(Object.keys(references)).toContain(one.source);
      }
      expect(Object.keys(references)).toContain(source);
      for (const { because, status } of [...factors, ...overall]) {
        expect(because).not.toBe('');
        expect(['read', 'secondary', 'memory', 'derived', 'judgement']).toContain(status);
      }
    }
  });
});

describe('unfactored', () => {
  it('compares the roll with TORA and the distance with TODA, without a factor', () => {
    const lengths = { tora: 1000, toda: undefined, asda: undefined };
    const requirements = unfactored.takeoff.requirements({ published: lengths, credited: lengths });
    expect(requirements.map(({ code, of, against, factor }) => [code, of, against, factor])).toEqual([
      ['takeoff-run', 'groundRoll', 'tora', undefined],
      ['takeoff-distance', 'takeoffDistance', 'toda', undefined],
    ]);
    expect(unfactored.takeoff.runwayFactors({ kind: 'grass', state: 'wet' }, 0.02)).toBeUndefined();
    expect(unfactored.takeoff.startsFrom).toBe('credited');
    expect(unfactored.doesNotApply({ ...statedTrainer, category: 'twin-jet' })).toBeUndefined();
  });
});
