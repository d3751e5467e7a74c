import { describe, expect, it } from 'vitest';
import { slopeProfile } from '../../src/performance/slope-profile.ts';
import type { Check } from '../../src/planning/answer.ts';
import type { Question, Surface } from '../../src/planning/question.ts';
import { landed, plainLanding } from '../support/landing-question.ts';
import { expectRatio } from '../support/near.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

type Ground = Pick<Question['runway'], 'slope' | 'profile'>;

const level: Ground = { slope: 0 };
const sets = ['eu-class-b', 'uk-private-factors'] as const;
/** What factors speak of and physics exceeds, what they alone decide, and what they do not speak of. */
const surfaces: readonly Surface[] = [
  { kind: 'paved', state: 'dry' },
  { kind: 'paved', state: 'wet' },
  { kind: 'grass', state: 'dry', grass: 'long' },
  { kind: 'grass', state: 'wet', grass: 'long' },
  { kind: 'gravel', state: 'dry' },
  { kind: 'paved', state: 'contaminated', contaminant: { kind: 'compacted-snow' } },
];
const cases = sets.flatMap((ruleSet) => surfaces.map((surface) => [ruleSet, surface] as const));
const lengths = { tora: 1500, toda: 1600, asda: 1550, lda: 1500 };

const takeoffChecks = (ruleSet: string, surface: Surface, ground: Ground): readonly Check[] =>
  answered(changed(plainQuestion, { runway: { surface, declared: lengths, ...ground }, question: { ruleSet } }))
    .assessment?.checks ?? [];
const landingChecks = (ruleSet: string, surface: Surface, ground: Ground, stage = {}): readonly Check[] =>
  landed(changed(plainLanding, { runway: { surface, declared: lengths, ...ground }, question: { ruleSet, ...stage } }))
    .assessment?.checks ?? [];

/** Falls first and rises later, to a net rise of 1 m: the roll of a takeoff is over before it rises. */
const hollow: Ground = { slope: 1 / 1500, profile: slopeProfile([0, 700, 1500], [100, 90, 101], 0) };
/** Rises first and falls later, to a net fall of 1 m: a landing stops before it falls. */
const hump: Ground = { slope: -1 / 1500, profile: slopeProfile([0, 800, 1500], [100, 112, 99], 0) };

function expectNoneShorter(found: readonly Check[], onLevel: readonly Check[]): void {
  expect(found.map(({ code }) => code)).toEqual(onLevel.map(({ code }) => code));
  let compared = 0;
  for (const [i, { required }] of found.entries()) {
    const asked = onLevel[i]?.required;
    if (required === undefined || asked === undefined) continue;
    expect(required).toBeGreaterThanOrEqual(asked - 1e-9);
    compared += 1;
  }
  expect(compared).toBeGreaterThan(0);
}

describe('a slope that helps, under rules that have a factor for one that does not', () => {
  it.each(cases)('requires no less of a takeoff under %s on %j', (ruleSet, surface) => {
    const onLevel = takeoffChecks(ruleSet, surface, level);
    for (const ground of [{ slope: -0.01 }, { slope: -0.04 }, hollow]) {
      expectNoneShorter(takeoffChecks(ruleSet, surface, ground), onLevel);
    }
  });
  it.each(cases)('requires no less of a landing under %s on %j, before departure or in flight', (ruleSet, surface) => {
    for (const stage of [{}, { stage: 'in-flight' as const }]) {
      const onLevel = landingChecks(ruleSet, surface, level, stage);
      for (const ground of [{ slope: 0.01 }, { slope: 0.04 }, hump]) {
        expectNoneShorter(landingChecks(ruleSet, surface, ground, stage), onLevel);
      }
    }
  });

  it('is shown beside the level runway that is taken, with the reason', () => {
    const gravel: Surface = { kind: 'gravel', state: 'dry' };
    const [check] = takeoffChecks('eu-class-b', gravel, { slope: -0.02 });
    const [onLevel] = takeoffChecks('eu-class-b', gravel, level);
    expect([check?.startsFrom, onLevel?.startsFrom]).toEqual(['level', 'credited']);
    expectRatio(check?.required, onLevel?.required ?? Number.NaN, 1e-12);
    const beside = check?.furtherAlternatives?.at(-1) ?? check?.alternative;
    expect([beside?.startsFrom, beside?.because]).toEqual([
      'credited',
      'the rules give no credit for a slope that helps',
    ]);
    expect(beside?.distance).toBeLessThan(check?.distance ?? 0);
  });
  it('leaves the distances as stated as they are', () => {
    const asked = changed(plainQuestion, { runway: { slope: -0.02 }, question: { ruleSet: 'eu-class-b' } });
    const plain = changed(asked, { question: { ruleSet: 'unfactored' } });
    expect(answered(asked).distances).toEqual(answered(plain).distances);
  });
  it('is counted by rules that have no factor for slope', () => {
    const of = (slope: number) => takeoffChecks('unfactored', { kind: 'paved', state: 'dry' }, { slope })[1]?.required;
    expect(of(-0.02)).toBeLessThan(of(0) ?? 0);
  });
});
