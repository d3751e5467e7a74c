import { describe, expect, it } from 'vitest';
import { stoppingDrag } from '../../src/physics/stopping-drag.ts';

describe('stoppingDrag', () => {
  it('is half below hydroplaning and ends there [the longer stop; judgement]', () => {
    expect(stoppingDrag(1.4, 25)).toEqual({ perSquare: 0.7, below: 25 });
    expect(() => stoppingDrag(Number.NaN, 25)).toThrow(/perSquare/);
    expect(() => stoppingDrag(1, 0)).toThrow(/hydroplaningSpeed/);
  });
});
