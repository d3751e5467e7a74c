import { describe, expect, it } from 'vitest';
import type { Lengths } from '../../../../src/planning/declared-distances.ts';
import { contaminantKinds, type Surface } from '../../../../src/planning/question.ts';
import { euClassB } from '../../../../src/planning/rules/operating/eu-class-b.ts';
import { requirements } from '../../../../src/planning/rules/requirements.ts';
import { runwayFactors } from '../../../../src/planning/rules/runway-factors.ts';
import {
  chains,
  listed,
  listedOnRunways,
  overallFactors,
  surfaceFactors,
} from '../../../published/eu-class-b-takeoff.ts';
import { asked, checksFrom, factorsOn } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { takeoff } = euClassB;
const alone: Lengths = { tora: 1000, toda: undefined, asda: undefined };
const lengths = (more: string): Lengths => (more === 'none' ? alone : { tora: 1000, toda: 1200, asda: 1300 });
const asks = (published: Lengths) => requirements(takeoff, asked({ published }));
const factors = (surface: Surface, slope = 0) => factorsOn(takeoff, surface, slope);

describe('class B, takeoff', () => {
  it.each(overallFactors)('$title', ({ inputs, expected }) => {
    const found = asks(lengths(inputs.more)).find(({ code }) => code === inputs.check);
    expect(found?.factor?.value).toBe(expected);
    expect(found?.of).toBe('takeoffDistance');
  });
  it.each(surfaceFactors)('$title', ({ inputs, expected, status }) => {
    const [factor] = runwayFactors(takeoff, asked({ surface: inputs })) ?? [];
    expect(factor?.value).toBe(expected);
    expect(factor?.status).toBe(status);
  });
  it.each(chains)('$title', ({ inputs, expected, tolerance }) => {
    const given = asked({
      published: lengths(inputs.more),
      surface: { kind: 'grass', state: inputs.state },
      slope: inputs.slope,
    });
    const checks = checksFrom(takeoff, given, { reference: inputs.tod50_m, credited: undefined });
    expectNear(checks.find(({ code }) => code === inputs.check)?.required, expected, tolerance);
  });
  it.each(listed)('$title', ({ inputs, expected, tolerance }) => {
    const phase = inputs.overall === 'landing-distance' ? euClassB.landing : takeoff;
    const found = requirements(phase, asked({ published: lengths(inputs.more) }));
    expectNear(found.find(({ code }) => code === inputs.overall)?.factor?.value, expected, tolerance);
  });
  it.each(listedOnRunways)('$title', ({ inputs, expected, tolerance }) => {
    const { phase, kind, state, slope } = inputs;
    const product = factorsOn(euClassB[phase], { kind, state }, slope)?.reduce((one, other) => one * other, 1);
    expectNear(product, expected, tolerance);
  });

  it('reads (b)(1) where nothing lies beyond the run, and (b)(2) with (b)(1) beside it elsewhere', () => {
    const codes = (tora: number, toda?: number, asda?: number) => asks({ tora, toda, asda }).map(({ code }) => code);
    expect(codes(1000)).toEqual(['takeoff-run']);
    expect(codes(1000, 1000, 1000)).toEqual(['takeoff-run']);
    const all = ['takeoff-run', 'takeoff-distance', 'accelerate-stop'];
    expect(codes(1000, 1001, 1000)).toEqual(all);
    expect(codes(1000, 1000, 1001)).toEqual(all);
    expect(codes(1000, 1000)).toEqual(all);
    expect(codes(1000, undefined, 1000)).toEqual(all);
    const [run] = asks({ tora: 1000, toda: 1200, asda: 1000 });
    expect(run?.alternatives?.map(({ factor }) => factor.value)).toEqual([1.25]);
    expect(asks(alone)[0]?.alternatives).toBeUndefined();
  });
  it('has no factor for what lies on a runway, whatever its state is called', () => {
    for (const kind of contaminantKinds) {
      for (const state of ['dry', 'damp', 'wet'] as const) {
        for (const phase of [takeoff, euClassB.landing]) {
          const onPavement = factorsOn(phase, { kind: 'paved', state, contaminant: { kind } });
          const onGrass = factorsOn(phase, { kind: 'grass', state, contaminant: { kind } });
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
      { kind: 'grass', state: 'wet', firmness: 'soft' },
      { kind: 'gravel', state: 'dry' },
      { kind: 'dirt', state: 'wet' },
      { kind: 'snow', state: 'dry' },
      { kind: 'ice', state: 'dry' },
    ];
    for (const surface of silent) expect(factors(surface), JSON.stringify(surface)).toBeUndefined();
  });
  it('adds 5 % for each 1 % uphill, in a straight line, and nothing downhill', () => {
    const at = (slope: number) => factors({ kind: 'paved', state: 'dry' }, slope);
    expect([at(-0.02), at(0)]).toEqual([[], []]);
    const values = [0.004, 0.01, 0.02, 0.03].map((slope) => at(slope)?.[0]);
    for (const [i, expected] of [1.02, 1.05, 1.1, 1.15].entries()) expectNear(values[i], expected, 1e-12);
  });
});
