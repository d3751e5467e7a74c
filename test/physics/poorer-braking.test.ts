import { describe, expect, it } from 'vitest';
import { constantBraking } from '../../src/physics/braking-friction.ts';
import { poorerBraking } from '../../src/physics/poorer-braking.ts';

const falling = { at: (speed: number) => 0.4 - 0.005 * Math.min(speed, 60), kinks: [60] };
const step = { at: (speed: number) => (speed < 25 ? 0.16 : 0.05), kinks: [25] };

describe('poorerBraking', () => {
  it('is the smaller of the two at every speed', () => {
    for (const other of [constantBraking(0.3), step, falling]) {
      const poorer = poorerBraking(falling, other);
      for (let speed = 0; speed < 120; speed += 1.5) {
        expect(poorer.at(speed)).toBe(Math.min(falling.at(speed), other.at(speed)));
      }
    }
  });

  it('names where they change places, beside the kinks of both', () => {
    const { kinks } = poorerBraking(falling, constantBraking(0.3));
    expect(kinks[0]).toBeCloseTo(20, 6);
    expect(kinks).toContain(60);
    // 0.4 - 0.005 x 48 = 0.16 lies beyond the step: they change places only at it
    expect(poorerBraking(step, falling).kinks).toEqual([25, 60]);
  });

  it('has no more kinks where one is poorer throughout', () => {
    expect(poorerBraking(constantBraking(0.1), constantBraking(0.2)).kinks).toEqual([]);
    expect(poorerBraking(constantBraking(0.1), falling).kinks).toEqual([60]);
  });
});
