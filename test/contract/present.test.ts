import { expect, it } from 'vitest';
import { perhaps, present } from '../../src/contract/present.ts';

it('leaves undefined members out and keeps the order and every other value', () => {
  const made = present<{ a?: number; b?: number; c: boolean; d: string }>({ a: undefined, b: 0, c: false, d: '' });
  expect(Object.entries(made)).toEqual([
    ['b', 0],
    ['c', false],
    ['d', ''],
  ]);
});

it('converts only what is there', () => {
  expect([perhaps(String, undefined), perhaps(String, 0)]).toEqual([undefined, '0']);
});
