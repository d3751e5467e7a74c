import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { pointerSteps } from '../../../src/contract/selection/pointer-steps.ts';
import { selected } from '../../../src/contract/selection/selected.ts';

const answer = {
  outcome: 'enough',
  advisory: { notice: 'n', sentence: 's', cautions: [] },
  air: { temperature: { value: 1, unit: 'degC' }, density: { value: 1.2, unit: 'kg/m3' } },
  speeds: { stall: { cas: 1, eas: 2 }, liftOff: { cas: 3 } },
  'a/b': { '~': 1 },
  checks: [{ code: 'x' }],
};
const { outcome, advisory } = answer;

describe('selected', () => {
  it.each<[string[], object]>([
    [[], { outcome, advisory }],
    [['/outcome'], { outcome, advisory }],
    [['/advisory/sentence'], { outcome, advisory }],
    [['/air/density'], { outcome, advisory, air: { density: answer.air.density } }],
    [['/speeds/stall/eas', '/checks'], { outcome, advisory, speeds: { stall: { eas: 2 } }, checks: answer.checks }],
    [['/speeds', '/speeds/stall/eas'], { outcome, advisory, speeds: answer.speeds }],
    [['/speeds/stall/eas', '/speeds'], { outcome, advisory, speeds: answer.speeds }],
    [['/a~1b/~0'], { outcome, advisory, 'a/b': { '~': 1 } }],
    [['/distances/groundRoll', '/air/dewPoint'], { outcome, advisory }],
    [['/outcome', ''], answer],
  ])('keeps of %j that and outcome and advisory', (pointers, expected) => {
    const before = structuredClone(answer);
    expect(selected(answer, pointers)).toEqual(expected);
    expect(answer).toEqual(before);
  });

  it('keeps the order of the answer, whatever that of the pointers', () => {
    expect(Object.keys(selected(answer, ['/checks', '/speeds', '/air']))).toEqual([
      'outcome',
      'advisory',
      'air',
      'speeds',
      'checks',
    ]);
  });

  it('leaves each selected member at its own pointer', () => {
    const pointer = '/speeds/stall/eas';
    const at = (whole: object) =>
      (pointerSteps(pointer) as string[]).reduce<unknown>(
        (node, step) => (node as Record<string, unknown>)[step],
        whole,
      );
    expect(at(selected(answer, [pointer]))).toBe(at(answer));
  });
});

describe('pointerSteps', () => {
  it.each([
    ['', []],
    ['/', ['']],
    ['/a/b', ['a', 'b']],
    ['/a~1b/c~0d/~01', ['a/b', 'c~d', '~1']],
    ['a', undefined],
    ['/~', undefined],
    ['/a~2', undefined],
  ])('reads %j [RFC 6901, sec. 3 and 4; memory]', (pointer, steps) => {
    expect(pointerSteps(pointer)).toEqual(steps);
  });

  test.prop([fc.array(fc.string(), { maxLength: 5 })])('undoes the writing of a pointer', (steps) => {
    const pointer = steps.map((step) => `/${step.replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
    expect(pointerSteps(pointer)).toEqual(steps);
  });
});
