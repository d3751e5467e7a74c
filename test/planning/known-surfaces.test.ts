import { describe, expect, it } from 'vitest';
import type { Assumption } from '../../src/planning/answer.ts';
import { type KnownSurface, knownSurfaces } from '../../src/planning/known-surfaces.ts';
import { contaminantKinds, type Surface, surfaceKinds } from '../../src/planning/question.ts';
import { surfaceFactors as classBLanding } from '../published/eu-class-b-landing.ts';
import { surfaceFactors as classBTakeoff } from '../published/eu-class-b-takeoff.ts';
import { landed, plainLanding } from '../support/landing-question.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

const known = knownSurfaces();
const named = known.map((one) => [JSON.stringify(one.surface), one] as const);
const find = (given: Surface) => {
  const fits = ({ surface }: KnownSurface) =>
    Object.entries(given).every(([name, value]) => surface[name as keyof Surface] === value);
  const found = known.find(fits);
  if (found === undefined) throw new Error(JSON.stringify(given));
  return found;
};
const long = { tora: 9000, toda: 9000, asda: 9000, lda: 9000 };
const assumedAt = (assumed: readonly Assumption[], at: string) => assumed.find((one) => one.at === at)?.value;

describe('the surfaces that are listed', () => {
  it('are every kind in every state but contaminated, which has one for each contaminant, each once', () => {
    for (const kind of surfaceKinds) {
      for (const state of ['dry', 'damp', 'wet', 'flooded'] as const) expect(find({ kind, state })).toBeDefined();
    }
    const contaminated = known.filter(({ surface }) => surface.state === 'contaminated');
    expect(contaminated.map(({ surface }) => surface.contaminant?.kind)).toEqual([...contaminantKinds]);
    expect(new Set(named.map(([name]) => name)).size).toBe(known.length);
  });

  it.each(named)(
    '%s has the rolling friction that a takeoff takes',
    (_, { surface, rolling, refused, refusedForLight }) => {
      const wheels = { tyres: 3, maximumTyreWidth: 0.15 };
      const asked = changed(plainQuestion, { aeroplane: { wheels }, runway: { surface, declared: long } });
      const { outcome, basis } = answered(asked);
      const taken = assumedAt(basis.assumed, '/runway/surface/rollingFrictionCoefficient');
      if (refused !== undefined || refusedForLight !== undefined) expect(outcome).toBe('no-data-for-this-surface');
      else expect(taken).toBe(rolling?.coefficient);
    },
  );

  it.each(named)(
    '%s has the braking friction that a landing takes',
    (_, { surface, braking, refused, refusedForLight }) => {
      const { brakes: _brakes, wheels: _wheels, ...aeroplane } = plainLanding.aeroplane;
      const { outcome, basis } = landed({
        ...changed(plainLanding, { runway: { surface, declared: long } }),
        aeroplane,
      });
      const taken = assumedAt(basis.assumed, '/runway/surface/brakingFrictionCoefficient');
      const onDry = assumedAt(basis.assumed, '/aeroplane/definition/brakes/brakingFrictionCoefficient');
      if (refused !== undefined || refusedForLight !== undefined) {
        expect(outcome).toBe('no-data-for-this-surface');
        return;
      }
      const shown = (value: number) => Math.round(value * 1000) / 1000;
      const [rest, moving] = [braking?.atRest, braking?.atFiftyKnots].map((one) =>
        one === undefined ? undefined : shown(one),
      );
      expect(taken ?? onDry).toBe(rest === moving ? rest : `${rest} at rest, ${moving} at 50 kt over the ground`);
    },
  );

  it.each(classBTakeoff)('$title', ({ inputs, expected }) => {
    const found = find(inputs).inRules.find(({ ruleSet, phase }) => ruleSet === 'eu-class-b' && phase === 'takeoff');
    expect(found?.factors.map(({ value }) => value)).toEqual([expected]);
  });
  it.each(classBLanding)('$title', ({ inputs, expected }) => {
    const found = find(inputs).inRules.find(({ ruleSet, phase }) => ruleSet === 'eu-class-b' && phase === 'landing');
    expect(found?.factors.map(({ value }) => value)).toEqual([expected]);
  });

  it('name turbojets where a factor is for them alone', () => {
    const found = find({ kind: 'paved', state: 'wet' }).inRules.filter(({ ruleSet }) => ruleSet === 'us-part-121');
    expect(found.map(({ when, factors }) => [/turbojet/.test(when), factors.map(({ value }) => value)])).toEqual([
      [false, []],
      [true, [1.15]],
    ]);
  });
  it('have no factor where nothing is to be computed', () => {
    for (const { refused, inRules, rolling, braking } of known) {
      if (refused !== undefined) expect([inRules, rolling, braking]).toEqual([[], undefined, undefined]);
    }
    expect(known.some(({ refused }) => refused !== undefined)).toBe(true);
  });
});
