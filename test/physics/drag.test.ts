import { describe, expect, it } from 'vitest';
import { dragCoefficient, inducedDragFactor } from '../../src/physics/drag.ts';

describe('the drag polar', () => {
  it('has an induced part of 0.0128 for A 9.45, e 0.801, phi 0.3044 (0.0128 +- 0.00005) [Dymos balanced field; read]', () => {
    const span = 35.7;
    const area = (span * span) / 9.45;
    expect(0.3044 * inducedDragFactor(span, area, 0.801)).toBeCloseTo(0.0128, 4);
  });

  it('is the zero-lift drag at no lift and grows with the square of the lift', () => {
    expect(dragCoefficient(0.03, 0.05, 0, 0.7)).toBe(0.03);
    const rise = (lift: number) => dragCoefficient(0.03, 0.05, lift, 0.7) - 0.03;
    expect(rise(1.2) / rise(0.6)).toBeCloseTo(4, 12);
    expect(rise(1)).toBeCloseTo(0.035, 12);
  });

  it('names what must be above 0', () => {
    expect(() => inducedDragFactor(0, 16, 0.8)).toThrow(/span/);
    expect(() => inducedDragFactor(10, 16, Number.NaN)).toThrow(/oswaldFactor/);
  });
});
