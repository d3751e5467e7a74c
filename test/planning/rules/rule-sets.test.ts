import { describe, expect, it } from 'vitest';
import { contaminantKinds, type Surface, surfaceKinds, surfaceStates } from '../../../src/planning/question.ts';
import { requirements } from '../../../src/planning/rules/requirements.ts';
import type { PhaseRules, RuleSet } from '../../../src/planning/rules/rule-set.ts';
import { ruleSetOf, ruleSets } from '../../../src/planning/rules/rule-sets.ts';
import { runwayFactors } from '../../../src/planning/rules/runway-factors.ts';
import { windCredit } from '../../../src/planning/wind-credit.ts';
import { references } from '../../../src/references.ts';
import { clearwayShares } from '../../published/declared-distances.ts';
import { creditedWinds } from '../../published/wind.ts';
import { asked, ruled } from '../../support/asked.ts';
import { expectNear } from '../../support/near.ts';

const aeroplanes = [
  ruled(),
  ruled({ category: 'single-piston', engines: 1 }),
  ruled({ category: 'twin-turboprop', basis: 'cs-23-commuter', kilograms: 6000 }),
  ruled({ category: 'twin-jet', basis: 'cs-25', kilograms: 9000 }),
  ruled({ category: 'twin-electric', basis: 'none' }),
];
const phasesOf = ({ takeoff, landing, landingInFlight }: RuleSet): readonly PhaseRules[] =>
  landingInFlight === undefined ? [takeoff, landing] : [takeoff, landing, landingInFlight];
const phases = ruleSets.flatMap((set) => phasesOf(set).map((rules) => ({ set, rules })));

/** Sets that let the wind be taken as given; every other set has the 50 and 150 per cent. */
const setsWithWindAsGiven = ['unfactored'];

describe('the rule sets', () => {
  it('have ids in kebab-case, each once, found again by id', () => {
    expect(ruleSets.map(({ id }) => id)).toEqual([
      'unfactored',
      'uk-private-factors',
      'eu-class-a',
      'eu-class-b',
      'eu-class-c',
      'us-part-91',
      'us-part-121',
      'us-part-135',
      'us-landing-by-condition-code',
    ]);
    for (const set of ruleSets) expect(ruleSetOf(set.id)).toBe(set);
    for (const id of ['toString', 'operator', '']) expect(ruleSetOf(id)).toBeUndefined();
  });

  it('source every figure and every sentence', () => {
    const keys = Object.keys(references);
    const check = (node: unknown, path: string): void => {
      if (typeof node !== 'object' || node === null) return;
      const { source, value, status } = node as Record<string, unknown>;
      if (source !== undefined) expect(keys, path).toContain(source);
      if (typeof value === 'number') {
        expect(source, path).toBeDefined();
        expect(['read', 'secondary', 'memory', 'derived', 'judgement'], path).toContain(status);
      }
      for (const [name, child] of Object.entries(node)) {
        if (typeof child === 'string') expect(child, `${path}/${name}`).not.toBe('');
        check(child, `${path}/${name}`);
      }
    };
    check(ruleSets, '');
  });

  it('call no figure better confirmed than its source, but for a paragraph that the source says was read', () => {
    const rank = { read: 0, secondary: 1, derived: 1, memory: 2, judgement: 2 } as const;
    const better: string[] = [];
    const check = (node: unknown): void => {
      if (typeof node !== 'object' || node === null) return;
      const { source, status } = node as { source?: keyof typeof references; status?: keyof typeof rank };
      if (source !== undefined && status !== undefined && rank[status] < rank[references[source].status]) {
        better.push(`${source} ${status}`);
      }
      for (const child of Object.values(node)) check(child);
    };
    check(ruleSets);
    expect(better).toEqual([]);
  });

  it('have a reading in every case, whatever is declared and whatever the surface', () => {
    const some = [
      { tora: 1000, toda: undefined, asda: undefined },
      { tora: undefined, toda: undefined, asda: undefined },
      { tora: 1000, toda: 1200, asda: 1100 },
    ];
    for (const { rules } of phases) {
      for (const aeroplane of aeroplanes.filter((one) => !rules.appliesTo?.some(({ holds }) => !holds(one)))) {
        for (const published of some) {
          for (const kind of surfaceKinds) {
            for (const state of surfaceStates) {
              const given = asked({ aeroplane, published, surface: { kind, state } });
              expect(requirements(rules, given).length).toBeGreaterThan(0);
            }
          }
        }
      }
    }
  });

  it('have no factor under 1 on any surface, slope or check', () => {
    const contaminants: Surface[] = contaminantKinds.flatMap((kind) =>
      surfaceKinds.map((of) => ({ kind: of, state: 'contaminated' as const, contaminant: { kind } })),
    );
    const plain: Surface[] = surfaceKinds.flatMap((kind) =>
      surfaceStates.flatMap((state) => [
        { kind, state },
        { kind, state, firmness: 'soft' as const },
      ]),
    );
    for (const { rules } of phases) {
      for (const aeroplane of aeroplanes) {
        for (const surface of [...plain, ...contaminants]) {
          for (const slope of [-0.03, 0, 0.03]) {
            const found = runwayFactors(rules, asked({ aeroplane, surface, slope })) ?? [];
            for (const { value } of found) expect(value).toBeGreaterThanOrEqual(1);
          }
        }
      }
      for (const { requirements: asks } of rules.readings) {
        for (const { factor, onRunway } of asks) {
          expect(factor?.value ?? 1).toBeGreaterThanOrEqual(1);
          expect(onRunway?.value ?? 1).toBeGreaterThanOrEqual(1);
        }
      }
    }
  });

  const ruledByWind = phases.filter(({ set }) => !setsWithWindAsGiven.includes(set.id));
  it.each(
    ruledByWind.flatMap(({ set, rules }) =>
      creditedWinds.map((row) => [set.id, rules.source, row.title, rules, row] as const),
    ),
  )('%s, %s: %s', (_, __, ___, { windCredit: credit }, { inputs, expected, tolerance }) => {
    expectNear(windCredit(inputs.component_kt, credit), expected, tolerance);
  });
  it('take the wind as given where no rule speaks of it', () => {
    const others = phases.filter(({ set }) => setsWithWindAsGiven.includes(set.id));
    expect(others).toHaveLength(2);
    for (const { rules } of others) expect(rules.windCredit).toMatchObject({ headwind: 1, tailwind: 1 });
  });
  it.each(ruleSets.flatMap((set) => clearwayShares.map((row) => [set.id, row.title, set, row] as const)))(
    '%s: %s',
    (_, __, { takeoff }, { expected, tolerance }) => {
      expectNear(takeoff.clearwayShare, expected, tolerance);
    },
  );

  it('never credit more of a headwind nor less of a tailwind than there is', () => {
    for (const { rules } of phases) {
      expect(rules.windCredit.headwind).toBeLessThanOrEqual(1);
      expect(rules.windCredit.tailwind).toBeGreaterThanOrEqual(1);
    }
  });
});
