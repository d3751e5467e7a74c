import { describe, expect, it } from 'vitest';
import { ruleSetFigures } from '../../src/contract/rule-set-figures.ts';
import { ruleSetList } from '../../src/contract/rule-set-list.ts';
import { toRuleSetList } from '../../src/contract/to-rule-set-list.ts';
import { euClassB } from '../../src/planning/rules/operating/eu-class-b.ts';
import type { RuleSet } from '../../src/planning/rules/rule-set.ts';
import { ruleSets } from '../../src/planning/rules/rule-sets.ts';

const text = (set: RuleSet) => JSON.stringify(ruleSetFigures(set));
const held = text(euClassB);

/** Every number in a tree with the path to it. */
function numbers(node: unknown, path: readonly string[] = []): (readonly string[])[] {
  if (typeof node === 'number') return [path];
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([name, child]) => numbers(child, [...path, name]));
}

/** The same tree with one number a little larger; functions stay. */
function nudged<T>(node: T, [step, ...rest]: readonly string[]): T {
  if (step === undefined) return ((node as number) + 1e-6) as T;
  const inner = nudged((node as Record<string, unknown>)[step], rest);
  if (Array.isArray(node)) return node.map((one, i) => (String(i) === step ? inner : one)) as T;
  return { ...node, [step]: inner };
}

describe('the figures behind the digest of the rules', () => {
  it('change with every number of every rule set', () => {
    for (const set of ruleSets) {
      const before = text(set);
      const paths = numbers(set);
      expect(paths.length).toBeGreaterThan(5);
      for (const path of paths) expect(text(nudged(set, path)), `${set.id} ${path.join('/')}`).not.toBe(before);
    }
  }, 120_000);
  it('change where a condition lets in another aeroplane, another surface or another case', () => {
    const [, , seats] = euClassB.appliesTo;
    if (seats === undefined) throw new Error('class B has three conditions');
    const all = { ...seats, holds: () => true };
    expect(text({ ...euClassB, appliesTo: [...euClassB.appliesTo.slice(0, 2), all] })).not.toBe(held);
    const { landing } = euClassB;
    const [dry, ...others] = landing.surfaces;
    if (dry === undefined) throw new Error('class B speaks of dry pavement');
    const anything = { ...dry, holds: () => true };
    expect(text({ ...euClassB, landing: { ...landing, surfaces: [anything, ...others] } })).not.toBe(held);
    const readings = euClassB.takeoff.readings.slice(1);
    expect(text({ ...euClassB, takeoff: { ...euClassB.takeoff, readings } })).not.toBe(held);
  });
});

describe('the list of rule sets', () => {
  const list = toRuleSetList(ruleSets);
  it('is what its schema says, and names every set and the operator\u2019s own', () => {
    expect(ruleSetList.parse(list)).toEqual(list);
    expect(list.ruleSets.map(({ id }) => id)).toEqual(ruleSets.map(({ id }) => id));
    expect(list.operator.id).toBe('operator');
  });
  it('holds every factor of every set as it is computed with', () => {
    const values = (node: unknown): string[] => {
      if (typeof node !== 'object' || node === null) return [];
      const { code, value, because } = node as Record<string, unknown>;
      const own = typeof value === 'number' && because !== undefined ? [`${code} ${value} ${because}`] : [];
      return [...own, ...Object.values(node).flatMap(values)];
    };
    const listed = values(list).sort();
    expect(listed).toEqual(values(ruleSets).sort());
    expect(listed.length).toBeGreaterThan(100);
  });
});
