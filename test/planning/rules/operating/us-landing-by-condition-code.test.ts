import { describe, expect, it } from 'vitest';
import { usLandingByConditionCode } from '../../../../src/planning/rules/operating/us-landing-by-condition-code.ts';
import { runwayFactors } from '../../../../src/planning/rules/runway-factors.ts';
import { groovedFactors, landingDistanceFactors } from '../../../published/safo-19001.ts';
import { timeOfArrivalMargins } from '../../../published/time-of-arrival.ts';
import { asked, checksFrom, refusal, ruled } from '../../../support/asked.ts';
import { expectNear } from '../../../support/near.ts';

const { landing } = usLandingByConditionCode;

describe('landing distance factors by runway condition code', () => {
  it.each(landingDistanceFactors)('$title', ({ inputs, expected, status }) => {
    const { category, reverse, code } = inputs;
    const given = asked({ aeroplane: ruled({ category }), reverse, conditionCode: code });
    expect(runwayFactors(landing, given)?.map(({ value, status: of }) => [value, of])).toEqual([[expected, status]]);
    const [check] = checksFrom(landing, given, { reference: 500, credited: undefined });
    expectNear(check?.required, 500 * expected, 1e-9);
  });
  it.each(groovedFactors)('is not applied, for no question says grooved: $title', ({ inputs, expected, status }) => {
    const found = landing.notApplied?.find(({ factor }) => factor.because.includes(inputs.when))?.factor;
    expect([found?.value, found?.status]).toEqual([expected, status]);
  });
  it.each(timeOfArrivalMargins)('on the runway as it is, and once: $title', ({ expected }) => {
    const given = asked({ conditionCode: 3 });
    const [longer] = checksFrom(landing, given, { reference: 500, credited: 1500 });
    expectNear(longer?.required, 1500 * expected, 1e-9);
    expectNear(longer?.alternative?.required, 1600, 1e-9);
  });
  it('takes an electric aeroplane as one with pistons', () => {
    const of = (category: 'twin-electric' | 'twin-piston') =>
      runwayFactors(landing, asked({ aeroplane: ruled({ category }), conditionCode: 4 }))?.[0]?.value;
    expect(of('twin-electric')).toBe(of('twin-piston'));
  });
  it('has no factor where there is no code', () => {
    expect(runwayFactors(landing, asked({ conditionCode: undefined }))).toBeUndefined();
    expect(runwayFactors(landing, asked({ conditionCode: 0 }))).toBeUndefined();
  });
  it('speaks of landings alone', () => {
    expect(refusal(usLandingByConditionCode, ruled(), 'takeoff')).toMatch(/for landings/);
    expect(refusal(usLandingByConditionCode, ruled(), 'landing')).toBeUndefined();
  });
});
