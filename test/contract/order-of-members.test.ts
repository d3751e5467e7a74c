import { describe, expect, it } from 'vitest';
import { orderOfMembers } from '../../src/contract/order-of-members.ts';

describe('the order of members', () => {
  it('is that of their names at every level, lists left as they are', () => {
    expect(JSON.stringify(orderOfMembers({ b: [{ d: 1, c: null }, 3, 2], a: { z: 'x', y: true } }))).toBe(
      '{"a":{"y":true,"z":"x"},"b":[{"c":null,"d":1},3,2]}',
    );
  });
});
