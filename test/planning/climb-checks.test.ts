import { describe, expect, it } from 'vitest';
import { climbChecks } from '../../src/planning/climb-checks.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planTakeoff } from '../../src/planning/plan-takeoff.ts';
import type { ClimbDemand } from '../../src/planning/rules/rule-set.ts';
import { changed, plainQuestion } from '../support/takeoff-question.ts';

const twin = { ...plainQuestion.aeroplane, engines: 2, category: 'twin-piston' as const };
const demand: ClimbDemand = {
  code: 'climb-all-engines',
  of: 'takeoff',
  engines: 'all',
  gradient: 0.04,
  configuration: 'takeoff flap',
  appliesTo: ({ engines }) => engines > 1,
  when: 'more than one engine',
  source: 'EuAirOps340',
  status: 'read',
};

describe('climbChecks', () => {
  it('compares the gradient with what is asked, on both sides of it and at it', () => {
    const results = [0.0399999, 0.04, 0.05].map((gradient) => climbChecks([demand], twin, gradient)[0]);
    expect(results.map((check) => check?.result)).toEqual(['fails', 'passes', 'passes']);
    expect(results[2]).toMatchObject({ unit: 'gradient', required: 0.04, available: 0.05, of: 'climbGradient' });
    expect(results[2]?.marginRatio).toBeCloseTo(0.25, 12);
  });

  it('asks nothing of an aeroplane that the demand is not for', () => {
    expect(climbChecks([demand], plainQuestion.aeroplane, 0.01)).toEqual([]);
    expect(climbChecks(undefined, twin, 0.01)).toEqual([]);
  });

  it.each([
    [
      'one engine out',
      { ...demand, engines: 'one-out' as const },
      0.1,
      'the climb with one engine out is not computed',
    ],
    ['the approach', { ...demand, of: 'approach' as const }, 0.1, 'the climb on the approach is not computed'],
    ['thrust that is not known', demand, undefined, 'thrust is not known at the airspeed of the climb'],
  ])('leaves %s not assessed and says why', (_, asked, gradient, why) => {
    const [check] = climbChecks([asked], twin, gradient);
    expect(check).toMatchObject({ result: 'not-assessed', why });
    expect(check).not.toHaveProperty('margin');
  });

  it('lets any climb pass where any is enough, and gives it no share of nothing', () => {
    const any = { ...demand, gradient: 0, positive: true } as const;
    expect(climbChecks([any], twin, 0)[0]?.result).toBe('fails');
    const [check] = climbChecks([any], twin, 0.001);
    expect(check?.result).toBe('passes');
    expect(check).not.toHaveProperty('marginRatio');
  });
});

describe('a class B twin', () => {
  const asked = changed(plainQuestion, {
    aeroplane: { engines: 2, category: 'twin-piston' },
    question: { ruleSet: 'eu-class-b' },
  });

  it('is never enough while its climb on one engine is not computed, and says so [CAT.POL.A.340; read]', () => {
    const answer = planTakeoff(asked);
    if (isRefused(answer)) throw new Error('refused');
    expect(answer.outcome).toBe('nothing-to-compare');
    expect(answer.sentence).toContain('the climb with one engine out is not computed');
    const codes = answer.assessment?.checks.map(({ code, result }) => `${code} ${result}`);
    expect(codes).toContain('climb-all-engines passes');
    expect(codes).toContain('climb-engine-out-400-ft not-assessed');
    expect(codes).toContain('climb-engine-out-1500-ft not-assessed');
  });

  it('fails on its climb in per cent, in the sentence and in the caution', () => {
    const answer = planTakeoff(
      changed(asked, { aeroplane: { drag: { zeroLiftCoefficient: 0.39, oswaldFactor: 0.72 } } }),
    );
    if (isRefused(answer)) throw new Error('refused');
    const check = answer.assessment?.checks.find(({ code }) => code === 'climb-all-engines');
    expect(check?.result).toBe('fails');
    expect(answer.outcome).toBe('not-enough');
    const caution = answer.cautions.find(({ code }) => code === 'margin-negative');
    expect([answer.sentence, caution?.message].join(' ')).toMatch(/needs 4 % of climb gradient .* short by [\d.]+ %/);
    expect(caution?.message).toMatch(/climb-all-engines is short by [\d.]+ %: 4 % required/);
  });
});
