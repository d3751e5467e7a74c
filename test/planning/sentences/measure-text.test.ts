import { describe, expect, it } from 'vitest';
import { measureText, numberText, percentText } from '../../../src/planning/sentences/measure-text.ts';

describe('a number in a sentence', () => {
  it('sets thousands apart and keeps the sign', () => {
    const numbers = [0, 999, 1000, -1000, 12_345.6, 1_234_567, -987_654.25];
    expect(numbers.map(numberText)).toEqual(['0', '999', '1 000', '-1 000', '12 345.6', '1 234 567', '-987 654.25']);
  });
  it('has its unit behind, rounded the way it must', () => {
    expect(measureText('m-kt-kg', 'distance', 1254.2, 'up')).toBe('1 255 m');
    expect(measureText('m-kt-kg', 'distance', 899.9, 'down')).toBe('899 m');
    expect(measureText('ft-kt-lb', 'distance', 304.8, 'up')).toBe('1 000 ft');
    expect(measureText('m-kt-kg', 'temperature', 304.15)).toBe('31 °C');
    expect(measureText('si', 'temperature', 304.15)).toBe('304.2 K');
    expect(measureText('m-kt-kg', 'speed', (11.9 * 1852) / 3600)).toBe('11.9 kt');
    expect(measureText('ft-kt-lb', 'mass', 1000)).toBe('2 205 lb');
  });
  it('writes per cent to the decimals asked for; a margin goes down', () => {
    expect([percentText(0.0996), percentText(0.09996), percentText(0.09996, 1, 'down')]).toEqual([
      '10 %',
      '10 %',
      '9.9 %',
    ]);
    expect(percentText(-0.0022, 2)).toBe('-0.22 %');
  });
});
