import { describe, expect, it } from 'vitest';
import type { Surface } from '../../../../src/planning/question.ts';
import { euClassB } from '../../../../src/planning/rules/operating/eu-class-b.ts';
import { requirements } from '../../../../src/planning/rules/requirements.ts';
import { runwayFactors } from '../../../../src/planning/rules/runway-factors.ts';
import { chains, surfaceFactors, usableParts, usablePartsWithApproval } from '../../../published/eu-class-b-landing.ts';
import { asked, checksFrom, factorsOn } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { landing } = euClassB;
const [requirement] = requirements(landing, asked());
if (requirement === undefined) throw new Error('class B has a landing check');
const factors = (surface: Surface, slope = 0) => factorsOn(landing, surface, slope);

describe('class B, landing', () => {
  it.each(usableParts)('$title', ({ expected }) => {
    expectNear(1 / (requirement.factor?.value ?? 0), expected, 1e-15);
    expect(requirement).toMatchObject({ code: 'landing-distance', of: 'landingDistance', against: 'lda' });
  });
  it.each(usablePartsWithApproval)('is not applied: $title', ({ expected }) => {
    expect(requirements(landing, asked())).toHaveLength(1);
    expect(1 / (requirement.factor?.value ?? 0)).toBeLessThan(expected);
    expectNear(1 / (landing.notApplied?.[0]?.factor.value ?? 0), expected, 1e-15);
  });
  it.each(surfaceFactors)('$title', ({ inputs, expected, status }) => {
    const found = runwayFactors(landing, asked({ surface: inputs })) ?? [];
    expect(found.map(({ value }) => value)).toEqual([expected]);
    expect(found[0]?.status).toBe(status);
  });
  it.each(chains)('$title', ({ inputs, expected, tolerance }) => {
    const { kind, state, slope } = inputs;
    const given = asked({ surface: { kind, state }, slope });
    const [check] = checksFrom(landing, given, { reference: inputs.ld50_m, credited: undefined });
    expectNear(check?.required, expected, tolerance);
  });

  it('multiplies grass and wet, and takes 1.60 in place of both only where the grass is said to be short', () => {
    expect(factors({ kind: 'grass', state: 'wet' })).toEqual([1.15, 1.15]);
    expect(factors({ kind: 'grass', state: 'wet', grass: 'long' })).toEqual([1.15, 1.15]);
    expect(factors({ kind: 'grass', state: 'damp', grass: 'short' })).toEqual([1.6]);
    expect(factors({ kind: 'grass', state: 'dry', grass: 'short' })).toEqual([1.15]);
  });
  it('knows dry pavement and firm grass, takes damp as wet, and does not speak of the rest', () => {
    expect(factors({ kind: 'paved', state: 'dry' })).toEqual([]);
    expect(factors({ kind: 'paved', state: 'damp' })).toEqual([1.15]);
    for (const state of ['flooded', 'contaminated'] as const) {
      expect(factors({ kind: 'paved', state })).toBeUndefined();
      expect(factors({ kind: 'grass', state })).toBeUndefined();
    }
    expect(factors({ kind: 'grass', state: 'dry', firmness: 'soft' })).toBeUndefined();
    for (const kind of ['gravel', 'dirt', 'snow', 'ice'] as const) {
      expect(factors({ kind, state: 'dry' })).toBeUndefined();
    }
  });
  it('adds 5 % for each per cent of downward slope, linear, and nothing uphill', () => {
    expect(factors({ kind: 'paved', state: 'dry' }, -0.01)).toEqual([1.05]);
    expectNear(factors({ kind: 'paved', state: 'dry' }, -0.025)?.[0], 1.125, 1e-12);
    expect(factors({ kind: 'paved', state: 'dry' }, 0.02)).toEqual([]);
  });
});
