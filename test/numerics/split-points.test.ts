import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { splitPoints } from '../../src/numerics/split-points.ts';

describe('splitPoints', () => {
  it('gives the ends and the jumps between them, rising', () => {
    expect(splitPoints(0, 10, [7, -1, 3, 10, 0, 12, 5])).toEqual([0, 3, 5, 7, 10]);
    expect(splitPoints(0, 10, [])).toEqual([0, 10]);
  });

  it('agrees with filtering and sorting', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -5, max: 15, noNaN: true }), { maxLength: 20 }), (jumps) => {
        const inside = jumps.filter((x) => x > 0 && x < 10).sort((a, b) => a - b);
        expect(splitPoints(0, 10, jumps)).toEqual([0, ...inside, 10]);
      }),
    );
  });
});
