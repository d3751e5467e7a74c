import { describe, expect, it } from 'vitest';
import type { Configuration } from '../../src/performance/aeroplane.ts';
import { climbChecks, climbedWithAll } from '../../src/planning/climb-checks.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planTakeoff } from '../../src/planning/plan-takeoff.ts';
import type { ClimbDemand } from '../../src/planning/rules/rule-set.ts';
import { changed, plainQuestion } from '../support/takeoff-question.ts';

const twin = { ...plainQuestion.aeroplane, engines: 2, category: 'twin-piston' as const };
const climbing = (gradient: number) => () => ({ gradient, rate: 30 * gradient });
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
    const results = [0.0399999, 0.04, 0.05].map((gradient) => climbChecks([demand], twin, climbing(gradient))[0]);
    expect(results.map((check) => check?.result)).toEqual(['fails', 'passes', 'passes']);
    expect(results[2]).toMatchObject({ unit: 'gradient', required: 0.04, available: 0.05, of: 'climbGradient' });
    expect(results[2]?.marginRatio).toBeCloseTo(0.25, 12);
  });

  it('asks nothing of an aeroplane that the demand is not for', () => {
    expect(climbChecks([demand], plainQuestion.aeroplane, climbing(0.01))).toEqual([]);
    expect(climbChecks(undefined, twin, climbing(0.01))).toEqual([]);
  });

  it('leaves a climb that is not computed not assessed and says why', () => {
    const why = 'thrust is not known at the airspeed of the climb';
    const [check] = climbChecks([demand], twin, () => climbedWithAll(undefined));
    expect(check).toMatchObject({ result: 'not-assessed', why });
    expect(check).not.toHaveProperty('margin');
  });

  it('lets the least that a climb can be pass and not fail', () => {
    const atLeast = (gradient: number) => () => ({ gradient, rate: 1, atLeastBecause: 'gear and flap stay down' });
    expect(climbChecks([demand], twin, atLeast(0.05))[0]?.result).toBe('passes');
    const [check] = climbChecks([demand], twin, atLeast(0.03));
    expect(check).toMatchObject({ result: 'not-assessed', available: 0.03, why: 'gear and flap stay down' });
  });

  it('lets any climb pass where any is enough, and gives it no share of nothing', () => {
    const any = { ...demand, gradient: 0, positive: true } as const;
    expect(climbChecks([any], twin, climbing(0))[0]?.result).toBe('fails');
    const [check] = climbChecks([any], twin, climbing(0.001));
    expect(check?.result).toBe('passes');
    expect(check).not.toHaveProperty('marginRatio');
  });
});

describe('a class B twin', () => {
  const asked = changed(plainQuestion, {
    aeroplane: { engines: 2, category: 'twin-piston' },
    question: { ruleSet: 'eu-class-b' },
  });

  const results = (mass: number, climbOut?: Configuration['climbOut']) => {
    const heavy = changed(asked, {
      ...(climbOut && { configuration: { climbOut } }),
      question: { mass, ruleSet: 'eu-class-b' },
    });
    const answer = planTakeoff(heavy);
    if (isRefused(answer)) throw new Error('refused');
    const climbs = answer.assessment?.checks.filter(({ code }) => code.startsWith('climb'));
    return [answer.outcome, ...(climbs ?? []).map(({ result }) => result)];
  };

  it('climbs with all engines, at 400 ft and at 1 500 ft [CAT.POL.A.340; read]', () => {
    expect(results(1010)).toEqual(['enough', 'passes', 'passes', 'passes']);
  });

  it('is not refused a climb where nothing is stated of gear and flap coming up, and not granted it', () => {
    expect(results(1600)).toEqual(['nothing-to-compare', 'passes', 'not-assessed', 'not-assessed']);
    const stays = [{ from: 50, airDragIncrementCoefficient: 0 }];
    expect(results(1600, stays)).toEqual(['not-enough', 'passes', 'fails', 'fails']);
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
