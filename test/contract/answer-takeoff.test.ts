import { describe, expect, it } from 'vitest';
import { answerTakeoff } from '../../src/contract/answer-takeoff.ts';
import { takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { takeoffResponse } from '../../src/contract/takeoff-response.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { inOtherUnits, numbersIn } from '../support/in-other-units.ts';
import { named, sampleDefinition, sampleLookup, sampleTakeoff, withMember } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const lookup = sampleLookup(sampleDefinition());

describe('a takeoff from gate to gate', () => {
  it.each(unitFamilies)('is in its own form in %s', (units) => {
    const answer = answerTakeoff({ ...sampleTakeoff(), units }, lookup, stamp);
    expect(takeoffResponse.safeParse(answer).error).toBeUndefined();
  });

  it('is refused by the gate before anything is planned', () => {
    const answer = answerTakeoff(withMember(sampleTakeoff(), '/ruleSet', 'nobodys'), lookup, stamp);
    expect(isRefused(answer) && named(answer.refused)).toEqual(['unknown-id /ruleSet']);
  });

  it.each([0.5, 4])('has an answer where a turboprop states no flat rating and a lapse exponent of %d', (exponent) => {
    const propulsion = {
      kind: 'turboprop',
      power: { value: 200, unit: 'kW' },
      propellerDiameter: { value: 2, unit: 'm' },
      lapseExponent: exponent,
    };
    const definition = { ...sampleDefinition(), category: 'single-turboprop', propulsion };
    const request = takeoffRequest.parse({ ...sampleTakeoff(), aeroplane: { definition } });
    expect(takeoffResponse.safeParse(answerTakeoff(request, lookup, stamp)).error).toBeUndefined();
    const flatter = withMember(request, '/aeroplane/definition/propulsion/lapseExponent', 0);
    expect(takeoffRequest.safeParse(flatter).success).toBe(false);
  });

  it('is the same takeoff in other units before rounding, to 1e-12', () => {
    const request = { ...sampleTakeoff(), rounding: 'none', units: 'si' } as const;
    const ours = answerTakeoff(request, lookup, stamp);
    const theirs = answerTakeoff(inOtherUnits(request), lookup, stamp);
    if (isRefused(ours) || isRefused(theirs)) throw new Error('refused');
    const others = numbersIn(theirs.distances);
    expect(others.length).toBeGreaterThan(8);
    numbersIn(ours.distances).forEach(([path, value], i) => {
      expect(Math.abs((others[i]?.[1] as number) / value - 1), path).toBeLessThanOrEqual(1e-12);
    });
  });

  it.each(unitFamilies)('rounds what its cautions and its checks both show the same way in %s', (units) => {
    let shown = 0;
    for (let tora = 1203; tora < 1233; tora += 3.7) {
      const declared = {
        tora: { value: tora, unit: 'm' as const },
        toda: { value: 3000, unit: 'm' as const },
        asda: { value: 1300, unit: 'm' as const },
      };
      const answer = answerTakeoff(
        { ...withMember(sampleTakeoff(), '/runway/declared', declared), units },
        lookup,
        stamp,
      );
      if (isRefused(answer)) throw new Error('refused');
      const caution = (code: string) => answer.advisory.cautions.find((one) => one.code === code);
      const check = (code?: string) => answer.assessment?.checks.find((one) => one.code === code);
      expect(caution('clearway-capped')?.threshold).toEqual(check('takeoff-distance')?.available);
      expect(caution('margin-negative')?.value).toEqual(check(answer.assessment?.governing)?.margin);
      shown++;
    }
    expect(shown).toBeGreaterThan(8);
  });
});
