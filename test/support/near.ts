import { expect } from 'vitest';

/** Expects |actual - expected| <= tolerance: absolute, unlike a count of decimals. */
export function expectNear(actual: unknown, expected: number, tolerance: number): void {
  expect(actual).toBeTypeOf('number');
  const off = Math.abs((actual as number) - expected);
  expect(off <= tolerance, `${actual} is ${off} from ${expected}, allowed ${tolerance}`).toBe(true);
}

/** Expects a relative difference of at most the tolerance, an absolute one where the expected value is 0. */
export function expectRatio(actual: unknown, expected: number, tolerance: number): void {
  expectNear(actual, expected, tolerance * (expected === 0 ? 1 : Math.abs(expected)));
}
