import { describe, expect, it } from 'vitest';
import { printedSd } from '../../../src/performance/fit/fit-point.ts';
import { roundingStep } from '../../../src/performance/fit/rounding-step.ts';

describe('roundingStep', () => {
  it('finds the step of a column in metres and in feet', () => {
    expect(roundingStep([230, 250, 275, 305])).toEqual({ unit: 1, step: 5 });
    expect(roundingStep([230, 250, 270, 300])).toEqual({ unit: 1, step: 10 });
    expect(roundingStep([241.277, 259.864, 279.266])).toEqual({ unit: 1, step: 0.001 });
    const feet = roundingStep([795, 860, 925, 995].map((distance) => distance * 0.3048));
    expect(feet.unit).toBe(0.3048);
    expect(feet.step).toBeCloseTo(5 * 0.3048, 12);
  });

  it('is not put off by one figure in twelve', () => {
    const column = [230, 250, 275, 305, 320, 335, 350, 365, 380, 395, 410, 425];
    expect(roundingStep(column).step).toBe(5);
    expect(roundingStep(column.with(4, 302)).step).toBe(5);
    expect(roundingStep(column.with(4, 302).with(7, 356)).step).toBe(1);
  });

  it('makes the standard deviation of a printed distance, by hand: 100 m to 20 m has 0.015 and 10/100/sqrt(3)', () => {
    expect(printedSd(100, 20)).toBeCloseTo(Math.sqrt(0.000225 + 0.01 / 3), 12);
  });
});
