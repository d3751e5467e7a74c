import { expect, it } from 'vitest';
import { unknownId } from '../../src/contract/unknown-id.ts';

it('names the list and what was probably meant', () => {
  expect(unknownId('/ruleSet', 'rule set', 'eu-class-c', ['unfactored', 'eu-class-b'])).toEqual({
    pointer: '/ruleSet',
    code: 'unknown-id',
    message: "There is no rule set 'eu-class-c'.",
    received: 'eu-class-c',
    allowed: 'unfactored, eu-class-b',
    hint: 'Perhaps eu-class-b.',
  });
});

it('gives no hint where nothing is near', () => {
  expect(unknownId('/ruleSet', 'rule set', 'zzzzzz', ['unfactored', 'eu-class-b'])).not.toHaveProperty('hint');
});
