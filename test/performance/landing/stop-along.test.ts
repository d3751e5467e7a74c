import { describe, expect, it } from 'vitest';
import { stopAlong } from '../../../src/performance/landing/stop-along.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { block } from '../../support/engine-failure-block.ts';
import { expectNear } from '../../support/near.ts';

const { stop } = block(5);

describe('stopAlong', () => {
  it('slows down in parts that add up, by hand: 30 to 20 to 0 m/s at 5 m/s2', () => {
    const slow = stopAlong(stop);
    expectNear(slow(30, 20, 0).sum.distance, 50, 1e-9);
    expectNear(slow(20, 0, 50).sum.distance, 40, 1e-9);
    expectNear(slow(30, 20, 0).sum.brakeWork, 250, 1e-9);
  });

  it('begins where it is told on a runway in stretches, and names the forces where it ends', () => {
    const stretches = [
      { end: 100, braking: constantBraking(5 / 9.80665) },
      { end: 200, braking: constantBraking(2 / 9.80665) },
    ];
    const slow = stopAlong({ ...stop, stretches });
    // 50 m at 5 m/s2 from 30 to 20 m/s, then 2 m/s2
    const { reaches, sum, entered, forces } = slow(30, 10, 50);
    expect(reaches).toBe(true);
    expectNear(sum.distance, 50 + 75, 1e-6);
    expectNear(entered, 20, 1e-8);
    expectNear(forces.braking.at(15), 2 / 9.80665, 1e-12);
  });
});
