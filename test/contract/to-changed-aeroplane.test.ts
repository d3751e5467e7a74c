import { describe, expect, it } from 'vitest';
import { answerTakeoff } from '../../src/contract/answer-takeoff.ts';
import { readDefinition } from '../../src/contract/read-definition.ts';
import { type TakeoffRequest, takeoffRequest } from '../../src/contract/takeoff-request.ts';
import { takeoffResponse } from '../../src/contract/takeoff-response.ts';
import { toKnownAeroplane } from '../../src/contract/to-known-aeroplane.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { fullManual } from '../support/printed-manuals.ts';
import { named, sampleDefinition, sampleLookup, sampleTakeoff } from '../support/sample-questions.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const lookup = sampleLookup(sampleDefinition());
const changed = (changes: Record<string, unknown>) => ({
  basedOn: 'sample-tourer',
  changes,
  because: 'a new propeller',
});
const known = (changes: Record<string, unknown>) => toKnownAeroplane(changed(changes), lookup);
const faultsOf = (changes: Record<string, unknown>) => {
  const found = known(changes);
  if (!Array.isArray(found)) throw new Error('it was not refused');
  return found;
};
const asked = (aeroplane: TakeoffRequest['aeroplane'], rest: Partial<TakeoffRequest> = {}) => {
  const answer = answerTakeoff({ ...sampleTakeoff(), ...rest, aeroplane }, lookup, stamp);
  if (isRefused(answer)) throw new Error(JSON.stringify(answer.refused));
  return answer;
};

describe('an aeroplane on file with changes', () => {
  const changes = { propulsion: { staticThrust: { value: 2550 } }, wheels: null };

  it('is read by the request, as the choice it is', () => {
    const request = { ...sampleTakeoff(), aeroplane: changed(changes) };
    expect(takeoffRequest.safeParse(request).data?.aeroplane).toEqual(changed(changes));
  });

  it('is the definition with the changes merged in, with that definition\u2019s digest', () => {
    const whole = sampleDefinition();
    const { wheels: _, ...rest } = whole;
    const propulsion = { ...rest.propulsion, staticThrust: { value: 2550, unit: 'N' } };
    const read = readDefinition({ ...rest, id: 'sample-tourer', propulsion });
    if (isRefused(read)) throw new Error('refused');
    const inline = toKnownAeroplane({ definition: read.value }, lookup);
    const merged = known(changes);
    if (Array.isArray(inline) || Array.isArray(merged)) throw new Error('refused');
    expect(merged.aeroplane).toEqual(inline.aeroplane);
    expect(merged.digest).toBe(inline.digest);
    expect(merged.changes).toEqual({
      basedOn: 'sample-tourer',
      revision: '3',
      because: 'a new propeller',
      changed: ['propulsion/staticThrust 2550 N in place of 2400 N', 'wheels taken out'],
      flewAs: lookup.get('sample-tourer')?.aeroplane,
    });
    const renamed = known({ name: 'Sample Tourer II (invented)' });
    expect(Array.isArray(renamed) ? renamed : renamed.changes).not.toHaveProperty('flewAs');
  });

  it('does not bring sheets of the flight manual and a change that moves distances: neither says which aeroplane they are of', () => {
    const flightManual = fullManual();
    const both = faultsOf({ ...changes, flightManual });
    expect(both).toMatchObject([{ pointer: '/aeroplane/changes/flightManual', code: 'contradiction' }]);
    expect(Array.isArray(known({ flightManual }))).toBe(false);
  });

  it.each([
    ['flareLoadFactor', 1.15, false],
    ['floatDecelerationRatio', 0.09, false],
    ['groundLiftCoefficient', 0.3, true],
  ])('leaves the fit away where it stands for what is changed: %s', (member, value, stays) => {
    const range = (value: number, unit: string) => ({ from: { value, unit }, to: { value, unit } });
    const fit = {
      fittedTo: 'a'.repeat(64),
      modelVersion: '1.0.0',
      brakingFrictionCoefficient: 0.3,
      approachAngle: { value: 3, unit: 'deg' },
      standardDeviations: { brakingFrictionCoefficient: 0.01 },
      correlation: [[1]],
      errors: { rmsPercent: 1, greatestPercent: 2 },
      conditions: { mass: range(1000, 'kg'), pressureAltitude: range(0, 'm'), temperature: range(15, 'degC') },
    };
    const read = readDefinition(
      JSON.parse(JSON.stringify({ ...sampleDefinition(), fit: { landing: { 'landing-full': fit } } })),
    );
    if (isRefused(read)) throw new Error(JSON.stringify(read.refused));
    const found = toKnownAeroplane(
      changed({ configurations: { 'landing-full': { [member]: value } } }),
      sampleLookup(read.value),
    );
    if (Array.isArray(found)) throw new Error(JSON.stringify(found));
    expect([found.aeroplane.fit !== undefined, found.changes?.flewAs?.fit !== undefined]).toEqual([stays, stays]);
  });

  it('leaves the aeroplane on file as it is', () => {
    const before = structuredClone(lookup.get('sample-tourer'));
    known(changes);
    expect(lookup.get('sample-tourer')).toEqual(before);
  });

  it('is said in a note, with what was changed and why, and is echoed so that it can be sent again', () => {
    const answer = asked(changed(changes));
    expect(answer.advisory.cautions.find(({ code }) => code === 'aeroplane-changed')).toMatchObject({
      severity: 'note',
      at: '/aeroplane/changes',
      message:
        'The aeroplane is sample-tourer, revision 3, with changes: propulsion/staticThrust 2550 N in place of 2400 N, wheels taken out. The reason given: "a new propeller". Every number of the answer is of the changed aeroplane.',
    });
    expect(answer.question.aeroplane).toEqual({ ...changed(changes), revision: '3' });
    expect(takeoffResponse.safeParse(answer).error).toBeUndefined();
    expect(asked(answer.question.aeroplane)).toEqual(answer);
    expect(asked({ id: 'sample-tourer' }).advisory.cautions.map(({ code }) => code)).not.toContain('aeroplane-changed');
  });

  it('answers with the changed figures: more thrust, a shorter takeoff', () => {
    const distance = (aeroplane: TakeoffRequest['aeroplane']) =>
      asked(aeroplane, { rounding: 'none' }).distances?.takeoffDistance.value ?? 0;
    expect(distance(changed(changes))).toBeLessThan(distance({ id: 'sample-tourer' }) * 0.97);
  });

  it('points into the changes for what it assumes', () => {
    const answer = asked(changed({ configurations: { 'takeoff-10': { pullUpLoadFactor: null } } }));
    const at = '/aeroplane/changes/configurations/takeoff-10';
    expect(answer.basis.assumed.map((one) => one.at).filter((one) => one.startsWith('/aeroplane'))).toEqual([
      `${at}/pullUpLoadFactor`,
      '/aeroplane/changes/passengerSeats',
      `${at}/maximumLift/kind`,
    ]);
  });

  it('names six changes and counts the others', () => {
    const limitations = Object.fromEntries(
      Object.keys(sampleDefinition().limitations ?? {}).map((name) => [name, null]),
    );
    const answer = asked(changed({ limitations, name: 'Other', wheels: null, brakes: null }));
    const message = answer.advisory.cautions.find(({ code }) => code === 'aeroplane-changed')?.message;
    expect(message).toMatch(/, name Other in place of Sample Tourer \(invented\) and 2 more\. The reason/);
  });
});

describe('changes are refused', () => {
  it.each([
    ['an unknown id', { basedOn: 'sample-turer' }, ['unknown-id /aeroplane/basedOn'], /sample-tourer/],
    ['another revision', { revision: '2' }, ['contradiction /aeroplane/revision'], /Revision 3/],
  ])('of %s', (_, part, expected, says) => {
    const found = toKnownAeroplane({ ...changed({ name: 'Other' }), ...part }, lookup);
    if (!Array.isArray(found)) throw new Error('it was not refused');
    expect(named(found)).toEqual(expected);
    expect(JSON.stringify(found)).toMatch(says);
  });

  it.each<[string, Record<string, unknown>, string[], RegExp]>([
    [
      'that make a value of the wrong type',
      { wing: { taperRatio: '0.7' } },
      ['wrong-type /aeroplane/changes/wing/taperRatio'],
      /quotation/,
    ],
    ['out of range', { drag: { oswaldFactor: 3 } }, ['out-of-range /aeroplane/changes/drag/oswaldFactor'], /1\.2/],
    [
      'with an unknown unit',
      { wing: { area: { unit: 'sqm' } } },
      ['unknown-unit /aeroplane/changes/wing/area/unit'],
      /m2/,
    ],
    ['of a member there is not', { wings: { taperRatio: 0.7 } }, ['unknown-member /aeroplane/changes/wings'], /wings/],
    ['that take out what must be there', { wing: null }, ['missing /aeroplane/changes/wing'], /wing is missing/],
    [
      'that take out what is not there',
      { wing: { sections: null } },
      ['unknown-member /aeroplane/changes/wing/sections'],
      /Perhaps section/,
    ],
    ['that are none', {}, ['missing /aeroplane/changes'], /leave sample-tourer as it is/],
    [
      'that change nothing',
      { drag: { oswaldFactor: 0.74 } },
      ['contradiction /aeroplane/changes'],
      /leave sample-tourer as it is/,
    ],
    [
      'that contradict what they leave: a maximum below the empty mass',
      { masses: { maximumTakeoff: { value: 600 }, maximumLanding: null } },
      ['contradiction /aeroplane/changes/masses'],
      /empty.*\(\/masses\/empty of the changed aeroplane\)/,
    ],
    [
      'that contradict one another: two engines on a single',
      { engines: 2 },
      ['contradiction /aeroplane/changes/engines'],
      /category is single-piston/,
    ],
  ])('%s', (_, changes, expected, says) => {
    const found = faultsOf(changes);
    expect(named(found)).toEqual(expected);
    expect(JSON.stringify(found)).toMatch(says);
  });

  it('naming every member that another kind of propulsion leaves over', () => {
    const found = faultsOf({
      category: 'single-turboprop',
      propulsion: { kind: 'turboprop', power: { value: 200, unit: 'kW' } },
    });
    expect(named(found)).toContain('unknown-member /aeroplane/changes/propulsion');
    expect(JSON.stringify(found)).toMatch(/\/propulsion\/polarSlopeCoefficient of the changed aeroplane/);
    expect(found[0]?.hint).toBe('A change to null takes a member out.');
  });

  it.each([
    ['without a reason', { basedOn: 'sample-tourer', changes: {} }],
    ['with an empty reason', { ...changed({}), because: '' }],
    ['with a reason of more than one line', { ...changed({}), because: 'a\nb' }],
    ['beside a definition', { ...changed({}), definition: sampleDefinition() }],
    ['that are no object', { ...changed({}), changes: [1] }],
  ])('by the schema %s', (_, aeroplane) => {
    expect(takeoffRequest.safeParse({ ...sampleTakeoff(), aeroplane }).success).toBe(false);
  });
});
