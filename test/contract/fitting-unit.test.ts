import { expect, it } from 'vitest';
import { fittingUnit } from '../../src/contract/fitting-unit.ts';

const units = ['kg', 'lb', 't'] as const;

it('finds the other unit in which the number fits', () => {
  expect(fittingUnit('mass', { value: 2200, unit: 'kg' }, units, (kg) => kg > 900 && kg < 1100)).toBe('lb');
  expect(fittingUnit('mass', { value: 1, unit: 'kg' }, units, (kg) => kg > 900 && kg < 1100)).toBe('t');
});

it('never names the unit given, nor one that does not fit', () => {
  expect(fittingUnit('mass', { value: 1000, unit: 'kg' }, units, (kg) => kg === 1000)).toBeUndefined();
  expect(fittingUnit('mass', { value: 5, unit: 'kg' }, units, () => false)).toBeUndefined();
});
