import { describe, expect, it } from 'vitest';
import type { Aeroplane } from '../../src/performance/aeroplane.ts';
import type { LandingProcedure, LandingQuestion, Surface } from '../../src/planning/question.ts';
import { resolveBraking } from '../../src/planning/resolve-braking.ts';
import { runwayCondition } from '../../src/planning/runway-condition.ts';
import { plainLanding, statedLander, wetGrass, wetPavement } from '../support/landing-question.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const dry: Surface = { kind: 'paved', state: 'dry' };
const { brakes: _, wheels: __, ...bare } = statedLander;
const kt = 1852 / 3600;

function braked(question: LandingQuestion, surface: Surface) {
  const runway = { ...question.runway, surface };
  return resolveBraking(question, runway, runwayCondition({ ...question, runway }));
}

function resolved(surface: Surface, aeroplane: Partial<Aeroplane> = {}, procedure: LandingProcedure = {}) {
  return braked({ ...plainLanding, aeroplane: { ...statedLander, ...aeroplane }, procedure }, surface);
}
const withBrakes = (brakes: Aeroplane['brakes']) => ({ brakes: { ...statedLander.brakes, ...brakes } });
const said = (found: ReturnType<typeof resolved>) => found.assumed.map(({ assumption }) => assumption.at);

describe('the braking friction of a landing', () => {
  it("is the aeroplane's own on dry pavement, times the weight on the braked wheels, once", () => {
    const found = resolved(dry, withBrakes({ brakingFrictionCoefficient: 0.42, loadFactor: 0.9 }));
    expectRatio(found.actual?.at(10), 0.42 * 0.9, 1e-12);
    expectRatio(found.reference.at(10), 0.42 * 0.9, 1e-12);
    expect(found.assumed).toEqual([]);
  });
  it('is a default that is said where no brakes are stated: 0.35 and 0.80, unknown wheels', () => {
    const found = braked({ ...plainLanding, aeroplane: bare }, dry);
    expectRatio(found.actual?.at(0), 0.35 * 0.8, 1e-12);
    expect(said(found)).toEqual([
      '/aeroplane/definition/brakes/brakingFrictionCoefficient',
      '/aeroplane/definition/brakes/loadFactor',
      '/aeroplane/definition/brakes/antiSkid',
    ]);
  });
  it.each([
    ['tricycle', 0.85],
    ['tailwheel', 0.8],
  ] as const)('puts less weight on the braked wheels of a %s: %f', (arrangement, share) => {
    const found = braked({ ...plainLanding, aeroplane: { ...bare, wheels: { arrangement } } }, dry);
    expectRatio(found.actual?.at(0), 0.35 * share, 1e-12);
  });
  it("is never more than the aeroplane's own brakes on another surface, and the surface's where that is less", () => {
    const weak = withBrakes({ brakingFrictionCoefficient: 0.1, loadFactor: 1 });
    expectRatio(resolved(wetGrass, weak).actual?.at(0), 0.1, 1e-12);
    const strong = withBrakes({ brakingFrictionCoefficient: 0.4, loadFactor: 1 });
    expectRatio(resolved(wetGrass, strong).actual?.at(0), 0.12, 1e-12);
    const modulated = withBrakes({ brakingFrictionCoefficient: 0.4, loadFactor: 1, antiSkid: 'fully-modulating' });
    const wet = resolved(wetPavement, { ...modulated, wheels: { tyrePressure: 100 * 6894.757 } }).actual;
    expectRatio(wet?.at(0), 0.4, 1e-12);
    expectNear(wet?.at(100 * kt), 0.8 * 0.2753, 1e-4);
    expect(wet?.kinks.some((kink) => Math.abs(0.8 * curve(kink / kt / 100) - 0.4) < 1e-6)).toBe(true);
  });
  it('stands as the question gives it, without load or anti-skid', () => {
    const given: Surface = { ...wetPavement, brakingFrictionCoefficient: 0.21 };
    const found = resolved(given);
    expect(found.actual?.at(30)).toBe(0.21);
    expect(found.assumed).toEqual([]);
  });
  it('is not of a modulated system that is inoperative', () => {
    const system = withBrakes({ brakingFrictionCoefficient: 0.45, loadFactor: 1, antiSkid: 'fully-modulating' });
    expectRatio(resolved(dry, system, { antiSkid: 'inoperative' }).actual?.at(10), 0.35, 1e-12);
    expectRatio(resolved(dry, system, { antiSkid: 'operative' }).actual?.at(10), 0.45, 1e-12);
    const wet = (antiSkid: 'operative' | 'inoperative') => resolved(wetPavement, system, { antiSkid }).actual?.at(20);
    expect(wet('inoperative') ?? 1).toBeLessThan((wet('operative') ?? 0) / 2);
  });
  it('takes a tyre pressure that brakes worse where none is stated on a wet runway, and says so', () => {
    const { wheels: ___, ...unshod } = statedLander;
    const found = braked({ ...plainLanding, aeroplane: unshod }, wetPavement);
    expect(said(found)).toContain('/aeroplane/definition/wheels/tyrePressure');
    expect(found.actual?.at(25) ?? 1).toBeLessThan(resolved(wetPavement).actual?.at(25) ?? 0);
  });
  it('has no physics for what lies in the way of the wheels, whatever the question gives', () => {
    const flooded: Surface = { kind: 'paved', state: 'flooded', brakingFrictionCoefficient: 0.1 };
    expect(resolved(flooded).actual).toBeUndefined();
    expect(resolved(flooded).surface).toBe('paved, flooded');
  });
});

/** The smooth wet curve at 100 psi. @see 14 CFR 25.109(c)(1) */
function curve(v: number): number {
  return ((-0.0437 * v + 0.32) * v - 0.805) * v + 0.804;
}
