import { describe, expect, it } from 'vitest';
import { categories } from '../../../../src/performance/aeroplane.ts';
import type { Lengths } from '../../../../src/planning/declared-distances.ts';
import { checkOf } from '../../../../src/planning/margins.ts';
import type { Surface } from '../../../../src/planning/question.ts';
import { euClassB } from '../../../../src/planning/rules/operating/eu-class-b.ts';
import { chains, overallFactors, surfaceFactors } from '../../../published/eu-class-b-takeoff.ts';
import { expectNear } from '../../../support/near.ts';
import { statedTrainer } from '../../../support/takeoff-question.ts';

const { takeoff } = euClassB;
const declared = (tora?: number, toda?: number, asda?: number) => {
  const lengths: Lengths = { tora, toda, asda };
  return { published: lengths, credited: lengths };
};
const lengths = (more: string) => (more === 'none' ? declared(1000) : declared(1000, 1200, 1300));
const factors = (surface: Surface, slope = 0) => takeoff.runwayFactors(surface, slope)?.map(({ value }) => value);

describe('class B, takeoff', () => {
  it.each(overallFactors)('$title', ({ inputs, expected }) => {
    const found = takeoff.requirements(lengths(inputs.more)).find(({ code }) => code === inputs.check);
    expect(found?.factor?.value).toBe(expected);
    expect(found?.of).toBe('takeoffDistance');
  });
  it.each(surfaceFactors)('$title', ({ inputs, expected, status }) => {
    const [factor] = takeoff.runwayFactors(inputs, 0) ?? [];
    expect(factor?.value).toBe(expected);
    expect(factor?.status).toBe(status);
  });
  it.each(chains)('$title', ({ inputs, expected, tolerance }) => {
    const known = lengths(inputs.more);
    const requirement = takeoff.requirements(known).find(({ code }) => code === inputs.check);
    if (requirement === undefined) throw new Error(inputs.check);
    const onGrass = takeoff.runwayFactors({ kind: 'grass', state: inputs.state }, inputs.slope);
    const check = checkOf(requirement, { reference: inputs.tod50_m, credited: undefined }, onGrass, known);
    expectNear(check.required, expected, tolerance);
  });

  it('reads (b)(1) where nothing lies beyond the run, and (b)(2) with (b)(1) beside it elsewhere', () => {
    const codes = (known: ReturnType<typeof declared>) => takeoff.requirements(known).map(({ code }) => code);
    expect(codes(declared(1000))).toEqual(['takeoff-run']);
    expect(codes(declared(1000, 1000, 1000))).toEqual(['takeoff-run']);
    const all = ['takeoff-run', 'takeoff-distance', 'accelerate-stop'];
    expect(codes(declared(1000, 1001, 1000))).toEqual(all);
    expect(codes(declared(1000, 1000, 1001))).toEqual(all);
    expect(codes(declared(1000, 1000))).toEqual(all);
    expect(codes(declared(1000, undefined, 1000))).toEqual(all);
    const [run] = takeoff.requirements(declared(1000, 1200, 1000));
    expect(run?.alternative?.factor.value).toBe(1.25);
    expect(takeoff.requirements(declared(1000))[0]?.alternative).toBeUndefined();
  });
  it('decides on what is published, not on what line-up leaves of it', () => {
    const published = { tora: 1000, toda: 1000, asda: 1000 };
    const credited = { tora: 985, toda: 985, asda: 990 };
    expect(takeoff.requirements({ published, credited })).toHaveLength(1);
  });
  it('has no factor for what lies on a runway, whatever its state is called', () => {
    const contaminants = [
      'water',
      'slush',
      'wet-snow',
      'dry-snow',
      'compacted-snow',
      'frost',
      'ice',
      'wet-ice',
    ] as const;
    for (const kind of contaminants) {
      for (const state of ['dry', 'damp', 'wet'] as const) {
        for (const phase of [takeoff, euClassB.landing]) {
          const onPavement = phase.runwayFactors({ kind: 'paved', state, contaminant: { kind } }, 0);
          const onGrass = phase.runwayFactors({ kind: 'grass', state, contaminant: { kind } }, 0);
          expect([onPavement, onGrass], `${state} with ${kind}`).toEqual([undefined, undefined]);
        }
      }
    }
  });
  it('knows dry pavement and firm grass, takes damp as wet, and does not speak of the rest', () => {
    expect(factors({ kind: 'paved', state: 'dry' })).toEqual([]);
    expect(factors({ kind: 'paved', state: 'damp' })).toEqual([1]);
    expect(factors({ kind: 'grass', state: 'damp', firmness: 'firm' })).toEqual([1.3]);
    const silent: Surface[] = [
      { kind: 'paved', state: 'flooded' },
      { kind: 'paved', state: 'contaminated' },
      { kind: 'grass', state: 'flooded' },
      { kind: 'grass', state: 'dry', firmness: 'soft' },
      { kind: 'gravel', state: 'dry' },
      { kind: 'dirt', state: 'wet' },
      { kind: 'snow', state: 'dry' },
      { kind: 'ice', state: 'dry' },
    ];
    for (const surface of silent) expect(factors(surface), JSON.stringify(surface)).toBeUndefined();
  });
  it('adds 5 % for each 1 % uphill, in a straight line, and nothing downhill', () => {
    const slopes = [-0.02, 0, 0.004, 0.01, 0.02, 0.03].map((slope) => factors({ kind: 'paved', state: 'dry' }, slope));
    expect(slopes).toEqual([[], [], [1.02], [1.05], [1.1], [1.15]]);
  });
  it('is for propeller-driven aeroplanes up to 5 700 kg', () => {
    for (const category of categories) {
      const why = euClassB.doesNotApply({ ...statedTrainer, category });
      expect(why === undefined, category).toBe(!category.endsWith('-jet'));
    }
    const heavy = (maximumTakeoff: number) => euClassB.doesNotApply({ ...statedTrainer, masses: { maximumTakeoff } });
    expect(heavy(5700)).toBeUndefined();
    expect(heavy(5700.1)).toMatch(/5 700 kg/);
  });
});
