import { describe, expect, it } from 'vitest';
import { landingResponse } from '../../../src/contract/landing-response.ts';
import { selectFaults } from '../../../src/contract/selection/select-faults.ts';
import { takeoffResponse } from '../../../src/contract/takeoff-response.ts';
import { named } from '../../support/sample-questions.ts';

const faults = (...select: string[]) => selectFaults(select, takeoffResponse);

describe('selectFaults', () => {
  it.each([
    '',
    '/outcome',
    '/advisory/cautions',
    '/air/dewPoint',
    '/wind/crosswind',
    '/speeds/liftOff/cas',
    '/distances',
    '/distances/takeoffDistance',
    '/assessment/checks',
    '/shortfall',
    '/basis/digests/aeroplane',
    '/question/weather/wind/headwind',
    '/question/runway/start/offset',
    '/question/aeroplane/definition/configurations/takeoff-10/flap',
    '/question/aeroplane/changes/wing/area',
  ])('takes %s, which an answer can have', (pointer) => {
    expect(faults(pointer)).toEqual([]);
  });

  it.each([
    ['distances', 'wrong-type', /RFC 6901/],
    ['/distances/~2', 'wrong-type', /RFC 6901/],
    ['/distance', 'unknown-member', /Perhaps distances/],
    ['/distances/landingDistance', 'unknown-member', /takeoffDistance/],
    ['/Distances', 'unknown-member', /Perhaps distances/],
    ['/speeds/liftoff', 'unknown-member', /Perhaps liftOff/],
    ['/', 'unknown-member', /No answer has a member/],
    ['/outcome/0', 'unknown-member', /nothing inside \/outcome/],
    ['/assessment/checks/0', 'unknown-member', /select the list whole.*\/assessment\/checks/],
    ['/distances/takeoffDistance/value', 'unknown-member', /select it whole.*\/distances\/takeoffDistance/],
    ['/air/density/value', 'unknown-member', /select it whole/],
    ['/question/mass/unit', 'unknown-member', /select it whole/],
    ['/question/weather/wind/constructor', 'unknown-member', /in \/question\/weather\/wind/],
    ['/toString', 'unknown-member', /No answer has a member toString/],
  ])('refuses %s', (pointer, code, says) => {
    const found = faults('/outcome', pointer);
    expect(named(found)).toEqual([`${code} /select/1`]);
    expect(found[0]?.received).toBe(pointer);
    expect(JSON.stringify(found)).toMatch(says);
  });

  it('judges alike however often and after however many others it is asked', () => {
    const first = faults('/distances', '/nowhere');
    for (let i = 0; i < 600; i++) expect(faults(`/nowhere-${i}`)).toHaveLength(1);
    expect(faults('/distances', '/nowhere')).toEqual(first);
  });

  it('names every wrong pointer at once', () => {
    expect(named(faults('/x', '/outcome', 'y'))).toEqual(['unknown-member /select/0', 'wrong-type /select/2']);
  });

  it.each(['working', 'trajectory', 'sensitivities'] as const)('takes /%s only where it is asked for', (name) => {
    const pointer = `/${name}`;
    expect(selectFaults([pointer], takeoffResponse, [name])).toEqual([]);
    const [fault] = selectFaults([pointer], takeoffResponse, []);
    expect(fault).toMatchObject({ pointer: '/select/0', code: 'contradiction', hint: `Add "${name}" to detail.` });
  });

  it('judges by the answer that is asked for', () => {
    expect(selectFaults(['/distances/landingDistance', '/balkedLanding/gradient'], landingResponse)).toEqual([]);
    expect(named(selectFaults(['/speeds/liftOff'], landingResponse))).toEqual(['unknown-member /select/0']);
  });
});
