import { describe, expect, it } from 'vitest';
import { changedMembers, changeText } from '../../src/contract/changed-members.ts';
import { mergePatch } from '../../src/contract/merge-patch.ts';

const base = {
  name: 'One',
  wing: { area: { value: 12.9, unit: 'm2' }, taperRatio: 0.8 },
  rows: [1, 2],
  brakes: { antiSkid: 'none' },
};
const texts = (patch: unknown) => changedMembers(base, patch, mergePatch(base, patch)).map(changeText);

describe('changedMembers, in words', () => {
  it.each([
    ['a number', { wing: { taperRatio: 0.7 } }, ['wing/taperRatio 0.7 in place of 0.8']],
    ['a quantity', { wing: { area: { value: 139, unit: 'ft2' } } }, ['wing/area 139 ft2 in place of 12.9 m2']],
    ['half a quantity', { wing: { area: { value: 13.4 } } }, ['wing/area 13.4 m2 in place of 12.9 m2']],
    ['a word', { brakes: { antiSkid: 'on-off' } }, ['brakes/antiSkid on-off in place of none']],
    ['a list', { rows: [3] }, ['rows replaced']],
    ['a structure by a word', { wing: 'none' }, ['wing replaced']],
    ['a new member', { wing: { sweep: { value: 3, unit: 'deg' } } }, ['wing/sweep 3 deg added']],
    ['a new structure', { limits: { tailwind: 1 } }, ['limits added']],
    ['one taken out', { brakes: null }, ['brakes taken out']],
    ['several', { name: 'Two', wing: { taperRatio: null } }, ['name Two in place of One', 'wing/taperRatio taken out']],
    ['nothing', {}, []],
  ])('names %s', (_, patch, expected) => {
    expect(texts(patch)).toEqual(expected);
  });
});
