import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { between, nodeShare } from '../../../src/performance/flight-manual/node-share.ts';

describe('the place among nodes', () => {
  it.each([
    [0, { node: 0, share: 0 }],
    [5, { node: 0, share: 0.5 }],
    [10, { node: 1, share: 0 }],
    [25, { node: 1, share: 0.75 }],
    [30, { node: 2, share: 0 }],
    [-0.1, { node: 0, share: 0, beyond: 'below' }],
    [30.1, { node: 2, share: 0, beyond: 'above' }],
  ])('of %d among 0, 10, 30 is %o', (x, place) => {
    expect(nodeShare([0, 10, 30], x)).toEqual(place);
  });

  it('is on a node that only the rounding of a unit keeps it from', () => {
    expect(nodeShare([0, 10, 30], 10 + 4e-9)).toEqual({ node: 1, share: 0 });
    expect(nodeShare([0, 10, 30], 10 - 4e-9)).toEqual({ node: 1, share: 0 });
    expect(nodeShare([0, 10, 30], 30 + 1e-9)).toEqual({ node: 2, share: 0 });
    expect(nodeShare([5], 5 - 1e-10)).toEqual({ node: 0, share: 0 });
  });

  it('is refused for what is no number, and among no nodes', () => {
    expect(() => nodeShare([0, 1], Number.NaN)).toThrow(RangeError);
    expect(() => nodeShare([], 1)).toThrow(RangeError);
  });

  const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  test.prop([number, number, fc.double({ min: 0, max: 1, noNaN: true })])(
    'between two values nothing is beyond either',
    (from, to, share) => {
      const value = between(from, to, share);
      expect(value).toBeGreaterThanOrEqual(Math.min(from, to));
      expect(value).toBeLessThanOrEqual(Math.max(from, to));
    },
  );
});
