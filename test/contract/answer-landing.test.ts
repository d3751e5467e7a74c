import { describe, expect, it } from 'vitest';
import { answerLanding } from '../../src/contract/answer-landing.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import { type LandingResponse, landingResponse } from '../../src/contract/landing-response.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { inOtherUnits, numbersIn } from '../support/in-other-units.ts';
import { named, sampleDefinition, sampleLanding, sampleLookup, withMember } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const lookup = sampleLookup(sampleDefinition());

function answered(request: LandingRequest): LandingResponse {
  const answer = answerLanding(request, lookup, stamp);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer));
  return answer;
}

describe('a landing from gate to gate', () => {
  it.each(unitFamilies)('is in its own form in %s', (units) => {
    const answer = answered({ ...sampleLanding(), units });
    expect(landingResponse.safeParse(answer).error).toBeUndefined();
  });
  it('has its blocks in the order of the contract', () => {
    const answer = answered(sampleLanding());
    expect(Object.keys(answer)).toEqual([
      'outcome',
      'advisory',
      'air',
      'wind',
      'speeds',
      'distances',
      'balkedLanding',
      'assessment',
      'basis',
      'question',
    ]);
    expect(Object.keys(answer.speeds)).toEqual(['stall', 'landingReference', 'touchdown']);
    expect(Object.keys(answer.distances ?? {})).toEqual([
      'screenHeight',
      'airDistance',
      'groundRoll',
      'landingDistance',
      'airTime',
      'groundRollTime',
    ]);
    expect(Object.keys(answer.basis.band?.[0] ?? {})).toContain('landingDistancePercent');
  });
  it('is refused by the gate before anything is planned', () => {
    const answer = answerLanding(withMember(sampleLanding(), '/ruleSet', 'nobodys'), lookup, stamp);
    expect(isRefused(answer) && named(answer.refused)).toEqual(['unknown-id /ruleSet']);
  });
  it('is the same landing in other units before rounding, to 1e-12', () => {
    const request = { ...sampleLanding(), rounding: 'none', units: 'si' } as const;
    const others = numbersIn(answered(inOtherUnits(request)).distances);
    expect(others.length).toBeGreaterThan(8);
    numbersIn(answered(request).distances).forEach(([path, value], i) => {
      expect(Math.abs((others[i]?.[1] as number) / value - 1), path).toBeLessThanOrEqual(1e-12);
    });
  });
  it('rounds distances up, the lower end of a band and the climb down', () => {
    const exact = answered({ ...sampleLanding(), rounding: 'none' });
    const shown = answered(sampleLanding());
    for (const name of ['airDistance', 'groundRoll', 'landingDistance'] as const) {
      expect(shown.distances?.[name].value).toBe(Math.ceil(exact.distances?.[name].value ?? 0));
      expect(shown.distances?.[name].low).toBe(Math.floor(exact.distances?.[name].low ?? 0));
    }
    const [climb, unrounded] = [shown.balkedLanding, exact.balkedLanding];
    if (climb.outcome !== 'computed' || unrounded.outcome !== 'computed') throw new Error('no climb');
    expect(climb.gradient.value).toBeLessThanOrEqual(unrounded.gradient.value);
    expect(unrounded.gradient.value - climb.gradient.value).toBeLessThan(0.01);
    expect(climb.rate).toEqual({ value: Math.floor(unrounded.rate.value), unit: 'ft/min' });
  });
  it('echoes a question that gives the same answer when it is sent again', () => {
    const first = answered(withMember(sampleLanding(), '/units', undefined));
    const second = answered(first.question as LandingRequest);
    expect(second.distances).toEqual(first.distances);
    expect(second.question).toEqual(first.question);
    expect(first.question.procedure).toEqual(sampleLanding().procedure);
  });
  it('names every source that its checks, cautions and assumptions name', () => {
    const { assessment, advisory, basis } = answered(sampleLanding());
    const keys = basis.sources.map(({ key }) => key);
    for (const check of assessment?.checks ?? []) {
      expect(keys).toContain(check.source);
      for (const factor of [...check.factors, ...(check.alternative?.factors ?? [])])
        expect(keys).toContain(factor.source);
    }
    for (const { source } of [...advisory.cautions, ...basis.assumed]) if (source) expect(keys).toContain(source);
  });
});
