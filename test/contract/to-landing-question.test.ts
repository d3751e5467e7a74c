import { describe, expect, it } from 'vitest';
import { type LandingRequest, landingRequest } from '../../src/contract/landing-request.ts';
import { toLandingQuestion } from '../../src/contract/to-landing-question.ts';
import { isRefused } from '../../src/planning/fault.ts';
import type { LandingQuestion } from '../../src/planning/question.ts';
import { named, sampleDefinition, sampleLanding, sampleLookup, withMember } from '../support/sample-questions.ts';

const lookup = sampleLookup(sampleDefinition());

function asked(request: LandingRequest): LandingQuestion {
  const question = toLandingQuestion(request, lookup);
  if (isRefused(question)) throw new Error(JSON.stringify(question.refused));
  return question;
}

function faultsIn(request: LandingRequest) {
  expect(landingRequest.safeParse(request).error).toBeUndefined();
  const question = toLandingQuestion(request, lookup);
  return isRefused(question) ? question.refused : [];
}

describe('the gate in for a landing', () => {
  it('holds the procedure in SI, by hand', () => {
    expect(asked(sampleLanding()).procedure).toEqual({
      approachSpeedIncrement: expect.closeTo(2.0577777778, 9),
      approachAngle: expect.closeTo(0.0610865238, 9),
      reverse: true,
      antiSkid: 'inoperative',
      reactionTime: 2.5,
    });
  });
  it('holds the rest as for a takeoff', () => {
    const question = asked(sampleLanding());
    expect(question.mass).toBe(960);
    expect(question.configuration).toBe('landing-full');
    expect(question.runway.declared?.lda).toBe(850);
    expect(question.runway.surface.brakingFrictionCoefficient).toBe(0.21);
    expect(question.defaulted).toEqual([]);
  });
  it('says what it takes where the procedure is silent, of what the aeroplane has', () => {
    expect(asked(withMember(sampleLanding(), '/procedure', undefined)).defaulted).toEqual([
      '/procedure/approachSpeedIncrement',
      '/procedure/reverse',
    ]);
  });

  const slips: [title: string, pointer: string, value: unknown, fault: string][] = [
    ['a takeoff configuration', '/configuration', 'takeoff-10', 'contradiction /configuration'],
    [
      'a start offset that leaves nothing of LDA',
      '/runway/start',
      { offset: { value: 850, unit: 'm' } },
      'contradiction /runway/start/offset',
    ],
    ['anti-skid it does not have', '/procedure/antiSkid', 'operative', 'contradiction /procedure/antiSkid'],
    [
      'an approach too steep for its data',
      '/procedure/approachAngle',
      { value: 4.5, unit: 'deg' },
      'contradiction /procedure/approachAngle',
    ],
    [
      'brakes sooner than its data',
      '/procedure/reactionTime',
      { value: 1, unit: 's' },
      'contradiction /procedure/reactionTime',
    ],
  ];
  it.each(slips)('%s gives one fault', (_, pointer, value, fault) => {
    expect(named(faultsIn(withMember(sampleLanding(), pointer, value)))).toEqual([fault]);
  });
  it('gives faults of the procedure beside those of the rest', () => {
    const two = withMember(withMember(sampleLanding(), '/procedure/antiSkid', 'operative'), '/ruleSet', 'nobodys');
    expect(named(faultsIn(two))).toEqual(['unknown-id /ruleSet', 'contradiction /procedure/antiSkid']);
  });
  it('does not mind a start offset beyond the takeoff distances, which a landing has no use for', () => {
    const short = withMember(sampleLanding(), '/runway/declared/tora', { value: 50, unit: 'm' });
    expect(faultsIn(withMember(short, '/runway/declared/asda', { value: 50, unit: 'm' }))).toEqual([]);
  });
  it.each([
    ['/procedure/power', 'reduced-90'],
    ['/procedure/start', 'rolling'],
    ['/procedure/approachSpeedIncrement', { value: -1, unit: 'kt' }],
    ['/procedure/reverse', 'yes'],
    ['/runway/surface/brakingFrictionCoefficient', 1.2],
  ])('does not read %s', (pointer, value) => {
    expect(landingRequest.safeParse(withMember(sampleLanding(), pointer, value)).success).toBe(false);
  });
});
