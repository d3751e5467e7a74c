import { describe, expect, it } from 'vitest';
import { groundRise } from '../../src/performance/ground-rise.ts';
import { slopeProfile } from '../../src/performance/slope-profile.ts';
import { expectNear } from '../support/near.ts';

describe('groundRise', () => {
  it('is slope times distance, and nothing at the start point', () => {
    expectNear(groundRise({ slope: -0.02 }, 350), -7, 1e-12);
    expect(groundRise({ slope: 0.01 }, 0)).toBe(0);
  });
  it('passes through every point of a profile, and goes on at its last slope', () => {
    const [distances, heights] = [
      [0, 120, 400, 900],
      [55, 58, 51, 61],
    ];
    const profile = slopeProfile(distances, heights, 0);
    for (const [i, distance] of distances.entries()) {
      expectNear(groundRise({ slope: 0.5, profile }, distance), (heights[i] as number) - 55, 1e-9);
    }
    expectNear(groundRise({ slope: 0, profile }, 260), 54.5 - 55, 1e-9);
    expectNear(groundRise({ slope: 0, profile }, 1000), 63 - 55, 1e-9);
    expect(groundRise({ slope: 0.5, profile }, 0)).toBe(0);
  });
});
